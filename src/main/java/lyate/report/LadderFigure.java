package lyate.report;

import java.awt.geom.Point2D;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/**
 * The acidity ladder: one vertical pKa axis, sites of the substrate on its left, base and solvent on its right, each with
 * its uncertainty; a bracket from the intended site to the base carries log K.
 */
final class LadderFigure {

    private static final double WIDTH = 310;
    private static final double HEIGHT = 214;
    private static final double TOP = 30;
    private static final double BOTTOM = 200;
    private static final double LEFT_RAIL = 116;
    private static final double RIGHT_RAIL = 204;
    private static final double FONT = 11;
    private static final double MARK = 5;
    /** More labels than this on one side have one line each. */
    private static final int MOST_TALL = 6;

    private final LetteredSite anchor;
    private final Ladder ladder;
    /** Highest first. */
    private final List<Rung> rungs;
    private final double low;
    private final double high;

    LadderFigure(LetteredSite anchor, Ladder ladder) {
        this.anchor = anchor;
        this.ladder = ladder;
        this.rungs = ladder.rungs().stream().sorted(Comparator.comparingDouble(Rung::pKa).reversed()).toList();
        this.low = Math.floor(ladder.low() - 1);
        this.high = Math.max(low + 8, Math.ceil(ladder.high() + 1));
    }

    String write(String id) {
        Svg svg = new Svg(WIDTH, HEIGHT);
        axis(svg);
        bracket(svg);
        labels(svg, rungs.stream().filter(Rung::left).toList(), -1, LEFT_RAIL);
        labels(svg, rungs.stream().filter(rung -> !rung.left()).toList(), 1, RIGHT_RAIL);
        String names = rungs.stream().map(rung -> name(rung) + " " + rung.text()).collect(Collectors.joining("; "));
        return svg.write(id, "Acidity ladder, pKa in " + medium(), "Highest pKa first. " + names + ". log K from the intended site to the base: "
                + Words.signed(anchor.transfer().logK()) + ".");
    }

    private void axis(Svg svg) {
        svg.line(LEFT_RAIL, TOP, LEFT_RAIL, BOTTOM, Ink.LINE, 1);
        svg.line(RIGHT_RAIL, TOP, RIGHT_RAIL, BOTTOM, Ink.SOFT, 1);
        int step = List.of(1, 2, 5, 10, 20).stream().filter(units -> units * (BOTTOM - TOP) / (high - low) > 18).findFirst().orElse(50);
        for (int value = (int) low; value <= high; value++) {
            if (value % step == 0) {
                svg.line(RIGHT_RAIL - 5, y(value), RIGHT_RAIL, y(value), Ink.SOFT, 1);
                svg.text(RIGHT_RAIL - 8, y(value) + 4, Words.minus(Integer.toString(value)), FONT, Ink.SOFT, "end", false);
            }
        }
        svg.text((LEFT_RAIL + RIGHT_RAIL) / 2, 14, "pKa in " + medium(), FONT, Ink.TEXT, "middle", true);
    }

    private void bracket(Svg svg) {
        double from = y(anchor.transfer().acidity().pKa());
        double to = y(ladder.basePKa());
        double x = LEFT_RAIL + 14;
        svg.line(LEFT_RAIL, from, x, from, Ink.INTENDED, 1, "stroke-dasharray", "3 3");
        svg.line(x, to, RIGHT_RAIL, to, Ink.INTENDED, 1, "stroke-dasharray", "3 3");
        svg.line(x, from, x, to, Ink.INTENDED, 1.8);
        if (Math.abs(from - to) > 14) {
            double back = to + Math.signum(from - to) * 8;
            svg.path(String.format(Locale.ROOT, "M%.1f %.1fL%.1f %.1fL%.1f %.1fZ", x, to, x - 4, back, x + 4, back), Ink.INTENDED, Ink.INTENDED, 0.5);
        }
        String text = "log K " + Words.signed(anchor.transfer().logK());
        double middle = (from + to) / 2;
        svg.box(x - 7, middle - 8.5, Svg.width(text, FONT) + 4, 17, 3, Ink.INTENDED_GROUND, Ink.INTENDED, 0.6);
        svg.text(x - 4, middle + 4, text, FONT, Ink.INTENDED, "start", false);
    }

    private void labels(Svg svg, List<Rung> side, int direction, double rail) {
        double[] wanted = side.stream().mapToDouble(rung -> y(rung.pKa())).toArray();
        double[] placed = LabelSpread.spread(wanted, side.size() > MOST_TALL ? 14 : 27, TOP - 8, BOTTOM + 10);
        for (int i = 0; i < placed.length; i++) {
            Rung rung = side.get(i);
            double x = rail + direction * 26;
            svg.path(String.format(Locale.ROOT, "M%.1f %.1fL%.1f %.1fL%.1f %.1f", rail, wanted[i], rail + direction * 12, wanted[i], x - direction * 3, placed[i]),
                    "none", Ink.LINE, 0.8);
            mark(svg, rung, rail, wanted[i]);
            String anchorWord = direction < 0 ? "end" : "start";
            boolean oneLine = side.size() > MOST_TALL;
            String name = shortened(name(rung));
            if (oneLine) {
                svg.text(x, placed[i] + 4, name + "  " + rung.brief(), FONT, ink(rung), anchorWord, false);
            } else {
                svg.text(x, placed[i] - 1, name, FONT, ink(rung), anchorWord, true);
                svg.text(x, placed[i] + 11, rung.text(), FONT, Ink.TEXT, anchorWord, false);
            }
        }
    }

    /** Room beside a rail is for 15 letters or so. */
    private static String shortened(String name) {
        return name.length() <= 15 ? name : name.substring(0, 14).strip() + "\u2026";
    }

    /** Disc for a site, triangle for the base, square for the rest. */
    private void mark(Svg svg, Rung rung, double x, double y) {
        double top = Math.max(TOP, y(rung.pKa() + rung.sigma()));
        double bottom = Math.min(BOTTOM, y(rung.pKa() - rung.sigma()));
        svg.line(x, top, x, bottom, ink(rung), 2);
        svg.line(x - 3, top, x + 3, top, ink(rung), 1.4);
        svg.line(x - 3, bottom, x + 3, bottom, ink(rung), 1.4);
        if (rung.site().isPresent()) {
            svg.disc(new Point2D.Double(x, y), MARK, Ink.PAPER, ink(rung));
            if (rung.site().get().intended()) {
                svg.ring(new Point2D.Double(x, y), MARK + 3, ink(rung), 1);
            }
            if (rung.site().get().fraction() > 0.005) {
                svg.arc(new Point2D.Double(x, y), MARK, rung.site().get().fraction(), ink(rung), 3);
            }
        } else if (rung.kind() == Rung.Kind.BASE) {
            svg.path(String.format(Locale.ROOT, "M%.1f %.1fL%.1f %.1fL%.1f %.1fZ", x - MARK, y, x + MARK, y - MARK, x + MARK, y + MARK), ink(rung), ink(rung), 1);
        } else {
            svg.box(x - MARK + 1, y - MARK + 1, 2 * MARK - 2, 2 * MARK - 2, 0, ink(rung), ink(rung), 1);
        }
    }

    private static String name(Rung rung) {
        return rung.site().map(site -> site.letter() + " ").orElse("") + rung.name();
    }

    private static String ink(Rung rung) {
        return rung.kind() == Rung.Kind.BASE ? Ink.BASE : rung.site().map(LetteredSite::ink).orElse(Ink.SOLVENT);
    }

    private String medium() {
        return Words.medium(ladder.medium());
    }

    private double y(double pKa) {
        return BOTTOM - (pKa - low) / (high - low) * (BOTTOM - TOP);
    }
}
