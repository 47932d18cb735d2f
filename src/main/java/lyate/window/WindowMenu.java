package lyate.window;

import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.util.UIScale;
import java.awt.Toolkit;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import javax.swing.JCheckBoxMenuItem;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import javax.swing.KeyStroke;

/** The menu bar. */
final class WindowMenu extends JMenuBar {

    private static final int COMMAND = InputEvent.CTRL_DOWN_MASK;
    private static final int SHIFT = InputEvent.SHIFT_DOWN_MASK;

    /** What the menu can ask of the window. */
    interface Commands {
        void newStep();

        void openDemo();

        void copyPicture();

        void savePicture();

        void copySmiles();

        void fit();

        void setDark(boolean dark);

        void zoomed(float zoom);

        void guide();

        void about();

        void quit();
    }

    WindowMenu(Commands commands, boolean dark) {
        JMenu step = menu("Step", 'S');
        step.add(item("New", 'N', KeyStroke.getKeyStroke(KeyEvent.VK_N, COMMAND), commands::newStep));
        step.add(item("Show the example", 'E', null, commands::openDemo));
        step.addSeparator();
        step.add(item("Save picture as\u2026", 'P', KeyStroke.getKeyStroke(KeyEvent.VK_E, COMMAND), commands::savePicture));
        step.addSeparator();
        step.add(item("Quit", 'Q', KeyStroke.getKeyStroke(KeyEvent.VK_Q, COMMAND), commands::quit));

        JMenu edit = menu("Edit", 'E');
        edit.add(item("Copy substrate as picture", 'P', KeyStroke.getKeyStroke(KeyEvent.VK_C, COMMAND | SHIFT), commands::copyPicture));
        edit.add(item("Copy substrate as SMILES", 'S', KeyStroke.getKeyStroke(KeyEvent.VK_S, COMMAND | SHIFT), commands::copySmiles));

        JMenu view = menu("View", 'V');
        JCheckBoxMenuItem darkItem = new JCheckBoxMenuItem("Dark", dark);
        darkItem.setMnemonic('D');
        darkItem.setAccelerator(KeyStroke.getKeyStroke(KeyEvent.VK_D, COMMAND));
        darkItem.addActionListener(event -> commands.setDark(darkItem.isSelected()));
        view.add(darkItem);
        view.addSeparator();
        view.add(item("Larger", 'L', KeyStroke.getKeyStroke(KeyEvent.VK_PLUS, COMMAND), () -> zoom(commands, UIScale.zoomIn())));
        view.add(item("Smaller", 'S', KeyStroke.getKeyStroke(KeyEvent.VK_MINUS, COMMAND), () -> zoom(commands, UIScale.zoomOut())));
        view.add(item("Usual size", 'U', KeyStroke.getKeyStroke(KeyEvent.VK_0, COMMAND), () -> zoom(commands, UIScale.zoomReset())));
        view.addSeparator();
        view.add(item("Whole molecule", 'W', KeyStroke.getKeyStroke(KeyEvent.VK_F, COMMAND), commands::fit));

        JMenu help = menu("Help", 'H');
        help.add(item("Guide", 'G', KeyStroke.getKeyStroke("F1"), commands::guide));
        help.add(item("About Lyate", 'A', null, commands::about));
        add(step);
        add(edit);
        add(view);
        add(help);
    }

    private static void zoom(Commands commands, boolean changed) {
        if (changed) {
            FlatLaf.updateUI();
            commands.zoomed(UIScale.getZoomFactor());
        } else {
            Toolkit.getDefaultToolkit().beep();
        }
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
