package lyate.review;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.flask.DoseCurve;
import lyate.flask.DosePoint;

/**
 * How far every site of the substrate has gone as more base goes in.
 *
 * @param equivalents         moles of base per mole of substrate, from 0 to the most asked for; close where a curve bends
 * @param percentTaken        share of the molecules whose site has lost a proton, by site label, one value per dose
 * @param intendedReaches95   dose at which the intended site is 95 % gone; empty where it never is
 * @param nextSite            site that goes next
 * @param nextPasses5         dose at which that site passes 5 %; empty where none does
 */
public record DoseResponse(List<Double> equivalents, Map<String, List<Double>> percentTaken, OptionalDouble intendedReaches95,
                           Optional<String> nextSite, OptionalDouble nextPasses5) {

    /** Highest dose looked at where nobody asks for another. */
    public static final double MOST_EQUIVALENTS = 4;

    private static final double LEAST_SPAN = 3;

    private static final double GONE = 0.95;
    private static final double HALF = 0.5;
    private static final double NOTABLE = 0.05;

    public DoseResponse {
        equivalents = List.copyOf(equivalents);
    }

    static DoseResponse of(StepFlask flask, List<Donor> donors, Donor intended, double mostEquivalents) {
        DoseCurve curve = DoseCurve.of(flask::at, mostEquivalents);
        Map<String, List<Double>> taken = new LinkedHashMap<>();
        for (Donor donor : donors) {
            taken.put(donor.label(), curve.points().stream().map(point -> 100 * flask.taken(point.equilibrium(), donor)).toList());
        }
        OptionalDouble half = reaching(curve, flask, intended, HALF);
        Optional<Donor> next = Optional.empty();
        OptionalDouble passes = OptionalDouble.empty();
        for (Donor donor : donors) {
            OptionalDouble dose = donor == intended ? OptionalDouble.empty() : reaching(curve, flask, donor, NOTABLE);
            boolean later = dose.isPresent() && half.isPresent() && dose.getAsDouble() > half.getAsDouble();
            if (later && (passes.isEmpty() || dose.getAsDouble() < passes.getAsDouble())) {
                next = Optional.of(donor);
                passes = dose;
            }
        }
        return new DoseResponse(curve.points().stream().map(DosePoint::equivalents).toList(), taken,
                reaching(curve, flask, intended, GONE), next.map(Donor::label), passes);
    }

    /** Highest dose that a picture of a step should show: three equivalents, or somewhat more than the step's own. */
    public static double span(Step step) {
        return Math.max(LEAST_SPAN, Math.ceil(step.equivalents() * 1.2));
    }

    /** Highest dose of this curve. */
    public double highest() {
        return equivalents.get(equivalents.size() - 1);
    }

    /** Share a site has lost at any dose of the curve, per cent; the points lie so close that lines between them do. */
    public double percentAt(String site, double dose) {
        List<Double> percent = percentTaken.get(site);
        int after = 0;
        while (after < equivalents.size() - 1 && equivalents.get(after) < dose) {
            after++;
        }
        int before = Math.max(0, after - 1);
        double width = equivalents.get(after) - equivalents.get(before);
        double part = width == 0 ? 1 : Math.min(1, (dose - equivalents.get(before)) / width);
        return percent.get(before) + part * (percent.get(after) - percent.get(before));
    }

    private static OptionalDouble reaching(DoseCurve curve, StepFlask flask, Donor donor, double share) {
        return curve.equivalentsReaching(share, point -> flask.taken(point.equilibrium(), donor));
    }
}
