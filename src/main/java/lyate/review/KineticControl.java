package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lyate.review.KineticPreference.Control;

/** Applies what is known about which C–H proton goes first to the donors of a step. */
final class KineticControl {

    /** log10 units by which a kinetically favoured site leads its rival: both are tabulated as an order, not as a ratio. */
    private static final double LEAD = 2;
    /** Standard deviations of the difference added to the lead: what the two pKa are in doubt must not undo an order of rates. */
    private static final double SAFE = 2;

    private final KineticPreferences preferences;

    KineticControl(KineticPreferences preferences) {
        this.preferences = preferences;
    }

    /**
     * A preference that holds between two sites of the substrate.
     *
     * @param rule   the row
     * @param winner label of the site whose proton goes first
     * @param loser  label of the other
     */
    record Order(KineticPreference rule, String winner, String loser) {}

    /** The orders that hold among the sites the base reaches. */
    List<Order> orders(Step step, WorkingBase base, List<Donor> donors) {
        List<Donor> reached = donors.stream().filter(donor -> donor.logK() > VerdictRule.NONE).toList();
        List<Order> orders = new ArrayList<>();
        for (Donor winner : reached) {
            for (Donor loser : reached) {
                preference(step, base, winner, loser).filter(rule -> decides(rule, winner)).ifPresent(rule -> orders.add(new Order(rule, winner.label(), loser.label())));
            }
        }
        return orders;
    }

    /** Rates decide only where the proton is taken once and for all; one that comes back leaves the matter to the equilibrium. */
    private static boolean decides(KineticPreference rule, Donor winner) {
        return rule.control() == Control.EQUILIBRIUM || winner.logK() >= VerdictRule.COMPLETE;
    }

    private Optional<KineticPreference> preference(Step step, WorkingBase base, Donor winner, Donor loser) {
        return winner == loser ? Optional.empty() : base.shelfBase().flatMap(taking -> preferences.preference(step.substrate(),
                winner.site().atom(), loser.site().atom(), taking, step.temperatureCelsius(), step.solvent()));
    }

    /** The donors with the favoured ones ahead, the first to go in front; equilibrium orders need no push. */
    static List<Donor> ahead(List<Donor> donors, List<Order> orders) {
        List<Donor> moved = new ArrayList<>(donors);
        // Weakest rivals first, so that a lead over a rival that was itself pushed is a lead over where it ended.
        List<Order> byLoser = orders.stream().filter(order -> order.rule().control() == Control.RATE)
                .sorted(Comparator.comparingDouble(order -> find(donors, order.loser()).logK())).toList();
        for (Order order : byLoser) {
            Donor winner = find(moved, order.winner());
            Donor loser = find(moved, order.loser());
            double wanted = loser.effectiveLogK() + LEAD + SAFE * Math.hypot(sigma(winner), sigma(loser));
            double needed = Math.min(wanted, belowStronger(moved, winner, loser)) - winner.effectiveLogK();
            if (needed > 0) {
                moved.set(moved.indexOf(winner), winner.withAdvantage(winner.advantage() + needed));
            }
        }
        moved.sort(Comparator.comparingDouble(Donor::effectiveLogK).reversed());
        return moved;
    }

    /** An order of two sites says nothing of a third that is more acidic than both: the winner stays behind it. */
    private static double belowStronger(List<Donor> donors, Donor winner, Donor loser) {
        double stronger = Math.max(winner.effectiveLogK(), loser.effectiveLogK());
        return donors.stream().filter(donor -> donor != winner && donor != loser && donor.effectiveLogK() > stronger)
                .mapToDouble(donor -> donor.effectiveLogK() - VerdictRule.CLEAR).min().orElse(Double.POSITIVE_INFINITY);
    }

    private static double sigma(Donor donor) {
        return donor.comparison().donor().sigma();
    }

    private static Donor find(List<Donor> donors, String label) {
        return donors.stream().filter(donor -> donor.label().equals(label)).findFirst().orElseThrow();
    }
}
