package lyate.window;

import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.util.UIScale;
import java.awt.Toolkit;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.nio.file.Path;
import java.util.List;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import javax.swing.JRadioButtonMenuItem;
import javax.swing.KeyStroke;
import javax.swing.event.MenuEvent;
import javax.swing.event.MenuListener;

/** The menu bar. */
final class WindowMenu extends JMenuBar {

    private static final int COMMAND = InputEvent.CTRL_DOWN_MASK;
    private static final int SHIFT = InputEvent.SHIFT_DOWN_MASK;
    private static final int ALT = InputEvent.ALT_DOWN_MASK;

    /** What is drawn in the window. */
    enum Drawn {
        SUBSTRATE("Substrate"), LADDER("Acidity ladder"), CHART("Chart in the drawer");

        private final String title;

        Drawn(String title) {
            this.title = title;
        }
    }

    /** What the menu can ask of the window. */
    interface Commands {
        void newSheet();

        void openDemo();

        void open();

        void open(Path file);

        List<Path> recent();

        void save();

        void saveAs();

        void undo();

        void redo();

        void addStep();

        void duplicateStep();

        void deleteStep();

        void moveStep(int by);

        void goToStep(int by);

        void copyPicture(Drawn what);

        void savePicture(Drawn what);

        void copySmiles();

        void copyMolfile();

        void preferences();

        void fit();

        Look look();

        void choose(Look look);

        void zoomed(float zoom);

        void guide();

        void about();

        void quit();
    }

    private final transient Commands commands;

    WindowMenu(Commands commands, Theme theme) {
        this.commands = commands;
        add(sheet());
        add(edit());
        add(step());
        add(view(theme));
        add(help());
    }

    private JMenu sheet() {
        JMenu menu = menu("Sheet", 'S');
        menu.add(item("New", 'N', key(KeyEvent.VK_N, COMMAND), commands::newSheet));
        menu.add(item("Open\u2026", 'O', key(KeyEvent.VK_O, COMMAND), commands::open));
        menu.add(recent());
        menu.add(item("Show the example", 'E', null, commands::openDemo));
        menu.addSeparator();
        menu.add(item("Save", 'S', key(KeyEvent.VK_S, COMMAND), commands::save));
        menu.add(item("Save as\u2026", 'A', key(KeyEvent.VK_S, COMMAND | SHIFT), commands::saveAs));
        JMenu pictures = menu("Save picture", 'P');
        for (Drawn what : Drawn.values()) {
            pictures.add(item(what.title + "\u2026", what.title.charAt(0), what == Drawn.SUBSTRATE ? key(KeyEvent.VK_E, COMMAND) : null,
                    () -> commands.savePicture(what)));
        }
        menu.add(pictures);
        menu.addSeparator();
        menu.add(item("Quit", 'Q', key(KeyEvent.VK_Q, COMMAND), commands::quit));
        return menu;
    }

    private JMenu recent() {
        JMenu menu = menu("Recent", 'R');
        filledWhenOpened(menu, () -> {
            commands.recent().forEach(file -> menu.add(item(file.getFileName() + "  \u2013  " + file.getParent(), '\0', null, () -> commands.open(file))));
            if (menu.getItemCount() == 0) {
                menu.add(item("none yet", '\0', null, () -> {})).setEnabled(false);
            }
        });
        return menu;
    }

    private static void filledWhenOpened(JMenu menu, Runnable fill) {
        menu.addMenuListener(new MenuListener() {
            @Override
            public void menuSelected(MenuEvent event) {
                menu.removeAll();
                fill.run();
            }

            @Override
            public void menuDeselected(MenuEvent event) {}

            @Override
            public void menuCanceled(MenuEvent event) {}
        });
    }

    private JMenu edit() {
        JMenu menu = menu("Edit", 'E');
        menu.add(item("Undo", 'U', key(KeyEvent.VK_Z, COMMAND), commands::undo));
        menu.add(item("Redo", 'R', key(KeyEvent.VK_Z, COMMAND | SHIFT), commands::redo));
        menu.addSeparator();
        JMenu pictures = menu("Copy picture", 'P');
        for (Drawn what : Drawn.values()) {
            pictures.add(item(what.title, what.title.charAt(0), what == Drawn.SUBSTRATE ? key(KeyEvent.VK_P, COMMAND | SHIFT) : null,
                    () -> commands.copyPicture(what)));
        }
        menu.add(pictures);
        menu.add(item("Copy substrate as SMILES", 'S', key(KeyEvent.VK_C, COMMAND | SHIFT), commands::copySmiles));
        menu.add(item("Copy substrate as molfile", 'M', key(KeyEvent.VK_M, COMMAND | SHIFT), commands::copyMolfile));
        menu.addSeparator();
        menu.add(item("Preferences\u2026", 'F', key(KeyEvent.VK_COMMA, COMMAND), commands::preferences));
        return menu;
    }

    private JMenu step() {
        JMenu menu = menu("Step", 'T');
        menu.add(item("Add", 'A', key(KeyEvent.VK_ENTER, COMMAND), commands::addStep));
        menu.add(item("Duplicate", 'D', key(KeyEvent.VK_D, COMMAND | SHIFT), commands::duplicateStep));
        menu.add(item("Delete", 'E', key(KeyEvent.VK_DELETE, COMMAND | SHIFT), commands::deleteStep));
        menu.addSeparator();
        menu.add(item("Previous", 'P', key(KeyEvent.VK_PAGE_UP, COMMAND), () -> commands.goToStep(-1)));
        menu.add(item("Next", 'N', key(KeyEvent.VK_PAGE_DOWN, COMMAND), () -> commands.goToStep(1)));
        menu.add(item("Move up", 'U', key(KeyEvent.VK_PAGE_UP, COMMAND | ALT), () -> commands.moveStep(-1)));
        menu.add(item("Move down", 'W', key(KeyEvent.VK_PAGE_DOWN, COMMAND | ALT), () -> commands.moveStep(1)));
        return menu;
    }

    private JMenu view(Theme theme) {
        JMenu menu = menu("View", 'V');
        JMenu colours = menu("Colours", 'C');
        filledWhenOpened(colours, () -> {
            for (Look look : Look.values()) {
                JRadioButtonMenuItem item = new JRadioButtonMenuItem(look.toString(), commands.look() == look);
                item.addActionListener(event -> commands.choose(look));
                colours.add(item);
            }
        });
        menu.add(colours);
        menu.add(item("Swap light and dark", 'D', key(KeyEvent.VK_D, COMMAND), () -> commands.choose(theme.palette().dark() ? Look.LIGHT : Look.DARK)));
        menu.addSeparator();
        menu.add(item("Larger", 'L', key(KeyEvent.VK_PLUS, COMMAND), () -> zoom(UIScale.zoomIn())));
        menu.add(item("Smaller", 'S', key(KeyEvent.VK_MINUS, COMMAND), () -> zoom(UIScale.zoomOut())));
        menu.add(item("Usual size", 'U', key(KeyEvent.VK_0, COMMAND), () -> zoom(UIScale.zoomReset())));
        menu.addSeparator();
        menu.add(item("Whole molecule", 'W', key(KeyEvent.VK_F, COMMAND), commands::fit));
        return menu;
    }

    private JMenu help() {
        JMenu menu = menu("Help", 'H');
        menu.add(item("Guide", 'G', KeyStroke.getKeyStroke("F1"), commands::guide));
        menu.add(item("About Lyate", 'A', null, commands::about));
        return menu;
    }

    private void zoom(boolean changed) {
        if (changed) {
            FlatLaf.updateUI();
            commands.zoomed(UIScale.getZoomFactor());
        } else {
            Toolkit.getDefaultToolkit().beep();
        }
    }

    private static KeyStroke key(int code, int modifiers) {
        return KeyStroke.getKeyStroke(code, modifiers);
    }

    private static JMenu menu(String name, char mnemonic) {
        JMenu menu = new JMenu(name);
        menu.setMnemonic(mnemonic);
        return menu;
    }

    private static JMenuItem item(String name, char mnemonic, KeyStroke key, Runnable action) {
        JMenuItem item = new JMenuItem(name, mnemonic);
        item.setAccelerator(key);
        item.addActionListener(event -> action.run());
        return item;
    }
}
