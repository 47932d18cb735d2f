package lyate.review;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import lyate.flask.PKaErrors;
import lyate.flask.UncertaintyPropagation;
import lyate.review.VerdictRule.World;

/**
 * Carries the uncertainty of the pKa values to the verdict. Three kinds of error: the base's own and the scale's, felt by
 * every transfer; one shared by sites of a family, since one class value or one correlation made them; one of each site.
 */
final class VerdictOdds {

    /** Below this probability no verdict is given. */
    static final double DECIDED = 0.6;
    /** Half of the variance of a site is shared with its family (assumption; see docs/science.md). */
    private static final double SHARED = Math.sqrt(0.5);

    private final UncertaintyPropagation propagation = new UncertaintyPropagation();

    /** Probability of each verdict that occurs, most probable first. */
    Map<Verdict, Double> of(List<Donor> donors, World mean) {
        return propagation.probabilities(errors(donors), shifts -> VerdictRule.judge(shifted(mean, shifts)));
    }

    /** The most probable verdict, or {@link Verdict#UNDECIDED} where none is probable enough. */
    static Verdict verdict(Map<Verdict, Double> probabilities) {
        return probabilities.entrySet().stream().max(Map.Entry.comparingByValue())
                .filter(entry -> entry.getValue() >= DECIDED).map(Map.Entry::getKey).orElse(Verdict.UNDECIDED);
    }

    private static World shifted(World mean, double[] shifts) {
        double[] logK = mean.logK().clone();
        for (int i = 0; i < logK.length; i++) {
            logK[i] -= shifts[i];
        }
        return mean.withLogK(logK);
    }

    private static PKaErrors errors(List<Donor> donors) {
        List<PKaErrors.Shared> shared = new ArrayList<>();
        shared.add(loadings(donors, donor -> donor.comparison().acceptor().sigma()));
        for (String family : donors.stream().map(VerdictOdds::family).collect(Collectors.toCollection(LinkedHashSet::new))) {
            shared.add(loadings(donors, donor -> family(donor).equals(family) ? SHARED * sigma(donor) : 0));
        }
        return new PKaErrors(donors.stream().map(donor -> SHARED * sigma(donor)).toList(), shared);
    }

    private static PKaErrors.Shared loadings(List<Donor> donors, ToDoubleFunction<Donor> loading) {
        return new PKaErrors.Shared(donors.stream().map(loading::applyAsDouble).toList());
    }

    private static double sigma(Donor donor) {
        return donor.comparison().donor().sigma();
    }

    private static String family(Donor donor) {
        return donor.site().siteClass().family();
    }
}
