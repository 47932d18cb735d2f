package lyate.report;

import java.util.LinkedHashMap;
import java.util.Map;
import lyate.molecule.Molecule;
import lyate.review.AcidStep;
import lyate.review.Protonation;
import lyate.review.Protonation.Uptake;

/** A protonation as a JSON object; {@code schema} names its version. */
public final class ProtonationJson {

    /** Changes whenever a name or a meaning in the object changes. */
    public static final String SCHEMA = "lyate-protonation/1";

    private ProtonationJson() {}

    /** Everything the protonation says. Numbers that are not finite are null. */
    public static Map<String, Object> describe(Protonation protonation) {
        Molecule molecule = protonation.step().substrate();
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("schema", SCHEMA);
        object.put("step", step(protonation.step()));
        object.put("verdict", protonation.verdict().code());
        object.put("probability", Numbers.rounded(protonation.probability(), 4));
        object.put("probabilities", ReviewJson.probabilities(protonation.probabilities()));
        object.put("intended_site", protonation.intendedSite());
        object.put("first_site", protonation.firstSite());
        object.put("log_k", Numbers.rounded(protonation.logK(), 3));
        object.put("sigma_log_k", Numbers.rounded(protonation.sigmaLogK(), 3));
        object.put("intended_percent", Numbers.rounded(protonation.intendedPercent(), 3));
        object.put("other_percent", Numbers.rounded(protonation.otherPercent(), 3));
        object.put("protons_to_give", protonation.protonsToGive());
        object.put("uptakes", protonation.uptakes().stream().map(uptake -> uptake(molecule, uptake)).toList());
        object.put("findings", protonation.findings().stream().map(finding -> ReviewJson.finding(molecule, finding)).toList());
        object.put("explanation", protonation.explanation());
        object.put("assumptions", protonation.assumptions());
        return object;
    }

    private static Map<String, Object> step(AcidStep step) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("step", step.id());
        object.put("substrate", step.substrate().input());
        object.put("smiles", step.substrate().smiles());
        object.put("set_aside", step.substrate().counterIons());
        object.put("warnings", step.substrate().warnings());
        object.put("site", step.intendedSite().orElse(null));
        object.put("acid", step.acid().id());
        object.put("acid_equiv", Numbers.rounded(step.equivalents(), 6));
        object.put("solvent", step.solvent().id());
        object.put("temperature_C", Numbers.rounded(step.temperatureCelsius(), 3));
        object.put("concentration_M", Numbers.rounded(step.concentrationMolar(), 6));
        return object;
    }

    private static Map<String, Object> uptake(Molecule molecule, Uptake uptake) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("site", uptake.site());
        object.put("atoms", uptake.atoms().stream().map(molecule::label).toList());
        object.put("acidity", SiteJson.acidity(molecule, uptake.acidity()));
        object.put("log_k", Numbers.rounded(uptake.logK(), 3));
        object.put("percent_protonated", Numbers.rounded(uptake.percentProtonated(), 3));
        return object;
    }
}
