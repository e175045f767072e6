package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.lang.reflect.AnnotatedElement;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.IllegalFormatException;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import picocli.CommandLine;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.UsageMessageSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/**
 * Help goes through the library's formatter, which takes a percent sign for a conversion: one that is none stands as a
 * warning beside the help.
 */
class HelpTest {
    private static Session session() {
        var out = new ByteArrayOutputStream();
        Terminal terminal =
                new Terminal(new ByteArrayInputStream(new byte[0]), out, out, Map.of(), false, StandardCharsets.UTF_8);
        Output output = new Output(out, StandardCharsets.UTF_8, false);
        return new Session(terminal, output, output, false, Optional.of(file -> 0));
    }

    static Stream<String> commands() {
        return Commands.of(session()).stream().map(Commands.Command::name);
    }

    private static List<String> texts(String command) {
        Session session = session();
        CommandSpec spec = new CommandLine(
                        Commands.named(command, session).orElseThrow().build().apply(session))
                .getCommandSpec();
        UsageMessageSpec usage = spec.usageMessage();
        List<String> texts = new ArrayList<>();
        for (String[] part : List.of(usage.header(), usage.description(), usage.footer())) {
            texts.addAll(Arrays.asList(part));
        }
        texts.addAll(List.of(usage.descriptionHeading(), usage.optionListHeading(), usage.parameterListHeading()));
        for (ArgSpec argument : spec.args()) {
            texts.addAll(written((AnnotatedElement) argument.userObject()));
        }
        return texts;
    }

    /** As it stands in the source; what the library hands out is formatted already. */
    private static List<String> written(AnnotatedElement argument) {
        Option option = argument.getAnnotation(Option.class);
        Parameters parameters = argument.getAnnotation(Parameters.class);
        return Arrays.asList(option != null ? option.description() : parameters.description());
    }

    @ParameterizedTest
    @MethodSource("commands")
    void everyTextOfEveryHelpIsOneThatTheFormatterTakes(String command) {
        List<String> texts = texts(command);
        assertThat(texts).hasSizeGreaterThan(4);
        assertThat(texts)
                .allSatisfy(text ->
                        assertThatCode(() -> String.format(text)).as(text).doesNotThrowAnyException());
    }

    @ParameterizedTest
    @MethodSource("commands")
    void noHelpShowsTwoPercentSignsInARow(String command) {
        assertThat(CliRun.of("help", command).out()).doesNotContain("%%");
    }

    /** What such a check is good for: the two spellings that it is about, apart. */
    @Test
    void aBarePercentSignIsRefusedByTheFormatter() {
        assertThatCode(() -> String.format("within 5 % of it")).isInstanceOf(IllegalFormatException.class);
        assertThat(String.format("within 5 %% of it")).isEqualTo("within 5 % of it");
    }
}
