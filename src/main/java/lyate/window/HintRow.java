package lyate.window;

import java.awt.Dimension;
import java.awt.FontMetrics;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Point;
import java.awt.RenderingHints;
import java.awt.event.MouseEvent;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.SwingUtilities;
import javax.swing.ToolTipManager;
import javax.swing.UIManager;
import javax.swing.text.BadLocationException;
import javax.swing.text.JTextComponent;

/**
 * The row below the fields. Each hint starts below its field and may run on as far as the next hint; a problem carries a
 * wedge that points at the letter. The height never changes.
 */
final class HintRow extends JComponent {

    private static final String DOTS = "\u2026";

    private final Theme theme;
    private final List<FieldBox> boxes;

    HintRow(Theme theme, List<FieldBox> boxes) {
        this.theme = theme;
        this.boxes = List.copyOf(boxes);
        ToolTipManager.sharedInstance().registerComponent(this);
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
        FontMetrics metrics = metrics();
        g.setFont(metrics.getFont());
        for (FieldBox box : boxes) {
            HintLine line = box.line();
            if (!line.text().isEmpty()) {
                g.setColor(theme.color(line.isProblem() ? "stop" : "ink.soft"));
                int left = left(box);
                String words = clipped((line.isProblem() ? "! " : "") + line.text(), metrics, right(box) - left);
                g.drawString(words, left, getHeight() - metrics.getDescent());
                line.offset().ifPresent(at -> paintWedge(g, box.field(), at));
            }
        }
        g.dispose();
    }

    private int left(FieldBox box) {
        return SwingUtilities.convertPoint(box, new Point(0, 0), this).x;
    }

    /** Where the next hint starts, or the end of the row. */
    private int right(FieldBox box) {
        return boxes.stream().filter(other -> other.kind().compareTo(box.kind()) > 0 && !other.line().text().isEmpty())
                .mapToInt(this::left).min().orElse(getWidth()) - theme.space("gap");
    }

    private void paintWedge(Graphics2D g, JTextComponent field, int at) {
        try {
            Rectangle2D letter = field.modelToView2D(Math.min(at, field.getDocument().getLength()));
            int start = SwingUtilities.convertPoint(field, new Point(0, 0), this).x;
            double x = start + Math.max(0, Math.min(letter.getX(), field.getWidth()));
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

    @Override
    public String getToolTipText(MouseEvent event) {
        return boxes.stream().filter(box -> !box.line().text().isEmpty() && event.getX() >= left(box) && event.getX() < right(box))
                .map(box -> box.line().text()).findFirst().orElse(null);
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
