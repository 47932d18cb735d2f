package lyate.window;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Component;
import java.awt.Container;
import java.awt.Window;
import java.awt.event.KeyEvent;
import java.util.Arrays;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import java.util.stream.Stream;
import javax.swing.AbstractButton;
import javax.swing.JDialog;
import javax.swing.SwingUtilities;

/** Does to the window what a user does. */
final class Driver {

    private static final long PATIENCE_NANOS = 30_000_000_000L;

    private Driver() {}

    static <T> T onEventThread(Callable<T> task) throws Exception {
        FutureTask<T> future = new FutureTask<>(task);
        SwingUtilities.invokeAndWait(future);
        return future.get();
    }

    /** Waits until something is so; looked at on the event thread. */
    static void waitFor(String what, Callable<Boolean> condition) throws Exception {
        long end = System.nanoTime() + PATIENCE_NANOS;
        while (!onEventThread(condition)) {
            assertTrue(System.nanoTime() < end, "not within 30 s: " + what);
            Thread.sleep(10);
        }
    }

    /** Presses and releases a key in a component. */
    static void press(Component target, int key) throws Exception {
        onEventThread(() -> {
            for (int kind : new int[] {KeyEvent.KEY_PRESSED, KeyEvent.KEY_RELEASED}) {
                target.dispatchEvent(new KeyEvent(target, kind, System.currentTimeMillis(), 0, key, KeyEvent.CHAR_UNDEFINED));
            }
            return null;
        });
    }

    /** Types letters into a component. */
    static void type(Component target, String letters) throws Exception {
        for (char letter : letters.toCharArray()) {
            onEventThread(() -> {
                target.dispatchEvent(new KeyEvent(target, KeyEvent.KEY_TYPED, System.currentTimeMillis(), 0, KeyEvent.VK_UNDEFINED, letter));
                return null;
            });
        }
    }

    /** Starts what opens a dialog and returns at once. */
    static void later(Runnable action) {
        SwingUtilities.invokeLater(action);
    }

    /** A component of a kind in a dialog on screen, waited for. */
    static <C extends Component> C inDialog(Class<C> kind) throws Exception {
        waitFor("a dialog with a " + kind.getSimpleName(), () -> find(kind).isPresent());
        return onEventThread(() -> find(kind).orElseThrow());
    }

    /** Clicks a button of a dialog by its text. */
    static void answer(String text) throws Exception {
        waitFor("a button " + text, () -> button(text).isPresent());
        onEventThread(() -> {
            button(text).orElseThrow().doClick();
            return null;
        });
    }

    private static Optional<AbstractButton> button(String text) {
        return dialogs().flatMap(Driver::inside).filter(AbstractButton.class::isInstance).map(AbstractButton.class::cast)
                .filter(button -> text.equals(button.getText())).findFirst();
    }

    private static <C extends Component> Optional<C> find(Class<C> kind) {
        return dialogs().flatMap(Driver::inside).filter(kind::isInstance).map(kind::cast).findFirst();
    }

    private static Stream<Component> dialogs() {
        return Arrays.stream(Window.getWindows()).filter(window -> window instanceof JDialog && window.isShowing()).map(Component.class::cast);
    }

    private static Stream<Component> inside(Component parent) {
        Stream<Component> children = parent instanceof Container container ? Arrays.stream(container.getComponents()).flatMap(Driver::inside) : Stream.empty();
        return Stream.concat(Stream.of(parent), children);
    }
}
