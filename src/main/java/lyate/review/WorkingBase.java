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
 * @param name        in words, for example {@code sodium ethoxide}
 * @param shelfBase   the same as a base of the stockroom, where it holds one
 * @param pKa         pKa of its conjugate acid by medium
 * @param strong      whether its kind is judged on the DMSO scale
 * @param levelled    whether the solvent turned the base that was added into its own lyate ion, or destroyed it
 * @param destroyed   whether nobody would call what is left the base that was added: a carbanion or hydride in alcohol, a
 *                    strong base in a solvent with acidic C-H
 * @param logKSolvent log10 K at 25 degrees C of the base as added against the solvent's proton; empty where the solvent
 *                    has none
 */
record WorkingBase(String name, Optional<Base> shelfBase, Function<Medium, Optional<KnownPKa>> pKa, boolean strong,
                   boolean levelled, boolean destroyed, Optional<Double> logKSolvent) {

    /** How the name begins where nothing is left. */
    static final String NOTHING = "nothing";

    /** A base as it was added. */
    static WorkingBase asAdded(Base base, Function<Medium, Optional<KnownPKa>> pKa, Optional<Double> logKSolvent) {
        return new WorkingBase(base.name(), Optional.of(base), pKa, base.family().strong(), false, false, logKSolvent);
    }

    /** The anion that the solvent leaves when it gives up its proton. */
    static WorkingBase lyateIon(Solvent solvent, Optional<Base> shelfBase, double logKSolvent, boolean destroyed) {
        String name = shelfBase.map(Base::name).orElse("the lyate ion of " + solvent.name());
        return new WorkingBase(name, shelfBase, solvent::donorPKa, true, true, destroyed, Optional.of(logKSolvent));
    }

    /** Nothing that could take a proton is left; judged by the strength it had. */
    static WorkingBase destroyed(Base base, Solvent solvent, Function<Medium, Optional<KnownPKa>> pKa) {
        return new WorkingBase(NOTHING + ": " + solvent.name() + " destroys " + base.name(), Optional.of(base), pKa,
                base.family().strong(), true, true, Optional.empty());
    }
}
