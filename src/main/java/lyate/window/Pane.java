package lyate.window;

import java.awt.BorderLayout;
import java.awt.Font;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.UIManager;

/** A titled part of the window. */
final class Pane extends JPanel {

    private final JLabel heading;
    private final Theme theme;

    Pane(String title, JComponent content, Theme theme) {
        super(new BorderLayout());
        this.theme = theme;
        heading = new JLabel(title);
        heading.setLabelFor(content);
        add(heading, BorderLayout.NORTH);
        add(content);
        dress();
        theme.onChange(this::dress);
    }

    private void dress() {
        heading.setFont(UIManager.getFont("Label.font").deriveFont(Font.BOLD));
        heading.setForeground(theme.color("ink.soft"));
        heading.setBorder(BorderFactory.createEmptyBorder(theme.space("small"), theme.space("gap"), theme.space("small"), theme.space("gap")));
    }
}
