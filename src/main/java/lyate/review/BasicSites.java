package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import lyate.acidity.Acidity;
import lyate.acidity.AcidityEstimator;
import lyate.acidity.SiteCoupling;
import lyate.flask.Coupling;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteFinder;
import lyate.stock.Medium;

/**
 * The basic sites of a molecule with the pKa of their conjugate acids in water, most basic first.
 *
 * @param molecule whose sites they are
 * @param all      most basic first
 * @param coupling how much a proton on one site lowers the pKa of another
 */
record BasicSites(Molecule molecule, List<BasicSite> all, SiteCoupling coupling) {

    /** Sites weaker than this take no proton from any acid on the shelf and only cost time. */
    private static final double LEAST_PKA = -12;
    /** More places than this cost time and change nothing. */
    private static final int MOST_PLACES = 12;

    /**
     * One site.
     *
     * @param site    the site
     * @param label   its name, for example {@code N4}
     * @param acidity pKa of its conjugate acid in water
     */
    record BasicSite(ProtonSite site, String label, Acidity acidity) {}

    /** Finds them. */
    static BasicSites of(Molecule molecule, SiteFinder finder, AcidityEstimator estimator, SiteCoupling coupling) {
        List<BasicSite> found = new ArrayList<>();
        for (ProtonSite site : finder.sites(molecule, Role.BASE)) {
            estimator.acidity(molecule, site, Medium.WATER).filter(acidity -> acidity.pKa() > LEAST_PKA)
                    .ifPresent(acidity -> found.add(new BasicSite(site, molecule.label(site.atom()), acidity)));
        }
        found.sort(Comparator.comparingDouble((BasicSite site) -> site.acidity().pKa()).reversed());
        return new BasicSites(molecule, List.copyOf(found), coupling);
    }

    /**
     * The site meant: the one named, else the most basic.
     *
     * @throws ReviewException naming the label and the labels there are
     */
    BasicSite intended(Optional<String> label) throws ReviewException {
        if (all.isEmpty()) {
            throw new ReviewException("the substrate has no basic site whose pKa in water is known");
        }
        if (label.isEmpty()) {
            return all.get(0);
        }
        OptionalInt atom = molecule.atomLabelled(label.get());
        return all.stream().filter(site -> atom.isPresent() && site.site().equivalent().contains(atom.getAsInt())).findFirst()
                .orElseThrow(() -> new ReviewException("atom " + label.get() + " takes no proton; the basic sites are "
                        + String.join(", ", all.stream().map(BasicSite::label).toList())));
    }

    /** By how much a proton on one site lowers the pKa of another. */
    double lowering(BasicSite protonated, BasicSite other) {
        return coupling.shift(molecule, protonated.site(), other.site(), Medium.WATER);
    }

    /** The molecule without a proton on any of them. */
    ProtonHolder holder(String name, double amount) {
        List<BasicSite> owners = new ArrayList<>();
        List<Integer> atoms = new ArrayList<>();
        for (BasicSite site : all) {
            site.site().equivalent().stream().limit(MOST_PLACES - atoms.size()).forEach(atom -> {
                owners.add(site);
                atoms.add(atom);
            });
        }
        double[] pKa = new double[atoms.size()];
        List<Coupling> couplings = new ArrayList<>();
        for (int one = 0; one < atoms.size(); one++) {
            pKa[one] += owners.get(one).acidity().pKa() - Math.log10(owners.get(one).site().equivalent().size());
            for (int other = one + 1; other < atoms.size(); other++) {
                double raise = coupling.between(molecule, owners.get(one).site(), atoms.get(one), owners.get(other).site(),
                        atoms.get(other), Medium.WATER).pKa();
                couplings.add(new Coupling(one, other, raise));
                pKa[one] -= raise;
                pKa[other] -= raise;
            }
        }
        List<ProtonPlace> places = new ArrayList<>();
        for (int place = 0; place < pKa.length; place++) {
            places.add(new ProtonPlace(molecule.label(atoms.get(place)), pKa[place]));
        }
        return new ProtonHolder(name, amount, places, couplings, 0);
    }
}
