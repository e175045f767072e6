package clipramp.cli;

import clipramp.files.Example;
import clipramp.files.Key;
import clipramp.files.KeyCatalogue;
import clipramp.files.ProfileLibrary;
import clipramp.files.ProfileLibrary.Found;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import picocli.CommandLine;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;

/**
 * The shell's completion, written from the commands' own options: what fits stands in one function, which bash and zsh each
 * ask in their own way. The command-line library's generator completes neither what stands behind an equals sign nor file
 * names, and zsh's emulation of bash puts a blank behind an equals sign.
 */
final class Completion {
    private static final String OFFERS = """
            # What fits: $1 the command, empty in its own place; $2 the word so far. Sets place, value, and offered or files.
            _clipramp_offers() {
              place= value=$2 offered= files=
              case "$2" in
                --*=*) place=${2%%=*}=; value=${2#*=} ;;
                -*) place=- ;;
              esac
              if [ -n "$1" ]; then place="$1 $place"; else place=; fi
              case "$place" in
            @CASES@
              esac
            }
            """;

    private static final String BASH = """
            # Completion of clipramp for bash.
            @OFFERS@
            _clipramp() {
              local line=${COMP_LINE:0:$COMP_POINT} command= place value offered files
              [ "$COMP_CWORD" -gt 1 ] && command=${COMP_WORDS[1]}
              _clipramp_offers "$command" "${line##* }"
              COMPREPLY=()
              if [ -n "$files" ]; then
                local IFS=$'\n'
                COMPREPLY=($(compgen -f -- "$value"))
                compopt -o filenames
              else
                COMPREPLY=($(compgen -W "$offered" -- "$value"))
                # What ends in = goes on with its value.
                case "${COMPREPLY[0]}" in *=) compopt -o nospace ;; esac
              fi
              # bash replaces only what follows the first =, unless it is told not to part words there.
              case "$COMP_WORDBREAKS" in *=*) return 0 ;; esac
              case "$place" in *=) COMPREPLY=("${COMPREPLY[@]/#/${place##* }}") ;; esac
            } 2>/dev/null
            complete -F _clipramp clipramp
            """;

    private static final String ZSH = """
            #compdef clipramp
            # Completion of clipramp for zsh: sourced, or as _clipramp in a folder of fpath.
            @OFFERS@
            _clipramp() {
              local command= place value offered files word
              (( CURRENT > 2 )) && command=$words[2]
              _clipramp_offers "$command" "$PREFIX"
              [[ $place = *= ]] && compset -P '*='
              if [[ -n $files ]]; then
                _files
                return
              fi
              for word in ${=offered}; do
                # What ends in = goes on with its value.
                if [[ $word = *= ]]; then compadd -S '' -- $word; else compadd -- $word; fi
              done
            }
            if [[ $funcstack[1] = _clipramp ]]; then
              _clipramp "$@"
            else
              (( $+functions[compdef] )) || { autoload -Uz compinit; compinit }
              compdef _clipramp clipramp
            fi
            """;

    private static final List<String> FILE_LABELS = List.of("FILE", "OUT", "OUT.svg", "OUT.pdf", "READINGS.csv");

    private Completion() {}

    /** The script for one of {@link CompletionCommand#SHELLS}, for a program with its commands. */
    static String script(CommandLine root, String shell) {
        Map<String, List<String>> words = words();
        String commands = String.join(" ", root.getSubcommands().keySet());
        Stream<String> first = Stream.of(line("", commands + " help --help --version"), line("help ", commands));
        Stream<String> cases = root.getSubcommands().entrySet().stream()
                .flatMap(command -> cases(command.getKey(), command.getValue().getCommandSpec(), words));
        String all = Stream.concat(first, cases).collect(Collectors.joining("\n"));
        String offers = OFFERS.replace("@CASES@", all).stripTrailing();
        return (shell.equals("zsh") ? ZSH : BASH).replace("@OFFERS@", offers);
    }

    /** What each place of a command takes: its options, each option's value, what stands free. */
    private static Stream<String> cases(String command, CommandSpec spec, Map<String, List<String>> words) {
        String options = spec.options().stream()
                .map(option -> option.longestName() + (takesValue(option) ? "=" : ""))
                .collect(Collectors.joining(" "));
        Stream<String> values = spec.options().stream()
                .filter(Completion::takesValue)
                .flatMap(option -> offer(command + " " + option.longestName() + "=", option, words));
        Stream<String> free =
                spec.positionalParameters().stream().limit(1).flatMap(place -> offer(command + " ", place, words));
        return Stream.of(Stream.of(line(command + " -", options)), values, free).flatMap(lines -> lines);
    }

    private static boolean takesValue(OptionSpec option) {
        return option.arity().max() > 0;
    }

    private static Stream<String> offer(String place, ArgSpec argument, Map<String, List<String>> words) {
        if (FILE_LABELS.contains(argument.paramLabel())) {
            return Stream.of("    \"" + place + "\") files=yes ;;");
        }
        List<String> offered = words.getOrDefault(argument.paramLabel(), List.of());
        return offered.isEmpty() ? Stream.empty() : Stream.of(line(place, String.join(" ", offered)));
    }

    private static String line(String place, String offered) {
        return "    \"" + place + "\") offered=\"" + offered + "\" ;;";
    }

    private static Map<String, List<String>> words() {
        return Map.of(
                "KEY", ExplainCommand.known(),
                "KEY=VALUE", designKeys(),
                "ID", ProfileLibrary.shipped().all().stream().map(Found::id).toList(),
                "EXAMPLE", Example.all().stream().map(Example::id).toList(),
                "SIZE", List.of("a4", "letter"),
                "SHELL", CompletionCommand.SHELLS,
                "shipped", List.of("shipped"));
    }

    /** Keys of the design itself; a device's figures are too many to help. */
    private static List<String> designKeys() {
        return KeyCatalogue.standard().all().stream()
                .filter(key -> key.kind() != Key.Kind.MAPPING && key.kind() != Key.Kind.LIST)
                .map(Key::path)
                .filter(path -> !path.matches("clipramp|(unijunction|programmable-unijunction|zener|scr|triac)\\..*"))
                .map(path -> path + "=")
                .toList();
    }
}
