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

    /**
     * How uncertain the log K of one site is.
     *
     * @param sigma   standard uncertainty of the site's own pKa
     * @param partner that of the base or acid it is set against, felt by every site
     * @param family  family of the site's class
     */
    record Uncertain(double sigma, double partner, String family) {

        static Uncertain of(Donor donor) {
            return new Uncertain(donor.comparison().donor().sigma(), donor.comparison().acceptor().sigma(),
                    donor.site().siteClass().family());
        }
    }

    /** Probability of each verdict that occurs, most probable first; sites in the order of the world's constants. */
    Map<Verdict, Double> of(List<Uncertain> sites, World mean) {
        return propagation.probabilities(errors(sites), shifts -> VerdictRule.judge(shifted(mean, shifts)));
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

    private static PKaErrors errors(List<Uncertain> sites) {
        List<PKaErrors.Shared> shared = new ArrayList<>();
        shared.add(loadings(sites, Uncertain::partner));
        for (String family : sites.stream().map(Uncertain::family).collect(Collectors.toCollection(LinkedHashSet::new))) {
            shared.add(loadings(sites, site -> site.family().equals(family) ? SHARED * site.sigma() : 0));
        }
        return new PKaErrors(sites.stream().map(site -> SHARED * site.sigma()).toList(), shared);
    }

    private static PKaErrors.Shared loadings(List<Uncertain> sites, ToDoubleFunction<Uncertain> loading) {
        return new PKaErrors.Shared(sites.stream().map(loading::applyAsDouble).toList());
    }
}
