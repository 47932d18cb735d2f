package lyate.window;

import com.formdev.flatlaf.FlatDarculaLaf;
import com.formdev.flatlaf.FlatIntelliJLaf;
import com.formdev.flatlaf.FlatLaf;
import java.awt.Color;
import java.util.ArrayList;
import java.util.List;

/** Whether the window is light or dark at present; tells its listeners when that changes. For the event thread. */
final class Theme {

    private final List<Runnable> listeners = new ArrayList<>();
    private Palette palette;

    Theme(boolean dark) {
        this.palette = Palette.load(dark);
    }

    /** Makes Swing look accordingly. */
    void install() {
        if (palette.dark()) {
            FlatDarculaLaf.setup();
        } else {
            FlatIntelliJLaf.setup();
        }
    }

    void switchTo(boolean dark) {
        palette = Palette.load(dark);
        install();
        FlatLaf.updateUI();
        listeners.forEach(Runnable::run);
    }

    /** Called after each switch. */
    void onChange(Runnable listener) {
        listeners.add(listener);
    }

    Palette palette() {
        return palette;
    }

    Color color(String name) {
        return palette.color(name);
    }

    int space(String name) {
        return palette.space(name);
    }
}
