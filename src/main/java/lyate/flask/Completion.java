package lyate.flask;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * What an irreversible base does before anything settles: it takes protons mole for mole, from the most acidic donor on,
 * until it is used up or meets only donors that are weaker than its own conjugate acid.
 *
 * @param after    the flask without the protons taken; {@link ProtonBalance#solve} settles the rest
 * @param consumed where the protons came from, most acidic first
 * @param leftOver protons the base could still take but found nowhere
 */
public record Completion(Flask after, List<Consumed> consumed, double leftOver) {

    /**
     * Protons taken from one place.
     *
     * @param holder  name of the holder
     * @param place   index of the place that gave them; where coupled places share the loss, the one that gave most
     * @param level   pKa at which the place gave them, other places already empty being counted in
     * @param protons how many, in the unit of the amounts
     */
    public record Consumed(String holder, int place, double level, double protons) {}

    /** Protons one holder brought, and how easily they go. */
    private record Donation(int holder, int place, double level, double perMolecule) {}

    public Completion {
        consumed = List.copyOf(consumed);
    }

    /** Lets the base run to completion in the flask. */
    public static Completion of(Flask flask, IrreversibleBase base) {
        List<ProtonHolder> holders = new ArrayList<>(flask.holders());
        List<Consumed> consumed = new ArrayList<>();
        double left = base.protons();
        for (Donation donation : mostAcidicFirst(flask)) {
            ProtonHolder holder = holders.get(donation.holder());
            double offered = donation.perMolecule() * holder.amount();
            if (left <= 0 || donation.level() >= base.pKaOfConjugateAcid()) {
                break;
            }
            boolean all = left >= offered;
            double perMolecule = all ? donation.perMolecule() : left / holder.amount();
            holders.set(donation.holder(), holder.withProtonsHeld(Math.max(0, holder.protonsHeld() - perMolecule)));
            consumed.add(new Consumed(holder.name(), donation.place(), donation.level(), all ? offered : left));
            left = all ? left - offered : 0;
        }
        return new Completion(flask.withHolders(holders), consumed, left);
    }

    private static List<Donation> mostAcidicFirst(Flask flask) {
        List<Donation> donations = new ArrayList<>();
        for (int index = 0; index < flask.holders().size(); index++) {
            ProtonHolder holder = flask.holders().get(index);
            if (holder.amount() == 0) {
                continue;
            }
            List<Species> clusters = holder.clusters().stream().map(cluster -> new Species(cluster, 1)).toList();
            double held = holder.protonsHeld();
            for (Uptake uptake : Uptake.strongestFirst(clusters)) {
                double here = Math.min(held, uptake.protons());
                if (here > 0) {
                    int place = clusters.get(uptake.species()).polynomial().mostChanged(uptake.few(), uptake.many());
                    donations.add(new Donation(index, place, uptake.level(), here));
                }
                held -= here;
            }
        }
        donations.sort(Comparator.comparingDouble(Donation::level));
        return donations;
    }
}
