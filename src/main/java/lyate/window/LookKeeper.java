package lyate.window;

import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.function.Supplier;
import javax.swing.SwingUtilities;

/**
 * Keeps the theme as the user wants it. The desktop is asked away from the event thread, so the window opens at once in
 * what the desktop was last time. For the event thread.
 */
final class LookKeeper {

    private final Theme theme;
    private final WindowMemory memory;
    private final Supplier<Optional<Boolean>> desktopIsDark;

    /** @param desktopIsDark asked on another thread; empty where the desktop does not say */
    LookKeeper(Theme theme, WindowMemory memory, Supplier<Optional<Boolean>> desktopIsDark) {
        this.theme = theme;
        this.memory = memory;
        this.desktopIsDark = desktopIsDark;
    }

    /** Takes a look from now on. */
    void choose(Look look) {
        memory.setLook(look);
        if (look == Look.SYSTEM) {
            follow();
        } else {
            become(look == Look.DARK);
        }
    }

    /** Looks what the desktop is set to now, where the user wants that; call when the window comes to the front. */
    void follow() {
        if (memory.look() == Look.SYSTEM) {
            CompletableFuture.supplyAsync(desktopIsDark).thenAccept(dark -> SwingUtilities.invokeLater(() -> {
                if (memory.look() == Look.SYSTEM) {
                    become(dark.orElse(false));
                }
            }));
        }
    }

    private void become(boolean dark) {
        memory.setDark(dark);
        if (dark != theme.palette().dark()) {
            theme.switchTo(dark);
        }
    }
}
