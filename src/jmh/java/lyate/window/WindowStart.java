package lyate.window;

import com.formdev.flatlaf.FlatIntelliJLaf;
import java.awt.Frame;
import java.util.Arrays;
import java.util.function.Predicate;
import javax.swing.JFrame;
import javax.swing.JLabel;
import javax.swing.SwingUtilities;
import lyate.table.TableFolders;

/**
 * Opens a window, says when it stands and takes input, and leaves. A whole program, for measuring from outside; needs a
 * display. Argument {@code bare} opens an empty frame with the same look, {@code reviewed} waits for the first review as well;
 * a second argument lets the process end in full, so that its classes can be archived.
 */
public final class WindowStart {

    private WindowStart() {}

    public static void main(String[] arguments) throws Exception {
        if (arguments[0].equals("bare")) {
            SwingUtilities.invokeLater(WindowStart::openBareFrame);
        } else {
            WorkbenchFrame.open(TableFolders.packaged());
        }
        await(Frame::isShowing);
        // What is queued by now is the first painting; when this returns, the next event is the user's.
        SwingUtilities.invokeAndWait(() -> { });
        if (arguments[0].equals("reviewed")) {
            await(frame -> ((WorkbenchFrame) frame).reviewed());
        }
        System.out.println("usable");
        if (arguments.length > 1) {
            System.exit(0);
        }
        // No farewell: an autosave or a remembered size is not part of starting.
        Runtime.getRuntime().halt(0);
    }

    private static void openBareFrame() {
        FlatIntelliJLaf.setup();
        JFrame frame = new JFrame("bare");
        frame.add(new JLabel("bare"));
        frame.setSize(1500, 920);
        frame.setVisible(true);
    }

    private static void await(Predicate<Frame> state) throws InterruptedException {
        while (Arrays.stream(Frame.getFrames()).noneMatch(state)) {
            Thread.sleep(5);
        }
    }
}
