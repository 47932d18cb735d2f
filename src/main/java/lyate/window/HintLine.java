package lyate.window;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.FontMetrics;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.OptionalInt;
import javax.swing.JComponent;
import javax.swing.UIManager;
import javax.swing.text.BadLocationException;
import javax.swing.text.JTextComponent;

/** One line under a field: a hint, or what is wrong with a mark under the place. Its height never changes. */
final class HintLine extends JComponent {

    private static final String DOTS = "\u2026";

    private final Theme theme;
    private final JTextComponent field;
    private String text = "";
    private boolean problem;
    private OptionalInt offset = OptionalInt.empty();

    HintLine(Theme theme, JTextComponent field) {
        this.theme = theme;
        this.field = field;
    }

    void hint(String words) {
        say(words, false, OptionalInt.empty());
    }

    void problem(String message) {
        CaretMessage caret = CaretMessage.of(message);
        say(caret.sentence(), true, caret.offset());
    }

    private void say(String words, boolean wrong, OptionalInt at) {
        text = words;
        problem = wrong;
        offset = at;
        setToolTipText(words.isEmpty() ? null : words);
        field.putClientProperty("JComponent.outline", wrong ? "error" : null);
        field.getAccessibleContext().setAccessibleDescription(wrong ? "Problem: " + words : words);
        repaint();
    }

    String text() {
        return text;
    }

    boolean isProblem() {
        return problem;
    }

    @Override
    public Dimension getPreferredSize() {
        return new Dimension(0, metrics().getHeight() + theme.space("small"));
    }

    @Override
    public Dimension getMinimumSize() {
        return getPreferredSize();
    }

    private FontMetrics metrics() {
        return getFontMetrics(UIManager.getFont("small.font") == null ? UIManager.getFont("Label.font") : UIManager.getFont("small.font"));
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        Color colour = theme.color(problem ? "stop" : "ink.soft");
        g.setColor(colour);
        FontMetrics metrics = metrics();
        g.setFont(metrics.getFont());
        String words = problem ? "! " + text : text;
        g.drawString(clipped(words, metrics, getWidth()), 0, getHeight() - metrics.getDescent());
        offset.ifPresent(at -> paintCaret(g, at));
        g.dispose();
    }

    /** A wedge that points up at the letter where the text stops making sense. */
    private void paintCaret(Graphics2D g, int at) {
        try {
            Rectangle2D letter = field.modelToView2D(Math.min(at, field.getDocument().getLength()));
            double x = Math.max(0, Math.min(letter.getX(), getWidth()));
            double half = theme.space("small");
            Path2D wedge = new Path2D.Double();
            wedge.moveTo(x, 0);
            wedge.lineTo(x - half, half);
            wedge.lineTo(x + half, half);
            wedge.closePath();
            g.fill(wedge);
        } catch (BadLocationException e) {
            throw new IllegalStateException("offset was limited to the document", e);
        }
    }

    private static String clipped(String words, FontMetrics metrics, int width) {
        if (metrics.stringWidth(words) <= width) {
            return words;
        }
        int end = words.length();
        while (end > 0 && metrics.stringWidth(words.substring(0, end) + DOTS) > width) {
            end--;
        }
        return words.substring(0, end) + DOTS;
    }
}
