package lyate.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import lyate.review.DoseResponse;

/** Per cent of each proton taken against equivalents of base; every line is named at its end, the dose of the step is marked. */
final class DoseFigure {

    private static final double WIDTH = 270;
    private static final double HEIGHT = 214;
    private static final double LEFT = 32;
    private static final double RIGHT = 226;
    private static final double TOP = 24;
    private static final double BOTTOM = 174;
    private static final double FONT = 11;
    /** Points closer together than this, px, are one on paper. */
    private static final double LEAST_STEP = 0.6;
    /** Donors that never lose more than this, per cent, stay out of the picture. */
    private static final double WORTH_A_LINE = 0.5;
    private static final List<String> DASHES = List.of("6 3", "2 3", "8 3 2 3");

    private final DoseResponse doses;
    private final List<LetteredSite> sites;
    private final double dose;

    DoseFigure(DoseResponse doses, List<LetteredSite> sites, double dose) {
        this.doses = doses;
        this.sites = sites.stream().filter(site -> taken(site).stream().anyMatch(percent -> percent > WORTH_A_LINE)).toList();
        this.dose = dose;
    }

    String write(String id) {
        Svg svg = new Svg(WIDTH, HEIGHT);
        axes(svg);
        svg.line(x(dose), TOP - 6, x(dose), BOTTOM, Ink.BASE, 1.6, "stroke-dasharray", "3 2");
        boolean late = dose > 0.6 * doses.highest();
        svg.text(x(dose) + (late ? -4 : 4), TOP - 8, Words.equivalents(dose), FONT, Ink.BASE, late ? "end" : "start", true);
        for (int i = 0; i < sites.size(); i++) {
            line(svg, sites.get(i), i);
        }
        names(svg);
        return svg.write(id, "Protons taken against equivalents of base", description());
    }

    private void axes(Svg svg) {
        for (int percent = 0; percent <= 100; percent += 25) {
            svg.line(LEFT, y(percent), RIGHT, y(percent), Ink.LINE, percent == 0 ? 1.2 : 0.5);
            svg.text(LEFT - 6, y(percent) + 4, Integer.toString(percent), FONT, Ink.SOFT, "end", false);
        }
        int step = Math.max(1, (int) Math.ceil(doses.highest() / 6));
        for (int equivalents = 0; equivalents <= doses.highest(); equivalents += step) {
            svg.line(x(equivalents), BOTTOM, x(equivalents), BOTTOM + 4, Ink.SOFT, 1);
            svg.text(x(equivalents), BOTTOM + 17, Integer.toString(equivalents), FONT, Ink.SOFT, "middle", false);
        }
        svg.text((LEFT + RIGHT) / 2, BOTTOM + 36, "equivalents of base", FONT, Ink.TEXT, "middle", false);
        svg.text(2, TOP - 8, "% taken", FONT, Ink.TEXT, "start", false);
    }

    private void line(Svg svg, LetteredSite site, int index) {
        StringBuilder path = new StringBuilder();
        List<Double> percent = taken(site);
        double lastX = -1;
        for (int i = 0; i < percent.size(); i++) {
            double x = x(doses.equivalents().get(i));
            if (x - lastX >= LEAST_STEP || i == percent.size() - 1) {
                path.append(String.format(Locale.ROOT, "%s%.1f %.1f", path.isEmpty() ? "M" : "L", x, y(percent.get(i))));
                lastX = x;
            }
        }
        if (site.intended()) {
            svg.path(path.toString(), "none", site.ink(), 2.4);
        } else {
            svg.path(path.toString(), "none", site.ink(), 1.6, "stroke-dasharray", DASHES.get(index % DASHES.size()));
        }
    }

    private void names(Svg svg) {
        List<LetteredSite> downwards = new ArrayList<>(sites);
        downwards.sort((one, other) -> Double.compare(last(other), last(one)));
        double[] wanted = downwards.stream().mapToDouble(site -> y(last(site))).toArray();
        double[] placed = LabelSpread.spread(wanted, FONT + 3, TOP - 8, BOTTOM + 8);
        for (int i = 0; i < placed.length; i++) {
            LetteredSite site = downwards.get(i);
            svg.text(RIGHT + 5, placed[i] + 4, site.letter() + " " + site.transfer().donor(), FONT, site.ink(), "start", site.intended());
        }
    }

    private String description() {
        return sites.isEmpty() ? "No site loses its protons." : sites.stream().map(site -> site.transfer().donor() + ": "
                + sayAt(site, 1) + ", " + sayAt(site, 2) + ", " + sayAt(site, 3)).collect(Collectors.joining("; ")) + ".";
    }

    private String sayAt(LetteredSite site, int equivalents) {
        return Words.percent(doses.percentAt(site.transfer().donor(), equivalents)) + " at " + equivalents + " equivalent" + (equivalents == 1 ? "" : "s");
    }

    private double last(LetteredSite site) {
        List<Double> percent = taken(site);
        return percent.get(percent.size() - 1);
    }

    private List<Double> taken(LetteredSite site) {
        return doses.percentTaken().getOrDefault(site.transfer().donor(), List.of());
    }

    private double x(double equivalents) {
        return LEFT + (RIGHT - LEFT) * equivalents / doses.highest();
    }

    private static double y(double percent) {
        return BOTTOM - (BOTTOM - TOP) * percent / 100;
    }
}
