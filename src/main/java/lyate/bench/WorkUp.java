package lyate.bench;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.DoublePredicate;

/**
 * At which pH a product and what accompanies it go which way.
 *
 * @param product    the product
 * @param curve      uncharged share of the product against pH, from 0 to 14
 * @param partings   one for each accompanying substance
 * @param assumption what was assumed, for the user
 */
public record WorkUp(AqueousForm product, List<CurvePoint> curve, List<Parting> partings, String assumption) {

    private static final int POINTS_PER_PH = 10;
    private static final int HIGHEST_PH = 14;
    private static final String ASSUMPTION = "Uncharged substances are taken to go into the organic layer and charged ones to"
            + " stay in the water; sites are taken as independent, in water at 25 degrees C.";

    /**
     * One point of the curve.
     *
     * @param pH        of the water
     * @param uncharged share of the product in which no site bears a charge
     */
    public record CurvePoint(double pH, double uncharged) {}

    /**
     * How the product is parted from one other substance.
     *
     * @param other   its name
     * @param windows ranges of pH that part them cleanly; empty where there is none
     * @param best    the pH that parts them best
     */
    public record Parting(String other, List<ExtractionWindow> windows, ExtractionWindow.Best best) {

        public Parting {
            windows = List.copyOf(windows);
        }

        /** The advice in one sentence. */
        public String sentence() {
            if (windows.isEmpty()) {
                return String.format(Locale.ROOT, "No pH between 0 and 14 parts the product from %s by charge alone to 99 %%;"
                        + " best at pH %.1f, with %.0f %% of the product and %.0f %% of %s uncharged.", other, best.pH(),
                        100 * best.unchargedProduct(), 100 * best.unchargedOther(), other);
            }
            ExtractionWindow first = windows.get(0);
            return String.format(Locale.ROOT, "Between pH %.1f and %.1f %s goes into the organic layer and %s stays in the water.",
                    first.fromPH(), first.toPH(), first.organicLayer(), first.water());
        }
    }

    /** Where the product itself goes, for example {@code The product goes into the organic layer from pH 0 to 7.9; it stays in the water from pH 11.9 to 14.} */
    public String productSentence() {
        String organic = ranges(share -> share >= ExtractionWindow.CLEAN);
        String water = ranges(share -> share <= 1 - ExtractionWindow.CLEAN);
        String first = organic.isEmpty() ? leastCharged() : "The product goes into the organic layer " + organic;
        return first + (water.isEmpty() ? "." : "; it stays in the water " + water + ".");
    }

    private String leastCharged() {
        CurvePoint best = curve.stream().max(Comparator.comparingDouble(CurvePoint::uncharged)).orElseThrow();
        return String.format(Locale.ROOT, "At no pH is the product uncharged to 99 %%; most of it, %.0f %%, at pH %.1f", 100 * best.uncharged(), best.pH());
    }

    private String ranges(DoublePredicate wanted) {
        List<String> ranges = new ArrayList<>();
        double from = Double.NaN;
        for (int i = 0; i < curve.size(); i++) {
            CurvePoint point = curve.get(i);
            boolean here = wanted.test(point.uncharged());
            if (here && Double.isNaN(from)) {
                from = point.pH();
            }
            boolean last = i == curve.size() - 1 || !wanted.test(curve.get(i + 1).uncharged());
            if (here && last) {
                ranges.add(String.format(Locale.ROOT, "from pH %.1f to %.1f", from, point.pH()));
                from = Double.NaN;
            }
        }
        return String.join(" and ", ranges);
    }

    public WorkUp {
        curve = List.copyOf(curve);
        partings = List.copyOf(partings);
    }

    /** Looks at a product beside everything it is to be freed from. */
    public static WorkUp of(AqueousForm product, List<AqueousForm> others) {
        List<CurvePoint> curve = new ArrayList<>();
        for (int point = 0; point <= HIGHEST_PH * POINTS_PER_PH; point++) {
            double pH = point / (double) POINTS_PER_PH;
            curve.add(new CurvePoint(pH, product.unchargedFraction(pH)));
        }
        List<Parting> partings = others.stream().map(other -> new Parting(other.name(),
                ExtractionWindow.between(product, other), ExtractionWindow.best(product, other))).toList();
        return new WorkUp(product, curve, partings, ASSUMPTION);
    }
}
