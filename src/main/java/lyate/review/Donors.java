package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import lyate.acidity.AcidityEstimator;
import lyate.acidity.IonisationEnthalpies;
import lyate.acidity.IonisationEnthalpy;
import lyate.flask.TransferThermodynamics;
import lyate.flask.TransferThermodynamics.Acid;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteFinder;
import lyate.stock.Medium;

/** Sets the proton sites of a substrate against the working base. */
final class Donors {

    private final SiteFinder finder;
    private final AcidityEstimator acidity;
    private final IonisationEnthalpies enthalpies;
    private final IonPairs ionPairs;

    Donors(SiteFinder finder, AcidityEstimator acidity, IonisationEnthalpies enthalpies, IonPairs ionPairs) {
        this.ionPairs = ionPairs;
        this.finder = finder;
        this.acidity = acidity;
        this.enthalpies = enthalpies;
    }

    /**
     * Every site that a scale has values for, the one whose proton goes first in front.
     *
     * @throws ReviewException where the substrate has no proton to give, or none with a known pKa
     */
    List<Donor> of(Step step, WorkingBase base) throws ReviewException {
        List<Donor> donors = of(step.substrate(), step, base);
        if (donors.isEmpty()) {
            throw new ReviewException("the substrate has no proton whose pKa can be set against " + base.name());
        }
        return donors;
    }

    /** The same for any molecule in the flask; may be empty. */
    List<Donor> of(Molecule molecule, Step step, WorkingBase base) {
        ScaleChoice scale = new ScaleChoice(step.solvent());
        double kelvin = step.temperatureCelsius() + 273.15;
        List<Donor> donors = new ArrayList<>();
        for (ProtonSite site : finder.sites(molecule, Role.ACID)) {
            scale.compare(base.pKa(), base.strong(), medium -> acidity.acidity(molecule, site, medium)
                            .map(value -> ionPairs.paired(value, molecule, site.atom(), base, step.solvent())), site.siteClass().family())
                    .ifPresent(comparison -> donors.add(new Donor(site, molecule.label(site.atom()), comparison,
                            atTemperature(comparison, site, base, kelvin), 0)));
        }
        donors.sort(Comparator.comparingDouble(Donor::effectiveLogK).reversed());
        return donors;
    }

    /** Ionisation enthalpies are known on the aqueous scale alone. */
    private TransferThermodynamics atTemperature(Comparison comparison, ProtonSite site, WorkingBase base, double kelvin) {
        boolean aqueous = comparison.donor().medium().equals(Medium.WATER);
        Optional<IonisationEnthalpy> donor = enthalpies.of(site.siteClass()).filter(known -> aqueous);
        Optional<IonisationEnthalpy> acceptor = base.shelfBase().flatMap(shelf -> enthalpies.of(shelf.family()))
                .filter(known -> aqueous);
        return TransferThermodynamics.of(acid(comparison.donor().pKa(), donor), acid(comparison.acceptor().pKa(), acceptor), kelvin);
    }

    private static Acid acid(double pKa, Optional<IonisationEnthalpy> enthalpy) {
        return enthalpy.map(known -> Acid.of(pKa, known.kiloJoulePerMole())).orElse(Acid.of(pKa));
    }

    /**
     * The site the step means: the one named, else the one whose proton goes first.
     *
     * @throws ReviewException naming the label and the labels there are
     */
    static Donor intended(Step step, List<Donor> donors) throws ReviewException {
        Optional<String> label = step.intendedSite();
        if (label.isEmpty()) {
            return donors.get(0);
        }
        OptionalInt atom = step.substrate().atomLabelled(label.get());
        if (atom.isEmpty()) {
            throw new ReviewException("the substrate has no atom " + label.get() + "; its proton sites are " + labels(donors));
        }
        return donors.stream().filter(donor -> donor.site().equivalent().contains(atom.getAsInt())).findFirst()
                .orElseThrow(() -> new ReviewException("atom " + label.get() + " carries no hydrogen; the proton sites are "
                        + labels(donors)));
    }

    private static String labels(List<Donor> donors) {
        return String.join(", ", donors.stream().map(Donor::label).toList());
    }
}
