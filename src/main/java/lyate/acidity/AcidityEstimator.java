package lyate.acidity;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.acidity.Acidity.Alternative;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.acidity.lfer.LinearFreeEnergyEstimate;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.SiteClass;
import lyate.stock.Medium;
import lyate.table.Table;
import lyate.table.TableFolders;

/**
 * Puts a pKa on a proton site in a medium.
 *
 * <p>A value measured in that medium decides. Else the value measured in another medium and carried over (along the line
 * of its family or by the shift of its class) is weighed against the estimate made in that medium, and the one with the
 * smaller uncertainty is given; else an estimate made in
 * water or DMSO is carried over. Where nothing is known the answer is empty, never zero. A solvent without a scale of its
 * own is asked for by the medium that stands for it ({@code Solvent.scale()}). Immutable; safe to share between threads.
 */
public final class AcidityEstimator {

    private static final int CARBON = 6;
    private static final List<Medium> ESTIMATED_IN = List.of(Medium.WATER, Medium.DMSO);

    private final MeasuredAcidities measured;
    private final MediaTransfer transfer;
    private final ClassShift shift;
    private final List<SiteEstimate> estimates;

    /** The {@code estimates} that answer are averaged, the surer ones counting more. */
    public AcidityEstimator(MeasuredAcidities measured, MediaTransfer transfer, List<SiteEstimate> estimates) {
        this.measured = measured;
        this.transfer = transfer;
        this.shift = new ClassShift(transfer);
        this.estimates = List.copyOf(estimates);
    }

    /** The estimator of the tables in these folders. */
    public static AcidityEstimator load(TableFolders folders) {
        Table measured = Table.read(MeasuredAcidities.SCHEMA, folders);
        return new AcidityEstimator(MeasuredAcidities.of(measured), MediaTransfer.load(folders),
                List.of(LinearFreeEnergyEstimate.load(folders, measured), new ClassValueEstimate()));
    }

    /** The same without the table of measured values: what it says of a molecule nobody has measured. */
    public AcidityEstimator withoutMeasured() {
        return new AcidityEstimator(MeasuredAcidities.none(), transfer, estimates);
    }

    /** The pKa of the site in the medium, or empty where there is no way to know. */
    public Optional<Acidity> acidity(Molecule molecule, ProtonSite site, Medium medium) {
        return best(molecule, site, medium).map(acidity -> ClassValueEstimate.besideClassValue(acidity, site.siteClass()));
    }

    private Optional<Acidity> best(Molecule molecule, ProtonSite site, Medium medium) {
        List<Acidity> known = measured.inAnyMedium(molecule, site);
        Optional<Acidity> here = known.stream().filter(acidity -> acidity.medium().equals(medium)).findFirst();
        if (here.isPresent()) {
            return here;
        }
        Optional<Acidity> carried = carryMeasured(known, site, medium);
        Optional<Acidity> estimated = estimate(molecule, site, medium);
        if (carried.isPresent() && estimated.isPresent()) {
            return Optional.of(surer(carried.get(), estimated.get()));
        }
        return carried.or(() -> estimated).or(() -> estimateElsewhere(molecule, site, medium));
    }

    /** The relationship knows the substituents, the class value the kind: together they miss less than either (docs/accuracy.md). */
    private Optional<Acidity> estimate(Molecule molecule, ProtonSite site, Medium medium) {
        boolean heteroatom = molecule.atomicNumber(site.atom()) != CARBON;
        return estimates.stream().map(estimate -> estimate.estimate(molecule, site, medium)).flatMap(Optional::stream)
                .reduce((fine, plain) -> WeightedMean.of(fine, plain, heteroatom && medium.equals(Medium.WATER)));
    }

    private Optional<Acidity> estimateElsewhere(Molecule molecule, ProtonSite site, Medium medium) {
        List<Acidity> elsewhere = ESTIMATED_IN.stream().map(from -> estimate(molecule, site, from)).flatMap(Optional::stream).toList();
        return transfer.carry(elsewhere, site.siteClass().family(), medium);
    }

    /** The best way of the measured values: the line of the family, the shift of the class, the shift and then a line. */
    private Optional<Acidity> carryMeasured(List<Acidity> known, ProtonSite site, Medium medium) {
        SiteClass siteClass = site.siteClass();
        List<Acidity> starts = known.stream().map(acidity -> startOfRecipe(acidity, site)).flatMap(acidity -> Stream.concat(
                Stream.of(acidity), ESTIMATED_IN.stream().flatMap(hub -> shift.carry(acidity, siteClass, hub).stream()))).toList();
        return transfer.carry(starts, siteClass.family(), medium);
    }

    /** A measured value is the first term of what is carried over, so that the terms add up to the pKa. */
    private static Acidity startOfRecipe(Acidity acidity, ProtonSite site) {
        Contribution value = new Contribution("measured in " + acidity.medium().id(), Effect.ATOM, acidity.pKa(),
                List.of(site.atom()));
        return acidity.from(List.of(value));
    }

    private static Acidity surer(Acidity first, Acidity second) {
        boolean firstIsSurer = first.sigma() <= second.sigma();
        Acidity chosen = firstIsSurer ? first : second;
        Acidity other = firstIsSurer ? second : first;
        String why = String.format(Locale.ROOT, "; preferred to the %s value %.1f, whose uncertainty of %.1f is larger",
                other.basis().word(), other.pKa(), other.sigma());
        List<Alternative> alternatives = Stream.of(Stream.of(other.alternative()), chosen.alternatives().stream(),
                other.alternatives().stream()).flatMap(way -> way).toList();
        Acidity value = chosen.because(why).beside(alternatives);
        return value.relatives().isEmpty() ? value.withRelatives(other.relatives()) : value;
    }
}
