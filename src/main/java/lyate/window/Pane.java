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
    private final Veil veil;
    private final Theme theme;
    private final String title;

    Pane(String title, JComponent content, Theme theme) {
        this(title, content, null, theme);
    }

    /** @param tool what stands at the right of the heading; may be null */
    Pane(String title, JComponent content, JComponent tool, Theme theme) {
        super(new BorderLayout());
        this.theme = theme;
        this.title = title;
        heading = new JLabel(title);
        heading.setLabelFor(content);
        JPanel top = new JPanel(new BorderLayout());
        top.add(heading, BorderLayout.CENTER);
        if (tool != null) {
            top.add(tool, BorderLayout.EAST);
        }
        add(top, BorderLayout.NORTH);
        veil = new Veil(content, theme);
        add(veil);
        dress();
        theme.onChange(this::dress);
    }

    /** A remark behind the title; empty for none. */
    void note(String words) {
        heading.setText(words.isEmpty() ? title : title + "  \u2013  " + words);
    }

    /** Greys the content, or shows it plainly again. */
    void veil(boolean set) {
        veil.set(set);
    }

    private void dress() {
        heading.setFont(UIManager.getFont("Label.font").deriveFont(Font.BOLD));
        heading.setForeground(theme.color("ink.soft"));
        heading.setBorder(BorderFactory.createEmptyBorder(theme.space("small"), theme.space("gap"), theme.space("small"), theme.space("gap")));
    }
}
