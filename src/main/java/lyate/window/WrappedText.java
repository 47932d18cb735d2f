package lyate.window;

import java.awt.Dimension;
import java.awt.Insets;
import java.awt.Rectangle;
import javax.swing.JTextArea;
import javax.swing.UIManager;

/** Text that wraps, can be selected and copied, and looks like a label. */
final class WrappedText extends JTextArea {

    WrappedText(String text) {
        super(text.replace("log K", "log\u00a0K"));
        setLineWrap(true);
        setWrapStyleWord(true);
        setEditable(false);
        setOpaque(false);
        setBorder(null);
        setMargin(new Insets(0, 0, 0, 0));
        getAccessibleContext().setAccessibleName(text);
        plainFont();
    }

    @Override
    public void updateUI() {
        super.updateUI();
        setOpaque(false);
        setBorder(null);
        plainFont();
    }

    /** Text that is set or resized must not scroll itself into view. */
    @Override
    public void scrollRectToVisible(Rectangle area) {}

    private void plainFont() {
        setFont(UIManager.getFont("Label.font"));
    }

    @Override
    public Dimension getMinimumSize() {
        return new Dimension(0, super.getMinimumSize().height);
    }
}
