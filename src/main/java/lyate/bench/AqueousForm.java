package lyate.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import lyate.acidity.Acidity;
import lyate.acidity.AcidityEstimator;
import lyate.flask.HolderState;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteFinder;
import lyate.stock.Medium;

/**
 * A molecule as it meets water: the places whose protons come and go between pH −1 and 15. Each place is taken to be
 * independent of the others; pKa values measured on the molecule itself already contain what they feel of one another.
 *
 * @param name             what users call it
 * @param holder           its places; amount 1, holding the protons of the structure as drawn
 * @param uncharged        set of places that hold their protons where no site bears a charge, bit by bit
 * @param canBeUncharged   whether there is such a form: not with a quaternary nitrogen
 * @param withoutPKa       labels of sites whose pKa in water is not known
 */
public record AqueousForm(String name, ProtonHolder holder, long uncharged, boolean canBeUncharged, List<String> withoutPKa) {

    private static final double LOWEST_PKA = -1;
    private static final double HIGHEST_PKA = 15;

    public AqueousForm {
        withoutPKa = List.copyOf(withoutPKa);
    }

    /** The form of one substance known by its pKa alone. */
    public static AqueousForm acid(String name, double pKa) {
        return new AqueousForm(name, ProtonHolder.acid(name, 1, pKa), 1, true, List.of());
    }

    /** The form of one base known by the pKa of its conjugate acid alone. */
    public static AqueousForm base(String name, double pKaOfConjugateAcid) {
        return new AqueousForm(name, ProtonHolder.base(name, 1, pKaOfConjugateAcid), 0, true, List.of());
    }

    /** Finds the sites of a molecule and their pKa in water. */
    public static AqueousForm of(String name, Molecule molecule, SiteFinder finder, AcidityEstimator acidity) {
        List<ProtonPlace> places = new ArrayList<>();
        List<String> withoutPKa = new ArrayList<>();
        long uncharged = 0;
        int held = 0;
        int charge = totalCharge(molecule);
        for (ProtonSite site : finder.sites(molecule)) {
            if (sharesAnAnion(molecule, site)) {
                continue;
            }
            Optional<Acidity> known = acidity.acidity(molecule, site, Medium.WATER);
            if (known.isEmpty()) {
                withoutPKa.add(molecule.label(site.atom()));
                continue;
            }
            for (int atom : atomsThatCount(molecule, site)) {
                double pKa = known.get().pKa() + statistics(molecule, site);
                if (pKa < LOWEST_PKA || pKa > HIGHEST_PKA) {
                    continue;
                }
                boolean holdsNow = site.role() == Role.ACID;
                boolean holdsUncharged = molecule.charge(atom) < 0 || molecule.charge(atom) == 0 && holdsNow;
                charge += (holdsUncharged ? 1 : 0) - (holdsNow ? 1 : 0);
                uncharged |= holdsUncharged ? 1L << places.size() : 0;
                held += holdsNow ? 1 : 0;
                places.add(new ProtonPlace(molecule.label(atom), pKa));
            }
        }
        return new AqueousForm(name, new ProtonHolder(name, 1, places, List.of(), held), uncharged, charge == 0, withoutPKa);
    }

    /** Fraction of the substance in which no site bears a charge, as water at that pH meets it. */
    public double unchargedFraction(double pH) {
        return canBeUncharged ? HolderState.at(holder, pH).microstate(uncharged) : 0;
    }

    /** The other oxygen of a carboxylate: the same place for a proton, drawn without the charge. */
    private static boolean sharesAnAnion(Molecule molecule, ProtonSite site) {
        return site.role() == Role.BASE && IntStream.of(molecule.neighbours(site.atom()))
                .filter(middle -> molecule.bondOrder(site.atom(), middle) == 2)
                .flatMap(middle -> IntStream.of(molecule.neighbours(middle)))
                .anyMatch(other -> molecule.charge(other) < 0);
    }

    /** Equivalent heteroatoms each lose a proton; of a carbon site only the first is lost. */
    private static List<Integer> atomsThatCount(Molecule molecule, ProtonSite site) {
        boolean carbon = molecule.atomicNumber(site.atom()) == 6;
        return carbon ? List.of(site.atom()) : site.equivalent();
    }

    /** The pKa of a site counts all its equivalent atoms at once; that of each is higher by the statistical factor. */
    private static double statistics(Molecule molecule, ProtonSite site) {
        int count = atomsThatCount(molecule, site).size();
        return site.role() == Role.ACID ? Math.log10(count) : -Math.log10(count);
    }

    static int totalCharge(Molecule molecule) {
        int charge = 0;
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            charge += molecule.charge(atom);
        }
        return charge;
    }
}
