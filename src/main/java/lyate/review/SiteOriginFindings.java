package lyate.review;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import lyate.molecule.Molecule;
import lyate.review.Finding.Severity;

/** Rules about steps that were drawn as a reaction: does it say the same as the rest of the step, and how sure is it? */
final class SiteOriginFindings {

    private static final String SOURCE = "the reaction as drawn";

    private SiteOriginFindings() {}

    static List<FindingRule> rules() {
        return List.of(SiteOriginFindings::disagreement, SiteOriginFindings::doubt, SiteOriginFindings::remarks);
    }

    private static List<Finding> disagreement(Situation situation) {
        Molecule molecule = situation.step().substrate();
        return situation.step().origin().flatMap(SiteOrigin::site).map(molecule::atomLabelled).filter(OptionalInt::isPresent)
                .map(OptionalInt::getAsInt).filter(atom -> !situation.intended().site().equivalent().contains(atom))
                .map(atom -> List.of(new Finding(Severity.CAUTION, FindingKind.SITE_DISAGREES, "The step names " + situation.intended().label()
                        + " as intended site, but in the reaction the proton leaves from " + molecule.label(atom) + ".",
                        List.of(situation.step().origin().get().confidence()), List.of(situation.intended().site().atom(), atom), SOURCE)))
                .orElse(List.of());
    }

    private static List<Finding> doubt(Situation situation) {
        return situation.step().origin().filter(origin -> !origin.sure()).map(origin -> {
            String what = origin.site().map(site -> "The reaction leaves open which proton is meant; " + site + " was taken from it"
                    + (origin.alternatives().isEmpty() ? "" : ", it may be " + String.join(" or ", origin.alternatives()))).orElse(
                    "The reaction does not tell which proton is meant; " + situation.intended().label() + " was taken");
            return List.of(new Finding(Severity.CAUTION, FindingKind.SITE_UNSURE, what + ".", origin.doubts(), atoms(situation), SOURCE));
        }).orElse(List.of());
    }

    private static List<Finding> remarks(Situation situation) {
        List<Finding> findings = new ArrayList<>();
        situation.step().origin().ifPresent(origin -> origin.remarks().forEach(remark -> findings.add(new Finding(Severity.NOTE,
                FindingKind.REACTION_AS_DRAWN, Character.toUpperCase(remark.charAt(0)) + remark.substring(1) + ".", List.of(), List.of(), SOURCE))));
        return findings;
    }

    private static List<Integer> atoms(Situation situation) {
        return List.of(situation.intended().site().atom());
    }
}
