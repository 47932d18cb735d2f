package lyate.review;

import java.util.List;
import java.util.Map;
import lyate.acidity.Acidity;

/**
 * What becomes of a protonation, and why. The counterpart of {@link Review} for an acid and a basic site.
 *
 * @param step            what was asked
 * @param verdict         {@code selective}: a salt by the rule of practice, log K (the ΔpKa of salt selection) of 3 or more
 * @param probability     probability of that verdict, 0 to 1
 * @param probabilities   probability of every verdict that is possible
 * @param intendedSite    label of the site judged
 * @param firstSite       label of the site that takes the proton first; {@code solvent} or {@code none}
 * @param logK            log10 K at the intended site: pKa of its conjugate acid − pKa of the acid, in water
 * @param sigmaLogK       its standard uncertainty
 * @param intendedPercent share of the intended site that holds the proton at equilibrium
 * @param otherPercent    highest share protonated at any other site of the substrate
 * @param uptakes         every basic site, most basic first
 * @param protonsToGive   protons of one mole of acid that are acidic enough for the rule of practice; 0 where none is
 * @param findings        most severe first
 * @param explanation     which numbers and which rule gave the verdict
 * @param assumptions     what was assumed where the step said nothing
 */
public record Protonation(AcidStep step, Verdict verdict, double probability, Map<Verdict, Double> probabilities,
                          String intendedSite, String firstSite, double logK, double sigmaLogK, double intendedPercent,
                          double otherPercent, List<Uptake> uptakes, int protonsToGive, List<Finding> findings,
                          List<String> explanation, List<String> assumptions) implements Judgement {

    /**
     * One basic site against the acid.
     *
     * @param site              label
     * @param atoms             its equivalent atoms (indices)
     * @param acidity           pKa of the conjugate acid in water
     * @param logK              that pKa − pKa of the acid
     * @param percentProtonated share that holds the proton at equilibrium, at the amounts given
     */
    public record Uptake(String site, List<Integer> atoms, Acidity acidity, double logK, double percentProtonated) {

        public Uptake {
            atoms = List.copyOf(atoms);
        }
    }

    public Protonation {
        probabilities = Map.copyOf(probabilities);
        uptakes = List.copyOf(uptakes);
        findings = List.copyOf(findings);
        explanation = List.copyOf(explanation);
        assumptions = List.copyOf(assumptions);
    }

    /** What the verdict means for a protonation, in words. */
    public String meaning() {
        return switch (verdict) {
            case SELECTIVE -> "a salt: the pKa differ by 3 or more, the rule of practice";
            case PARTIAL -> "the proton is shared, or another site shares it: a salt may form or may not";
            case TOO_WEAK -> "the acid does not protonate the intended site";
            case WRONG_SITE -> "a more basic site of the substrate takes the proton first";
            case LEVELLED -> "the solvent takes the proton first";
            case INCOMPATIBLE -> "the proton transfer could work, but a side reaction wins";
            case UNDECIDED -> "the uncertainty does not allow a verdict";
        };
    }
}
