package lyate.window;

import java.awt.BasicStroke;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lyate.report.Ladder;
import lyate.report.Rung;
import lyate.report.Words;

/** The acidity ladder laid out for one size: axis in the middle, sites left, everything that takes or offers a proton right. */
final class LadderPicture {

    private final Ladder ladder;
    private final Palette palette;
    private final Font font;
    private final FontMetrics metrics;
    private final LadderAxis axis;
    private final double leftRail;
    private final double rightRail;
    private final boolean brief;
    private final int width;
    private final List<LadderLabel> labels;
    private final LadderMarks marks;

    LadderPicture(Ladder ladder, Palette palette, Font font, Dimension size, Graphics2D measure) {
        this.ladder = ladder;
        this.palette = palette;
        this.font = font;
        this.metrics = measure.getFontMetrics(font);
        this.width = size.width;
        int line = metrics.getHeight();
        this.axis = LadderAxis.around(ladder.low(), ladder.high(), 2.6 * line, size.height - 1.9 * line);
        double apart = palette.space("margin") + metrics.stringWidth("log K +00.0") + 4.0 * palette.space("gap") + metrics.stringWidth("00");
        List<Rung> sites = ladder.rungs().stream().filter(Rung::left).toList();
        List<Rung> others = ladder.rungs().stream().filter(rung -> !rung.left()).toList();
        this.brief = widest(sites, measure, false) + apart + widest(others, measure, false) > size.width;
        double left = widest(sites, measure, brief);
        // Names on the right are the longer ones and bear shortening; letters and values on the left do not.
        double spare = (size.width - left - apart - widest(others, measure, brief)) / 2;
        this.leftRail = left + Math.max(0, spare);
        this.rightRail = leftRail + apart;
        this.marks = new LadderMarks(palette);
        this.labels = LadderLabel.place(ladder.rungs(), axis, line + palette.space("small"),
                axis.top() - line, axis.bottom() + line * 0.9);
    }

    void paint(Graphics2D g, Optional<Rung> focused) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.setFont(font);
        paintAxis(g);
        paintBracket(g);
        for (LadderLabel label : labels) {
            paintLabel(g, label, focused.filter(label.rung()::equals).isPresent());
        }
        // The chosen base goes on top of the ones it is compared with.
        ladder.rungs().stream().sorted(Comparator.comparing(rung -> rung.kind() == Rung.Kind.BASE)).forEach(rung -> marks.paint(g, rung, railOf(rung), axis));
    }

    /** The rung whose mark or label is at a point. */
    Optional<Rung> rungAt(Point2D point) {
        double reach = metrics.getHeight() / 2.0;
        Optional<Rung> mark = ladder.rungs().stream()
                .filter(rung -> Math.hypot(point.getX() - railOf(rung), point.getY() - axis.y(rung.pKa())) < reach)
                .min(Comparator.comparingDouble(rung -> Math.abs(point.getY() - axis.y(rung.pKa()))));
        return mark.or(() -> labels.stream().filter(label -> label.rung().left() == point.getX() < rightRail)
                .filter(label -> Math.abs(label.y() - point.getY()) < reach).map(LadderLabel::rung).findFirst());
    }

    List<LadderLabel> labels() {
        return labels;
    }

    private double railOf(Rung rung) {
        return rung.left() ? leftRail : rightRail;
    }

    private void paintAxis(Graphics2D g) {
        g.setColor(palette.color("line.soft"));
        g.setStroke(new BasicStroke(palette.space("hair")));
        g.draw(new Line2D.Double(leftRail, axis.top(), leftRail, axis.bottom()));
        g.setColor(palette.color("ink.soft"));
        g.draw(new Line2D.Double(rightRail, axis.top(), rightRail, axis.bottom()));
        int step = axis.tickStep(metrics.getHeight() * 1.5);
        for (int value = (int) axis.low(); value <= axis.high(); value++) {
            double tick = value % step == 0 ? palette.space("small") : palette.space("tiny");
            g.draw(new Line2D.Double(rightRail - tick, axis.y(value), rightRail, axis.y(value)));
            if (value % step == 0) {
                String text = Words.whole(value);
                g.drawString(text, (float) (rightRail - palette.space("mark") - palette.space("gap") - metrics.stringWidth(text)), (float) (axis.y(value) + metrics.getAscent() * 0.38));
            }
        }
        Font bold = font.deriveFont(Font.BOLD);
        g.setFont(bold);
        g.setColor(palette.color("ink"));
        centred(g, "pKa in " + Words.medium(ladder.medium()), rightRail - palette.space("margin"), metrics.getAscent() + palette.space("small"));
        g.setFont(font);
        g.setColor(palette.color("ink.soft"));
        g.drawString("stronger acid", palette.space("gap"), (float) (axis.bottom() + metrics.getHeight() * 1.5));
        String stronger = "weaker base";
        g.drawString(stronger, width - metrics.stringWidth(stronger) - palette.space("gap"), (float) (axis.bottom() + metrics.getHeight() * 1.5));
        if (!ladder.beyond().isEmpty()) {
            g.drawString(ladder.beyond(), palette.space("gap"), metrics.getAscent() + palette.space("small"));
        }
    }

    /** From the intended site to the base: downhill where the base stands higher. */
    private void paintBracket(Graphics2D g) {
        Rung site = ladder.intended().orElse(null);
        if (site == null) {
            return;
        }
        double from = axis.y(site.pKa());
        double to = axis.y(ladder.basePKa());
        double x = leftRail + palette.space("margin");
        g.setColor(palette.color("intended"));
        g.setStroke(new BasicStroke(palette.space("hair"), BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10, new float[] {palette.space("small"), palette.space("small")}, 0));
        g.draw(new Line2D.Double(x, to, rightRail, to));
        g.draw(new Line2D.Double(leftRail, from, x, from));
        g.setStroke(new BasicStroke(palette.space("tiny")));
        g.draw(new Line2D.Double(x, from, x, to));
        if (Math.abs(from - to) > 3 * palette.space("mark")) {
            arrowHead(g, x, to, Math.signum(to - from));
        }
        double logK = site.site().orElseThrow().transfer().logK();
        String text = "log K " + Words.signed(logK);
        double pillWidth = metrics.stringWidth(text) + 2.0 * palette.space("small");
        double middle = (from + to) / 2;
        Rectangle2D pill = new Rectangle2D.Double(x + palette.space("small"), middle - metrics.getHeight() / 2.0, pillWidth, metrics.getHeight());
        g.setColor(palette.ground("intended"));
        g.fill(pill);
        g.setColor(palette.color("intended"));
        g.drawString(text, (float) (pill.getX() + palette.space("small")), (float) (middle + metrics.getAscent() * 0.38));
    }

    private void arrowHead(Graphics2D g, double x, double tip, double direction) {
        double half = palette.space("small");
        Path2D head = new Path2D.Double();
        head.moveTo(x, tip);
        head.lineTo(x - half, tip - direction * 2 * half);
        head.lineTo(x + half, tip - direction * 2 * half);
        head.closePath();
        g.fill(head);
    }

    private void paintLabel(Graphics2D g, LadderLabel label, boolean focused) {
        Rung rung = label.rung();
        double side = rung.left() ? -1 : 1;
        double bend = railOf(rung) + side * palette.space("wide");
        double end = railOf(rung) + side * leader();
        g.setColor(palette.color("line"));
        g.setStroke(new BasicStroke(palette.space("hair")));
        Path2D leader = new Path2D.Double();
        leader.moveTo(railOf(rung) + side * palette.space("mark"), axis.y(rung.pKa()));
        leader.lineTo(bend, axis.y(rung.pKa()));
        leader.lineTo(end, label.y());
        g.draw(leader);
        double room = (rung.left() ? end : width - end) - 2.0 * palette.space("small");
        LadderText text = LadderText.fitted(rung, font, g, room, brief);
        double x = rung.left() ? end - palette.space("small") - text.width() : end + palette.space("small");
        text.paint(g, palette, x, label.y() + metrics.getAscent() * 0.38, focused);
    }

    /** Room for the longest label of a rail, leader line included. */
    private double widest(List<Rung> rungs, Graphics2D g, boolean brevity) {
        double text = rungs.stream().mapToDouble(rung -> LadderText.fitted(rung, font, g, Double.POSITIVE_INFINITY, brevity).width()).max().orElse(0);
        return text + leader() + 2.0 * palette.space("small") + palette.space("gap");
    }

    private double leader() {
        return palette.space("wide") + palette.space("margin");
    }

    private void centred(Graphics2D g, String text, double x, double baseline) {
        double half = g.getFontMetrics().stringWidth(text) / 2.0;
        g.drawString(text, (float) Math.max(palette.space("gap"), Math.min(x - half, width - 2 * half - palette.space("gap"))), (float) baseline);
    }
}
