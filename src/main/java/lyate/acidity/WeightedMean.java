package lyate.acidity;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lyate.acidity.Acidity.Alternative;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;

/**
 * The mean of two estimates of one site in one medium, each weighted with the inverse of its variance. Where they disagree the
 * mean is less sure than its parts: the spread between them is added in quadrature.
 */
final class WeightedMean {

    /**
     * By how much the second estimate, the value of the class, is less sure of an acid nobody has measured than the spread of the
     * known members says (found on acids that neither the class values nor the fit had seen).
     */
    private static final double UNSEEN_MEMBER = 1.5;

    /** The same for heteroatoms in water, whose relationships rest on thousands of values (docs/accuracy.md). */
    private static final double UNSEEN_MEMBER_WELL_KNOWN = 4;

    /** A relationship less sure than this is extrapolated from acids of another kind; the class value knows the kind. */
    private static final double FAR_FROM_DATA = 2;

    private WeightedMean() {}

    /** @param wellKnown whether the first estimate is that of a heteroatom in water */
    static Acidity of(Acidity first, Acidity second, boolean wellKnown) {
        if (wellKnown) {
            return mean(first, second, UNSEEN_MEMBER_WELL_KNOWN);
        }
        return first.sigma() > FAR_FROM_DATA && second.sigma() < first.sigma()
                ? second.beside(List.of(first.alternative())).withRelatives(first.relatives()) : mean(first, second, UNSEEN_MEMBER);
    }

    private static Acidity mean(Acidity first, Acidity second, double doubt) {
        double secondSigma = doubt * second.sigma();
        double firstWeight = 1 / (first.sigma() * first.sigma());
        double secondWeight = 1 / (secondSigma * secondSigma);
        double share = secondWeight / (firstWeight + secondWeight);
        double gap = second.pKa() - first.pKa();
        double sigma = Math.hypot(1 / Math.sqrt(firstWeight + secondWeight), Math.sqrt(share * (1 - share)) * Math.abs(gap));
        List<Contribution> terms = new ArrayList<>(first.contributions());
        String way = String.format(Locale.ROOT, "%.0f %% of the way to %.1f, %s", 100 * share, second.pKa(), second.alternative().text());
        terms.add(new Contribution(way, Effect.RELATIVES, share * gap, List.of()));
        List<Alternative> ways = List.of(first.alternative(), second.alternative());
        String spread = String.format(Locale.ROOT, "two estimates of %.2f (%s) and of %.2f (%s), counted %.1f times as wide, that are %.1f apart",
                first.sigma(), first.spread(), second.sigma(), second.spread(), doubt, Math.abs(gap));
        return new Acidity(first.pKa() + share * gap, sigma, first.medium(), first.basis(), terms, first.missing(), first.relatives(),
                spread, ways, first.source() + ", weighed with the class value: " + second.source());
    }
}
