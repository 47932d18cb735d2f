package lyate.acidity.lfer;

import lyate.acidity.Acidity.Effect;

/**
 * What an amidine, guanidine or isourea carries on its nitrogen atoms. The cation shares its charge between them, so a group counts
 * the same on whichever of them it is drawn.
 */
final class AmidineTerms {

    private static final int NITROGEN = 7;
    private static final int FIVE_RING = 5;
    private static final String ACYL = "acyl";

    private AmidineTerms() {}

    /** Adds nothing unless the site is a nitrogen bound by a double bond to a carbon with another nitrogen. */
    static void add(Facts facts, int site, Terms terms) {
        Topology t = facts.topology();
        if (t.element[site] != NITROGEN || t.aromatic[site]) {
            return;
        }
        for (int branch = t.first[site]; branch < t.first[site + 1]; branch++) {
            if (t.order[branch] == 2 && t.element[t.child[branch]] == 6) {
                addNitrogens(facts, t.child[branch], site, terms);
            }
        }
    }

    private static void addNitrogens(Facts facts, int head, int site, Terms terms) {
        Topology t = facts.topology();
        boolean amidine = false;
        for (int branch = t.first[head]; branch < t.first[head + 1]; branch++) {
            amidine |= t.child[branch] != site && t.element[t.child[branch]] == NITROGEN;
        }
        for (int branch = t.first[head]; amidine && branch < t.first[head + 1]; branch++) {
            int nitrogen = t.child[branch];
            if (t.element[nitrogen] == NITROGEN && !t.aromatic[nitrogen]) {
                for (int group = t.first[nitrogen]; group < t.first[nitrogen + 1]; group++) {
                    if (t.child[group] != head) {
                        addGroup(facts, group, terms);
                    }
                    if (t.aromatic[t.child[group]] && nitrogen != site) {
                        RingTerms.add(facts, "ring", t.child[group], nitrogen, terms);
                    }
                }
            }
        }
    }

    private static void addGroup(Facts facts, int branch, Terms terms) {
        Topology t = facts.topology();
        int atom = t.child[branch];
        String name = switch (BindingState.of(t, branch)) {
            case "aromatic" -> "aryl";
            case "acyl", "ester", "amide", "imide", "acyl-hetero", "thiocarbonyl" -> ACYL;
            case "imine" -> "imidoyl";
            case "sp" -> "cyano";
            case "nitro" -> "nitro";
            case "sulfonyl", "phosphoryl" -> "sulfonyl";
            case "sp2" -> t.element[atom] == NITROGEN ? "imino" : "";
            default -> t.element[atom] == NITROGEN ? "amino" : t.element[atom] == 8 ? "oxy" : "";
        };
        if (!name.isEmpty()) {
            if (name.equals(ACYL)) {
                addAcyl(t, branch, terms);
            }
            terms.add("amidine." + name, Effect.RESONANCE, 1, atom, facts.constants()[branch].name());
        }
    }

    /**
     * An acyl group on a nitrogen that can be the imine nitrogen stabilises the neutral molecule as an acylimine; a second acyl group finds
     * less to do; in a five-membered ring (creatinine, glycocyamidine) the group lies in the plane.
     */
    private static void addAcyl(Topology t, int branch, Terms terms) {
        int nitrogen = t.parent[branch];
        boolean imine = t.hydrogens[nitrogen] > 0 || t.degree(nitrogen) == 2;
        terms.add("amidine.acylimine", Effect.RESONANCE, imine ? 1 : 0, t.child[branch]);
        terms.add("amidine.acyl-in-five-ring", Effect.ORBITAL, t.smallestRing(branch) == FIVE_RING ? 1 : 0, t.child[branch]);
        terms.add("amidine.acyl-further", Effect.RESONANCE, terms.value("amidine." + ACYL) > 0 ? 1 : 0, t.child[branch]);
    }
}
