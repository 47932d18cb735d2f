package lyate.command;

import lyate.table.TableFolders;
import lyate.window.WorkbenchFrame;

/** The program. */
public final class Lyate {

    private Lyate() {}

    /** Runs the command line, or opens the window where there are no arguments. */
    public static void main(String[] arguments) {
        if (arguments.length == 0) {
            WorkbenchFrame.open(TableFolders.packaged());
        }
    }
}
