package clipramp.cli;

import picocli.CommandLine.Option;

/** Options that every command has. */
final class StandardOptions {
    @Option(names = "--help", usageHelp = true, order = 100, description = "show this help")
    boolean help;

    @Option(names = "--version", versionHelp = true, order = 101, description = "show the program's version")
    boolean version;

    /** Taken out before a command sees its arguments; stands here for the help. */
    @Option(names = "--ascii", order = 99, description = "ohm, u, deg instead of signs")
    boolean ascii;
}
