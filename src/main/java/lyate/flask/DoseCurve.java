package lyate.flask;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.hipparchus.analysis.solvers.BrentSolver;

/**
 * How far every proton has gone as base is added. Every point is a solved equilibrium; points lie close where a curve
 * bends, so that straight lines between them are off by less than {@value #BEND}. Levels that are crossed are found on
 * the equilibrium itself, not read off the points.
 */
public final class DoseCurve {

    private static final double BEND = 0.002;
    private static final double COARSE_POINTS_PER_EQUIVALENT = 20;
    private static final double FINEST_STEP = 1e-4;
    private static final double CROSSING_ACCURACY = 1e-12;

    private final DoubleFunction<Flask> flaskAt;
    private final List<DosePoint> points;

    private DoseCurve(DoubleFunction<Flask> flaskAt, double mostEquivalents) {
        this.flaskAt = flaskAt;
        List<DosePoint> found = new ArrayList<>();
        found.add(solve(0));
        int steps = (int) Math.ceil(mostEquivalents * COARSE_POINTS_PER_EQUIVALENT);
        for (int step = 1; step <= steps; step++) {
            DosePoint last = found.get(found.size() - 1);
            addBetween(last, solve(Math.min(mostEquivalents, step / COARSE_POINTS_PER_EQUIVALENT)), found);
        }
        this.points = List.copyOf(found);
    }

    /** A curve over whatever the flask becomes; its holders must keep their order and number. */
    public static DoseCurve of(DoubleFunction<Flask> flaskAtEquivalents, double mostEquivalents) {
        return new DoseCurve(flaskAtEquivalents, mostEquivalents);
    }

    /** A base that settles with the rest; it becomes the last holder. */
    public static DoseCurve of(Flask rest, ProtonHolder oneEquivalent, double mostEquivalents) {
        return of(equivalents -> rest.with(oneEquivalent.withAmount(equivalents * oneEquivalent.amount())), mostEquivalents);
    }

    /** A base that runs to completion first. */
    public static DoseCurve of(Flask rest, IrreversibleBase oneEquivalent, double mostEquivalents) {
        return of(equivalents -> Completion.of(rest, oneEquivalent.withProtons(equivalents * oneEquivalent.protons())).after(),
                mostEquivalents);
    }

    /** Points in order of equivalents, from 0 to the most asked for. */
    public List<DosePoint> points() {
        return points;
    }

    /** The exact point at any dose. */
    public DosePoint solve(double equivalents) {
        return new DosePoint(equivalents, ProtonBalance.solve(flaskAt.apply(equivalents)));
    }

    /** Fewest equivalents at which that fraction of a place's protons has gone; empty where the curve does not get there. */
    public OptionalDouble equivalentsTaking(double fraction, int holder, int place) {
        return equivalentsReaching(fraction, point -> point.taken(holder, place));
    }

    /**
     * Fewest equivalents at which something that grows with the dose reaches a level; empty where the curve does not get
     * there.
     */
    public OptionalDouble equivalentsReaching(double level, ToDoubleFunction<DosePoint> value) {
        DosePoint last = points.get(0);
        for (DosePoint point : points) {
            if (value.applyAsDouble(point) >= level) {
                return OptionalDouble.of(crossing(level, value, last.equivalents(), point.equivalents()));
            }
            last = point;
        }
        return OptionalDouble.empty();
    }

    /** As {@link #equivalentsTaking(double, int, int)}, by the holder's name. */
    public OptionalDouble equivalentsTaking(double fraction, String holder, int place) {
        return equivalentsTaking(fraction, points.get(0).equilibrium().flask().indexOf(holder), place);
    }

    /**
     * The place that goes next: among those that had not yet lost {@code fraction} when the intended place was half
     * gone, the first to lose it. Places of holders that bring no proton (bases) are left out.
     *
     * @return empty where none does within the curve, or where the intended place never is half gone
     */
    public Optional<Passing> nextToPass(double fraction, String intendedHolder, int intendedPlace) {
        OptionalDouble half = equivalentsTaking(0.5, intendedHolder, intendedPlace);
        return half.isEmpty() ? Optional.empty() : passings(fraction).stream()
                .filter(passing -> passing.equivalents() > half.getAsDouble())
                .filter(passing -> !(passing.holder().equals(intendedHolder) && passing.place() == intendedPlace))
                .findFirst();
    }

    /** Every place that loses that fraction of its protons within the curve, soonest first; bases are left out. */
    public List<Passing> passings(double fraction) {
        List<Passing> passings = new ArrayList<>();
        List<ProtonHolder> holders = points.get(0).equilibrium().flask().holders();
        for (int index = 0; index < holders.size(); index++) {
            ProtonHolder holder = holders.get(index);
            for (int place = 0; holder.protonsHeld() > 0 && place < holder.places().size(); place++) {
                OptionalDouble equivalents = equivalentsTaking(fraction, index, place);
                if (equivalents.isPresent()) {
                    passings.add(new Passing(holder.name(), place, equivalents.getAsDouble()));
                }
            }
        }
        passings.sort(Comparator.comparingDouble(Passing::equivalents));
        return passings;
    }

    /**
     * A place that passes a fraction lost.
     *
     * @param holder      name of the holder
     * @param place       index of the place
     * @param equivalents base added by then
     */
    public record Passing(String holder, int place, double equivalents) {}

    private double crossing(double level, ToDoubleFunction<DosePoint> value, double below, double atOrAbove) {
        DoubleUnaryOperator beyond = equivalents -> value.applyAsDouble(solve(equivalents)) - level;
        if (below == atOrAbove || beyond.applyAsDouble(atOrAbove) == 0) {
            return atOrAbove;
        }
        return new BrentSolver(CROSSING_ACCURACY).solve(200, beyond::applyAsDouble, below, atOrAbove);
    }

    private void addBetween(DosePoint from, DosePoint to, List<DosePoint> found) {
        double width = to.equivalents() - from.equivalents();
        if (width > FINEST_STEP) {
            DosePoint middle = solve(from.equivalents() + width / 2);
            if (bends(from, middle, to)) {
                addBetween(from, middle, found);
                addBetween(middle, to, found);
                return;
            }
        }
        found.add(to);
    }

    private static boolean bends(DosePoint from, DosePoint middle, DosePoint to) {
        List<HolderState> states = middle.equilibrium().states();
        for (int holder = 0; holder < states.size(); holder++) {
            for (int place = 0; place < states.get(holder).holder().places().size(); place++) {
                double straight = (from.taken(holder, place) + to.taken(holder, place)) / 2;
                if (Math.abs(middle.taken(holder, place) - straight) > BEND) {
                    return true;
                }
            }
        }
        return false;
    }
}
