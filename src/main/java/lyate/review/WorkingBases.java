package lyate.review;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;

/** Says which base is really in the flask: the one added, the solvent's lyate ion, or none. */
final class WorkingBases {

    /** From this log10 K on, the solvent takes the base before anything else does. */
    private static final double LEVELLING_LOG_K = 2;
    /** C–H of hydrocarbon and ether solvents above this pKa (DMSO) moves too slowly to count; base-solvent.csv knows the exceptions. */
    private static final double INERT_SOLVENT_PKA = 40;

    /** How far the nominal strength of a solid base in an aprotic solvent may be off, pKa units (common practice). */
    static final double HETEROGENEOUS_SIGMA = 1.0;

    private final BaseStrength strength;
    private final BaseSolventRules solventRules;
    private final Stockroom stockroom;

    WorkingBases(BaseStrength strength, BaseSolventRules solventRules, Stockroom stockroom) {
        this.strength = strength;
        this.solventRules = solventRules;
        this.stockroom = stockroom;
    }

    WorkingBase of(Step step) {
        Base base = step.base();
        Solvent solvent = step.solvent();
        Function<Medium, Optional<KnownPKa>> pKa = remembered(medium -> strength.pKa(base, medium)
                .map(known -> isHeterogeneous(base, solvent) ? widened(known) : known));
        Optional<Double> logK = isInert(solvent) ? Optional.empty() : logK(pKa, solvent, solvent);
        if (isLyateIonOf(solvent, base)) {
            return WorkingBase.asAdded(base, pKa, logK);
        }
        boolean destroyed = solventRules.of(base, solvent, step.temperatureCelsius()).stream().anyMatch(SolventEffect::destroysBase);
        if (logK.filter(value -> value >= LEVELLING_LOG_K).isPresent()) {
            return WorkingBase.lyateIon(solvent, lyateOnShelf(solvent, base), logK.get(), destroyed || solvent.kind() != Solvent.Kind.PROTIC);
        }
        return destroyed ? WorkingBase.destroyed(base, solvent, pKa) : WorkingBase.asAdded(base, pKa, logK);
    }

    /** Whether the base reacts from a solid that the solvent does not dissolve, so that its strength is only nominal. */
    static boolean isHeterogeneous(Base base, Solvent solvent) {
        return base.family().insoluble() && !base.family().irreversible() && solvent.kind() != Solvent.Kind.PROTIC;
    }

    private static KnownPKa widened(KnownPKa known) {
        return new KnownPKa(known.pKa(), Math.hypot(known.sigma(), HETEROGENEOUS_SIGMA), known.source());
    }

    /** Asks once for each medium: a strength worked out from a structure costs as much as a substrate. */
    private static Function<Medium, Optional<KnownPKa>> remembered(Function<Medium, Optional<KnownPKa>> pKa) {
        Map<Medium, Optional<KnownPKa>> known = new ConcurrentHashMap<>();
        return medium -> known.computeIfAbsent(medium, pKa);
    }

    /** log10 K at 25 degrees C of the working base against a liquid that is in the flask beside the solvent. */
    Optional<Double> logK(WorkingBase base, Solvent liquid, Solvent solvent) {
        return logK(base.pKa(), liquid, solvent);
    }

    /** Whether a base is what the solvent itself becomes when it loses its proton, as sodium amide in ammonia. */
    static boolean isLyateIonOf(Solvent solvent, Base base) {
        Optional<String> conjugateAcid = key(base.conjugateAcid());
        return conjugateAcid.isPresent() && conjugateAcid.equals(key(solvent.smiles()));
    }

    private static boolean isInert(Solvent solvent) {
        return solvent.kind() != Solvent.Kind.PROTIC
                && solvent.donorPKa(Medium.DMSO).or(() -> solvent.donorPKa(Medium.WATER))
                        .filter(donor -> donor.pKa() >= INERT_SOLVENT_PKA).isPresent();
    }

    private static Optional<Double> logK(Function<Medium, Optional<KnownPKa>> base, Solvent liquid, Solvent solvent) {
        Medium preferred = solvent.kind() == Solvent.Kind.PROTIC ? Medium.WATER : Medium.DMSO;
        Medium other = preferred.equals(Medium.WATER) ? Medium.DMSO : Medium.WATER;
        return difference(base, liquid, preferred).or(() -> difference(base, liquid, other));
    }

    private static Optional<Double> difference(Function<Medium, Optional<KnownPKa>> base, Solvent liquid, Medium medium) {
        return base.apply(medium).flatMap(acceptor ->
                liquid.donorPKa(medium).map(donor -> acceptor.pKa() - donor.pKa()));
    }

    /** The base of the stockroom that is this solvent's lyate ion, with the counter-ion of the base added if there is one. */
    private Optional<Base> lyateOnShelf(Solvent solvent, Base added) {
        Optional<String> wanted = key(solvent.smiles());
        List<Base> lyates = stockroom.bases().stream().filter(base -> !base.counterIon().equals("none"))
                .filter(base -> wanted.isPresent() && wanted.equals(key(base.conjugateAcid()))).toList();
        return lyates.stream().min(Comparator.comparing(base -> !base.counterIon().equals(added.counterIon())));
    }

    private static Optional<String> key(String smiles) {
        try {
            return Optional.of(new MoleculeReader().read(smiles).canonicalKey());
        } catch (MoleculeException e) {
            // Conjugate acids such as hydrogen are no molecules to the reader; no solvent is one of them.
            return Optional.empty();
        }
    }
}
