package lyate.review;

import java.util.List;
import java.util.Locale;
import lyate.acidity.Acidity.Basis;
import lyate.review.Finding.Severity;

/** Findings about the scales that the numbers stand on. */
final class ScaleFindings {

    private static final String RULE = "choice of the pKa scale, see the guide to the science";

    private ScaleFindings() {}

    /** Every rule of this kind. */
    static List<FindingRule> rules() {
        return List.of(ScaleFindings::carriedOver, ScaleFindings::disagreement);
    }

    private static List<Finding> carriedOver(Situation situation) {
        Donor intended = situation.intended();
        if (intended.comparison().donor().basis() != Basis.TRANSFERRED) {
            return List.of();
        }
        return List.of(new Finding(Severity.NOTE, FindingKind.SCALE_TRANSFER,
                String.format(Locale.ROOT, "The pKa of %s in %s was carried over from another medium; its error grew to %.1f.",
                        intended.label(), intended.comparison().donor().medium().symbol(), intended.comparison().donor().sigma()),
                List.of(intended.comparison().donor().source()), intended.site().equivalent(), RULE));
    }

    private static List<Finding> disagreement(Situation situation) {
        Donor intended = situation.intended();
        if (!intended.comparison().scalesDisagree()) {
            return List.of();
        }
        Comparison other = intended.comparison().other().orElseThrow();
        return List.of(new Finding(Severity.NOTE, FindingKind.SCALES_DISAGREE,
                String.format(Locale.ROOT, "The scales disagree at %s: log K is %.1f in %s, which decides, and %.1f in %s.",
                        intended.label(), intended.comparison().logK(), intended.comparison().donor().medium().symbol(),
                        other.logK(), other.donor().medium().symbol()),
                List.of(intended.comparison().reason(), other.reason()), intended.site().equivalent(), RULE));
    }
}
