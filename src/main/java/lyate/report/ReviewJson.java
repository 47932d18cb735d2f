package lyate.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lyate.molecule.Molecule;
import lyate.review.Finding;
import lyate.review.Review;
import lyate.review.SiteOrigin;
import lyate.review.Step;
import lyate.review.Transfer;
import lyate.review.Verdict;

/** A review as a JSON object; {@code schema} names its version. */
public final class ReviewJson {

    /** Changes whenever a name or a meaning in the object changes. */
    public static final String SCHEMA = "lyate-review/1";

    private ReviewJson() {}

    /** Everything the review says. Numbers that are not finite are null. */
    public static Map<String, Object> describe(Review review) {
        Molecule molecule = review.step().substrate();
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("schema", SCHEMA);
        object.put("step", step(review.step()));
        object.put("verdict", review.verdict().code());
        object.put("probability", Numbers.rounded(review.probability(), 4));
        object.put("probabilities", probabilities(review.probabilities()));
        object.put("intended_site", review.intendedSite());
        object.put("first_site", review.firstSite());
        object.put("working_base", review.workingBase());
        object.put("log_k", Numbers.rounded(review.logK(), 3));
        object.put("intended_percent", Numbers.rounded(review.intendedPercent(), 3));
        object.put("other_percent", Numbers.rounded(review.otherPercent(), 3));
        object.put("transfers", review.transfers().stream().map(transfer -> transfer(molecule, transfer)).toList());
        object.put("findings", review.findings().stream().map(finding -> finding(molecule, finding)).toList());
        object.put("explanation", review.explanation());
        object.put("assumptions", review.assumptions());
        return object;
    }

    private static Map<String, Object> step(Step step) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("step", step.id());
        object.put("substrate", step.substrate().input());
        object.put("smiles", step.substrate().smiles());
        object.put("set_aside", step.substrate().counterIons());
        object.put("warnings", step.substrate().warnings());
        object.put("site", step.intendedSite().orElse(null));
        object.put("reaction_site", step.origin().map(ReviewJson::origin).orElse(null));
        object.put("base", step.base().id());
        object.put("base_equiv", Numbers.rounded(step.equivalents(), 6));
        object.put("solvent", step.solvent().id());
        object.put("temperature_C", Numbers.rounded(step.temperatureCelsius(), 3));
        object.put("concentration_M", Numbers.rounded(step.concentrationMolar(), 6));
        object.put("water_ppm", Numbers.rounded(step.waterPpm(), 3));
        object.put("electrophile", step.partner().map(Molecule::smiles).orElse(null));
        return object;
    }

    private static Map<String, Object> origin(SiteOrigin origin) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("site", origin.site().orElse(null));
        object.put("sure", origin.sure());
        object.put("confidence", origin.confidence());
        object.put("alternatives", origin.alternatives());
        object.put("remarks", origin.remarks());
        return object;
    }

    /** The probability of every verdict that is possible, by its code. */
    static Map<String, Object> probabilities(Map<Verdict, Double> probabilities) {
        Map<String, Object> object = new LinkedHashMap<>();
        for (Verdict verdict : Verdict.values()) {
            if (probabilities.containsKey(verdict)) {
                object.put(verdict.code(), Numbers.rounded(probabilities.get(verdict), 4));
            }
        }
        return object;
    }

    private static Map<String, Object> transfer(Molecule molecule, Transfer transfer) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("donor", transfer.donor());
        object.put("atoms", labels(molecule, transfer.atoms()));
        object.put("acidity", SiteJson.acidity(molecule, transfer.acidity()));
        object.put("log_k", Numbers.rounded(transfer.logK(), 3));
        object.put("sigma_log_k", Numbers.rounded(transfer.sigmaLogK(), 3));
        object.put("delta_g_kJ_per_mol", Numbers.rounded(transfer.deltaG(), 2));
        object.put("percent_taken", Numbers.rounded(transfer.percentTaken(), 3));
        object.put("decided_by", transfer.decidedBy());
        return object;
    }

    static Map<String, Object> finding(Molecule molecule, Finding finding) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("severity", finding.severity().word());
        object.put("kind", finding.kind().code());
        object.put("sentence", finding.sentence());
        object.put("evidence", finding.evidence());
        object.put("atoms", labels(molecule, finding.atoms()));
        object.put("source", finding.source());
        return object;
    }

    private static List<String> labels(Molecule molecule, List<Integer> atoms) {
        return atoms.stream().map(molecule::label).toList();
    }
}
