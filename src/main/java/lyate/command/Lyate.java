package lyate.command;

import java.awt.GraphicsEnvironment;
import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import lyate.table.TableFolders;
import lyate.window.WorkbenchFrame;
import picocli.CommandLine;

/** The program. */
public final class Lyate {

    /** In the order of the help. */
    private static final List<String> COMMANDS = List.of("sites", "check", "bases", "acids", "review", "compare", "accuracy", "tables");

    private Lyate() {}

    /** Runs the command line, or opens the window where there are no arguments. */
    public static void main(String[] arguments) {
        if (arguments.length == 0 && GraphicsEnvironment.isHeadless()) {
            System.err.println("There is no display for the window; 'lyate --help' lists the commands that need none.");
            System.exit(Failures.SOME_INPUT_NOT_USED);
        } else if (arguments.length == 0) {
            WorkbenchFrame.open(TableFolders.packaged());
        } else {
            System.exit(run(Terminal.ofSystem(), arguments));
        }
    }

    private static Callable<Integer> command(String name, Terminal terminal) {
        return switch (name) {
            case "sites" -> new SitesCommand(terminal);
            case "check" -> new CheckCommand(terminal);
            case "bases" -> new BasesCommand(terminal);
            case "acids" -> new AcidsCommand(terminal);
            case "review" -> new ReviewCommand(terminal);
            case "compare" -> new CompareCommand(terminal);
            case "accuracy" -> new AccuracyCommand(terminal);
            case "tables" -> new TablesCommand(terminal);
            default -> throw new IllegalArgumentException("no command " + name);
        };
    }

    /** Runs one command and returns its exit code: 0 done, 1 some input could not be used, 2 wrong usage. */
    static int run(Terminal terminal, String... arguments) {
        CommandLine command = new CommandLine(new RootCommand());
        // What options a command has is found out by reflection, which takes a noticeable time for all of them.
        boolean named = arguments.length > 0 && COMMANDS.contains(arguments[0]);
        for (String name : named ? List.of(arguments[0]) : COMMANDS) {
            command.addSubcommand(name, command(name, terminal));
        }
        // Sorting would follow the letters of the country.
        command.getSubcommands().values().forEach(sub -> sub.getCommandSpec().usageMessage().sortSynopsis(false).sortOptions(false));
        command.setOut(terminal.outWriter()).setErr(terminal.errWriter())
                .registerConverter(Format.class, new Format.Converter())
                .setParameterExceptionHandler(Failures::wrongUsage)
                .setExecutionExceptionHandler(Failures::failed);
        int code = command.execute(arguments);
        try {
            terminal.flushResults();
        } catch (IOException e) {
            if (code == 0) {
                terminal.errWriter().println("lyate: " + e.getMessage());
            }
            code = Math.max(code, Failures.SOME_INPUT_NOT_USED);
        }
        terminal.errWriter().flush();
        return code;
    }
}
