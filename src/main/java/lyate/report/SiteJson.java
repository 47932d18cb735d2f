package lyate.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lyate.acidity.Acidity;
import lyate.molecule.Molecule;
import lyate.sheet.SiteSurvey.Answer;
import lyate.sheet.SiteSurvey.SitePKa;
import lyate.site.ProtonSite;

/** Proton sites as JSON objects. */
public final class SiteJson {

    private SiteJson() {}

    /** One structure with its sites, or the reason it was refused. */
    public static Map<String, Object> describe(Answer answer, String solvent) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("row", answer.question().number());
        object.put("input", answer.question().text().strip());
        if (answer.molecule().isEmpty()) {
            object.put("refused", answer.problem());
            return object;
        }
        Molecule molecule = answer.molecule().get();
        object.put("smiles", molecule.smiles());
        object.put("formula", molecule.formula());
        object.put("set_aside", molecule.counterIons());
        object.put("warnings", molecule.warnings());
        object.put("solvent", solvent);
        object.put("sites", answer.sites().stream().map(site -> site(molecule, site)).toList());
        return object;
    }

    private static Map<String, Object> site(Molecule molecule, SitePKa found) {
        ProtonSite site = found.site();
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("role", site.role().word());
        object.put("site", molecule.label(site.atom()));
        object.put("element", molecule.symbol(site.atom()));
        object.put("atoms", site.equivalent().stream().map(molecule::label).toList());
        object.put("hydrogens", site.hydrogens());
        object.put("site_class", site.siteClass().id());
        object.put("site_class_name", site.siteClass().name());
        object.put("acidity", found.acidity().map(acidity -> acidity(molecule, acidity)).orElse(null));
        return object;
    }

    /** A pKa with everything it rests on. */
    static Map<String, Object> acidity(Molecule molecule, Acidity acidity) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("pka", Numbers.rounded(acidity.pKa(), 3));
        object.put("sigma", Numbers.rounded(acidity.sigma(), 3));
        object.put("medium", acidity.medium().id());
        object.put("basis", acidity.basis().word());
        object.put("source", acidity.source());
        object.put("contributions", acidity.contributions().stream().map(term -> contribution(molecule, term)).toList());
        object.put("missing", acidity.missing());
        object.put("relatives", acidity.relatives().stream().map(SiteJson::relative).toList());
        object.put("uncertainty", acidity.spread());
        object.put("other_ways", acidity.alternatives().stream().map(SiteJson::otherWay).toList());
        return object;
    }

    private static Map<String, Object> contribution(Molecule molecule, Acidity.Contribution term) {
        List<String> atoms = term.atoms().stream().filter(atom -> atom < molecule.atomCount()).map(molecule::label).toList();
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("text", term.text());
        object.put("effect", term.effect().name().toLowerCase(Locale.ROOT).replace('_', '-'));
        object.put("value", Numbers.rounded(term.value(), 3));
        object.put("atoms", atoms);
        return object;
    }

    private static Map<String, Object> otherWay(Acidity.Alternative way) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("text", way.text());
        object.put("pka", Numbers.rounded(way.pKa(), 3));
        object.put("sigma", Numbers.rounded(way.sigma(), 3));
        return object;
    }

    private static Map<String, Object> relative(Acidity.Relative relative) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("smiles", relative.smiles());
        object.put("site", relative.site());
        object.put("pka", Numbers.rounded(relative.pKa(), 3));
        object.put("similarity", Numbers.rounded(relative.similarity(), 3));
        object.put("source", relative.source());
        return object;
    }
}
