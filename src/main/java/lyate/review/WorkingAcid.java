package lyate.review;

import java.util.Optional;
import java.util.stream.DoubleStream;
import lyate.acidity.Acidity;
import lyate.stock.Acid;
import lyate.stock.KnownPKa;

/**
 * The acid that is really in the flask once the solvent has had its say.
 *
 * @param pKa      of its first proton in water, or that of the protonated solvent where that is weaker
 * @param sigma    its standard uncertainty
 * @param levelled whether the solvent takes the proton over
 * @param stages   pKa of all its protons, strongest first
 */
record WorkingAcid(double pKa, double sigma, boolean levelled, double[] stages) {

    /** Least difference by which a proton counts as given, the rule of practice of salt selection. */
    static final double SALT = 3;

    static WorkingAcid of(Acid acid, KnownPKa own, Optional<Acidity> protonatedSolvent) {
        Optional<Acidity> stronger = protonatedSolvent.filter(solvent -> solvent.pKa() > own.pKa());
        double pKa = stronger.map(Acidity::pKa).orElse(own.pKa());
        double[] stages = DoubleStream.concat(DoubleStream.of(pKa), acid.furtherStages().stream().mapToDouble(KnownPKa::pKa)).toArray();
        return new WorkingAcid(pKa, stronger.map(Acidity::sigma).orElse(own.sigma()), stronger.isPresent(), stages);
    }

    /** How many of its protons a base takes by the rule of practice. */
    int protonsFor(double pKaOfConjugateAcid) {
        return (int) DoubleStream.of(stages).filter(stage -> pKaOfConjugateAcid - stage >= SALT).count();
    }
}
