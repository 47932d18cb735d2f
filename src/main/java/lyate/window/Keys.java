package lyate.window;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.event.ActionEvent;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.KeyStroke;

/** Keyboard and focus for the painted components. */
final class Keys {

    private Keys() {}

    /** Runs an action when a key is pressed while the component has the focus. */
    static void bind(JComponent component, String keyStroke, Runnable action) {
        component.getInputMap().put(KeyStroke.getKeyStroke(keyStroke), keyStroke);
        component.getActionMap().put(keyStroke, new AbstractAction() {
            @Override
            public void actionPerformed(ActionEvent event) {
                action.run();
            }
        });
    }

    static void repaintOnFocus(JComponent component) {
        component.addFocusListener(new FocusAdapter() {
            @Override
            public void focusGained(FocusEvent event) {
                component.repaint();
            }

            @Override
            public void focusLost(FocusEvent event) {
                component.repaint();
            }
        });
    }

    /** A frame round the component that has the focus. */
    static void paintFocus(Graphics2D g, JComponent component, Theme theme) {
        if (component.isFocusOwner()) {
            int line = theme.space("tiny");
            g.setColor(theme.color("focus"));
            g.setStroke(new BasicStroke(line));
            g.drawRect(line / 2, line / 2, component.getWidth() - line, component.getHeight() - line);
        }
    }
}
