package lyate.review;

import java.util.List;
import java.util.Locale;

/** What every kind of review answers: of a deprotonation ({@link Review}) or of a protonation ({@link Protonation}). */
public interface Judgement {

    /** The answer. */
    Verdict verdict();

    /** Probability of that verdict, 0 to 1. */
    double probability();

    /** That probability in words; nothing that rests on estimates is certain. */
    default String probabilityInWords() {
        return probability() > 0.99 ? "> 99 %" : String.format(Locale.ROOT, "%.0f %%", 100 * probability());
    }

    /** log10 K at the intended site. */
    double logK();

    /** Label of the site that reacts first; {@code solvent}, {@code water} or {@code none}. */
    String firstSite();

    /** Share of the intended site that has reacted at equilibrium, per cent. */
    double intendedPercent();

    /** Highest share that has reacted at any other site of the substrate, per cent. */
    double otherPercent();

    /** Most severe first. */
    List<Finding> findings();
}
