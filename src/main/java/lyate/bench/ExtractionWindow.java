package lyate.bench;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.DoublePredicate;

/**
 * A range of pH in which one substance is uncharged and goes into the organic layer while the other is charged and stays
 * in the water. Only charge is looked at: a charged salt may still be greasy, an uncharged substance may like water.
 *
 * @param fromPH         lower end
 * @param toPH           upper end
 * @param organicLayer   what goes into the organic layer
 * @param water          what stays in the water
 */
public record ExtractionWindow(double fromPH, double toPH, String organicLayer, String water) {

    /** Share of each substance that has to be where it should. */
    public static final double CLEAN = 0.99;

    private static final double LOWEST_PH = 0;
    private static final double HIGHEST_PH = 14;
    private static final int STEPS = 280;

    /**
     * The pH at which two substances are parted best, whether or not that is clean.
     *
     * @param pH               where
     * @param unchargedProduct share of the product that is uncharged there
     * @param unchargedOther   share of the other that is uncharged there
     */
    public record Best(double pH, double unchargedProduct, double unchargedOther) {}

    /** Every clean window between pH 0 and 14, from low pH on. */
    public static List<ExtractionWindow> between(AqueousForm product, AqueousForm other) {
        List<ExtractionWindow> windows = new ArrayList<>(windows(product, other));
        windows.addAll(windows(other, product));
        windows.sort(Comparator.comparingDouble(ExtractionWindow::fromPH));
        return List.copyOf(windows);
    }

    /** Where the shares of uncharged product and other differ most. */
    public static Best best(AqueousForm product, AqueousForm other) {
        Best best = at(LOWEST_PH, product, other);
        for (int step = 1; step <= STEPS; step++) {
            Best here = at(pH(step), product, other);
            if (difference(here) > difference(best)) {
                best = here;
            }
        }
        return best;
    }

    private static List<ExtractionWindow> windows(AqueousForm organic, AqueousForm water) {
        DoublePredicate clean = pH -> organic.unchargedFraction(pH) >= CLEAN && water.unchargedFraction(pH) <= 1 - CLEAN;
        List<ExtractionWindow> windows = new ArrayList<>();
        double from = clean.test(LOWEST_PH) ? LOWEST_PH : Double.NaN;
        for (int step = 1; step <= STEPS; step++) {
            boolean here = clean.test(pH(step));
            if (here && Double.isNaN(from)) {
                from = edge(clean, pH(step), pH(step - 1));
            } else if (!here && !Double.isNaN(from)) {
                windows.add(new ExtractionWindow(from, edge(clean, pH(step - 1), pH(step)), organic.name(), water.name()));
                from = Double.NaN;
            }
        }
        if (!Double.isNaN(from)) {
            windows.add(new ExtractionWindow(from, HIGHEST_PH, organic.name(), water.name()));
        }
        return windows;
    }

    /** The last clean pH between one inside and one outside the window. */
    private static double edge(DoublePredicate clean, double inside, double outside) {
        double in = inside;
        double out = outside;
        while (Math.abs(out - in) > 1e-9) {
            double middle = (in + out) / 2;
            if (clean.test(middle)) {
                in = middle;
            } else {
                out = middle;
            }
        }
        return in;
    }

    private static Best at(double pH, AqueousForm product, AqueousForm other) {
        return new Best(pH, product.unchargedFraction(pH), other.unchargedFraction(pH));
    }

    private static double difference(Best best) {
        return Math.abs(best.unchargedProduct() - best.unchargedOther());
    }

    private static double pH(int step) {
        return LOWEST_PH + step * (HIGHEST_PH - LOWEST_PH) / STEPS;
    }
}
