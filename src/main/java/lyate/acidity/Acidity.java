package lyate.acidity;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lyate.stock.Medium;

/**
 * The pKa of one site in one medium, with everything it rests on.
 *
 * @param pKa           pKa of the site as it stands in the molecule, statistical factors included
 * @param sigma         standard uncertainty, pKa units
 * @param medium        the solvent whose scale this is
 * @param basis         how it was obtained
 * @param contributions for an estimate: what it adds up from, class value first; empty for a measured value
 * @param missing       what the estimate could not account for, in words
 * @param relatives     nearest measured relatives
 * @param spread        where the uncertainty comes from, in words
 * @param alternatives  other ways to a value for the same site and medium, that of its class among them
 * @param source        citation or method
 */
public record Acidity(double pKa, double sigma, Medium medium, Basis basis, List<Contribution> contributions,
                      List<String> missing, List<Relative> relatives, String spread, List<Alternative> alternatives,
                      String source) {

    /** How a value was obtained. */
    public enum Basis {
        MEASURED, ESTIMATED, TRANSFERRED;

        /** The word used in output. */
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** Which effect on acidity a contribution stands for. */
    public enum Effect { ATOM, ORBITAL, RESONANCE, INDUCTION, CHARGE, HYDROGEN_BOND, STERICS, STATISTICS, RELATIVES, MEDIUM }

    /**
     * One term of an estimate.
     *
     * @param text   for example {@code 4-NO2, sigma minus 1.24}
     * @param effect the kind of effect
     * @param value  pKa units it adds
     * @param atoms  atoms it comes from
     */
    public record Contribution(String text, Effect effect, double value, List<Integer> atoms) {
        public Contribution {
            atoms = List.copyOf(atoms);
        }
    }

    /**
     * A measured compound close to the one asked for.
     *
     * @param smiles     its structure
     * @param site       label of its site
     * @param pKa        its measured value
     * @param similarity 0 to 1
     * @param source     citation
     */
    public record Relative(String smiles, String site, double pKa, double similarity, String source) {}

    /**
     * A value that another way leads to.
     *
     * @param text  for example {@code class value: phenol O-H}
     * @param pKa   its value
     * @param sigma its standard uncertainty
     */
    public record Alternative(String text, double pKa, double sigma) {}

    public Acidity {
        contributions = List.copyOf(contributions);
        missing = List.copyOf(missing);
        relatives = List.copyOf(relatives);
        alternatives = List.copyOf(alternatives);
    }

    /** A value taken from a table. */
    public static Acidity measured(double pKa, double sigma, Medium medium, String source) {
        return new Acidity(pKa, sigma, medium, Basis.MEASURED, List.of(), List.of(), List.of(),
                "of the measurement, as the table states it", List.of(), source);
    }

    /** The same value beside other ways to it. */
    Acidity beside(List<Alternative> others) {
        return new Acidity(pKa, sigma, medium, basis, contributions, missing, relatives, spread, others, source);
    }

    /** The same value taken apart into these terms. */
    Acidity from(List<Contribution> terms) {
        return new Acidity(pKa, sigma, medium, basis, terms, missing, relatives, spread, alternatives, source);
    }

    /**
     * The value where the anion is held by something else than the medium.
     *
     * @param lowering pKa units by which that makes the proton more acidic
     * @param error    standard uncertainty of the lowering, pKa units
     * @param cause    what holds the anion, for example {@code Li ion pair in tetrahydrofuran}
     * @param citation where the size comes from
     */
    public Acidity lowered(double lowering, double error, String cause, String citation) {
        List<Contribution> terms = new ArrayList<>(contributions);
        if (terms.isEmpty()) {
            terms.add(new Contribution(basis.word() + " in " + medium.symbol(), Effect.ATOM, pKa, List.of()));
        }
        terms.add(new Contribution(cause, Effect.CHARGE, -lowering, List.of()));
        String words = String.format(Locale.ROOT, "%.2f (%s), and %.2f of the %s, in quadrature", sigma, spread, error, cause);
        return new Acidity(pKa - lowering, Math.hypot(sigma, error), medium, Basis.TRANSFERRED, terms, missing, relatives, words,
                alternatives, source + String.format(Locale.ROOT, "; lowered by %.1f for the %s: ", lowering, cause) + citation);
    }

    /** This value as one of several ways. */
    Alternative alternative() {
        String way = contributions.isEmpty() ? basis.word() : basis == Basis.TRANSFERRED ? contributions.get(contributions.size() - 1).text()
                : contributions.size() == 1 ? contributions.get(0).text() : source;
        return new Alternative(way, pKa, sigma);
    }

    /** The same value with these measured relatives. */
    Acidity withRelatives(List<Relative> known) {
        return new Acidity(pKa, sigma, medium, basis, contributions, missing, known, spread, alternatives, source);
    }

    /** The same value, and why it was preferred. */
    Acidity because(String reason) {
        return new Acidity(pKa, sigma, medium, basis, contributions, missing, relatives, spread, alternatives, source + reason);
    }
}
