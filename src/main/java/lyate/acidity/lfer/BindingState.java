package lyate.acidity.lfer;

/** How the atom is bound through which a substituent acts: the {@code state} column of {@code substituent-atoms.csv}. */
final class BindingState {

    private BindingState() {}

    static String of(Topology t, int branch) {
        int atom = t.child[branch];
        if (t.aromatic[atom]) {
            return t.charge[atom] > 0 && !oxide(t, atom) ? "aromatic-onium" : "aromatic";
        }
        if (t.order[branch] == 2) {
            return "double";
        }
        return switch (t.element[atom]) {
            case 6 -> carbon(t, atom);
            case 7 -> nitrogen(t, atom);
            case 16 -> sulfur(t, atom);
            case 15 -> oxygens(t, atom) > 0 ? "phosphoryl" : t.charge[atom] > 0 ? "onium" : "sp3";
            default -> "sp3";
        };
    }

    private static String carbon(Topology t, int atom) {
        String state = "sp3";
        for (int b = t.first[atom]; b < t.first[atom + 1]; b++) {
            int partner = t.element[t.child[b]];
            if (t.order[b] == 3 || t.order[b] == 2 && state.equals("sp2")) {
                return "sp";
            }
            if (t.order[b] == 2) {
                state = partner == 8 ? acyl(t, atom) : partner == 16 ? "thiocarbonyl" : partner == 7 ? "imine" : "sp2";
            }
        }
        return state;
    }

    private static String acyl(Topology t, int atom) {
        for (int b = t.first[atom]; b < t.first[atom + 1]; b++) {
            if (t.order[b] == 1 && t.element[t.child[b]] == 7) {
                return acylated(t, t.child[b], atom) ? "imide" : "amide";
            }
            if (t.order[b] == 1 && t.element[t.child[b]] == 8) {
                return "ester";
            }
            if (t.order[b] == 1 && t.element[t.child[b]] != 6 && t.degree(atom) > 2) {
                boolean bondToRest = t.degree(t.child[b]) > 1;
                return bondToRest && t.element[t.child[b]] == 6 ? "acyl" : "acyl-hetero";
            }
        }
        return "acyl";
    }

    /** Whether the lone pair of the nitrogen is held by another acyl or sulfonyl group. */
    private static boolean acylated(Topology t, int nitrogen, int carbonyl) {
        for (int b = t.first[nitrogen]; b < t.first[nitrogen + 1]; b++) {
            if (t.child[b] != carbonyl && t.oxo(t.child[b])) {
                return true;
            }
        }
        return false;
    }

    private static String nitrogen(Topology t, int atom) {
        if (t.charge[atom] > 0) {
            return oxygens(t, atom) > 1 ? "nitro" : "onium";
        }
        for (int b = t.first[atom]; b < t.first[atom + 1]; b++) {
            if (t.order[b] > 1) {
                return "sp2";
            }
        }
        for (int b = t.first[atom]; b < t.first[atom + 1]; b++) {
            if (t.oxo(t.child[b])) {
                return "acylamino";
            }
        }
        return "sp3";
    }

    private static String sulfur(Topology t, int atom) {
        int oxygens = oxygens(t, atom);
        if (oxygens > 0 && cationic(t, atom)) {
            return "sulfoxonium";
        }
        return oxygens > 1 ? "sulfonyl" : oxygens == 1 ? "sulfinyl" : t.charge[atom] > 0 ? "onium" : "sp3";
    }

    /** Oxygen or nitrogen atoms bound by a double bond or by one with opposite charges. */
    private static int oxygens(Topology t, int atom) {
        int count = 0;
        for (int b = t.first[atom]; b < t.first[atom + 1]; b++) {
            int child = t.child[b];
            boolean hetero = t.element[child] == 8 || t.element[child] == 7;
            count += hetero && (t.order[b] == 2 || t.charge[child] < 0) ? 1 : 0;
        }
        return count;
    }

    private static boolean cationic(Topology t, int atom) {
        int charge = t.charge[atom];
        for (int b = t.first[atom]; b < t.first[atom + 1]; b++) {
            charge += t.charge[t.child[b]];
        }
        return charge > 0;
    }

    private static boolean oxide(Topology t, int atom) {
        for (int b = t.first[atom]; b < t.first[atom + 1]; b++) {
            if (t.charge[t.child[b]] < 0) {
                return true;
            }
        }
        return false;
    }
}
