package lyate.command;

import java.awt.GraphicsEnvironment;
import java.io.IOException;
import lyate.table.TableFolders;
import lyate.window.WorkbenchFrame;
import picocli.CommandLine;

/** The program. */
public final class Lyate {

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

    /** Runs one command and returns its exit code: 0 done, 1 some input could not be used, 2 wrong usage. */
    static int run(Terminal terminal, String... arguments) {
        CommandLine command = new CommandLine(new RootCommand())
                .addSubcommand(new SitesCommand(terminal))
                .addSubcommand(new CheckCommand(terminal))
                .addSubcommand(new BasesCommand(terminal))
                .addSubcommand(new AcidsCommand(terminal))
                .addSubcommand(new ReviewCommand(terminal))
                .addSubcommand(new CompareCommand(terminal))
                .addSubcommand(new AccuracyCommand(terminal))
                .addSubcommand(new TablesCommand(terminal));
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
