package clipramp.cli;

import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;

/** All commands as one tree, for what is made from them: completion in the shell and the manual page. */
final class CommandTree {
    private CommandTree() {}

    static CommandLine of(Session session) {
        CommandLine root = new CommandLine(CommandSpec.create().name(Program.NAME));
        for (Commands.Command command : Commands.of(session)) {
            root.addSubcommand(command.name(), new CommandLine(command.build().apply(session)));
        }
        return root;
    }
}
