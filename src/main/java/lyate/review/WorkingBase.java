package lyate.review;

import java.util.Optional;
import java.util.function.Function;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Solvent;

/**
 * The base that is really in the flask once the solvent has had its say.
 *
 * @param name     in words, for example {@code ethanol's lyate ion}
 * @param pKa      pKa of its conjugate acid by medium
 * @param strong   whether its kind is judged on the DMSO scale
 * @param levelled whether the solvent turned the base that was added into its own lyate ion
 * @param logKSolvent log10 K of the base as added against the solvent's proton; empty where the solvent has none
 */
record WorkingBase(String name, Function<Medium, Optional<KnownPKa>> pKa, boolean strong, boolean levelled,
                   Optional<Double> logKSolvent) {

    /** From this log10 K on, the solvent takes the base before anything else does. */
    static final double LEVELLING_LOG_K = 2;

    static WorkingBase of(Base base, Solvent solvent, BaseStrength strength) {
        Function<Medium, Optional<KnownPKa>> asAdded = medium -> strength.pKa(base, medium);
        Optional<Double> logK = against(solvent, solvent, asAdded);
        if (logK.filter(value -> value >= LEVELLING_LOG_K).isEmpty()) {
            return new WorkingBase(base.name(), asAdded, base.family().strong(), false, logK);
        }
        return new WorkingBase("the lyate ion of " + solvent.name(), solvent::donorPKa, true, true, logK);
    }

    /** log10 K at 25 degrees C against the most acidic proton of a liquid in the flask, where both are known. */
    Optional<Double> logKAgainst(Solvent liquid, Solvent solvent) {
        return against(liquid, solvent, pKa);
    }

    private static Optional<Double> against(Solvent liquid, Solvent solvent, Function<Medium, Optional<KnownPKa>> strength) {
        Medium preferred = solvent.kind() == Solvent.Kind.PROTIC ? Medium.WATER : Medium.DMSO;
        Medium other = preferred.equals(Medium.WATER) ? Medium.DMSO : Medium.WATER;
        return difference(strength, liquid, preferred).or(() -> difference(strength, liquid, other));
    }

    private static Optional<Double> difference(Function<Medium, Optional<KnownPKa>> strength, Solvent liquid, Medium medium) {
        return strength.apply(medium).flatMap(base ->
                liquid.donorPKa(medium).map(donor -> base.pKa() - donor.pKa()));
    }
}
