package lyate;

import java.util.List;
import java.util.Random;

/** Texts that follow a grammar, with every odd turn the grammar allows: most are understood, whatever they mean. */
final class Grammar {

    private static final List<String> PLAIN = List.of("C", "C", "CC", "C(=O)", "c1ccccc1", "C2CCCC2", "C=C", "C#C", "N", "O", "S", "C(C)(C)", "n3cccc3");
    private static final List<String> ATOMS = List.of("P", "F", "Cl", "Br", "I", "B", "c", "n", "o", "s", "[nH]", "[C@H]", "[C@@H]", "[C@]", "[O-]", "[N+]", "[NH2+]", "[13CH2]", "[2H]", "[CH-]", "[S@@]", "[P@](=O)", "[Si]", "[Sn]", "[se]",
            "[CH3:7]", "[Na+]", "[Mg]", "[Pd]", "[H]", "[N@+]", "[C@AL1]", "[S@TB3]", "[OH2+]", "[BH3-]", "*");
    private static final List<String> BONDS = List.of("-", "=", "#", "/", "\\", ":", "$", "~", ".");
    private static final List<String> PRIMITIVES = List.of("C", "c", "#6", "X4", "H0", "!H0", "R", "r5", "r", "+", "-", "+0", "D3", "v4", "a", "A",
            "x2", "@", "@@", "13", "$(C=O)", "$([#6]~[#7])", "!$(cc)", "*");
    private static final List<String> OPERATORS = List.of("", ";", ",", "&", ";!", ",!");
    private static final List<String> PREFIXES = List.of("", "2-", "3,4-di", "N-", "tert-", "cyclo", "(2R)-", "1H-", "bis(", "bicyclo[2.2.1]");
    private static final List<String> STEMS = List.of("methyl", "chloro", "hydroxy", "amino", "phenyl", "nitro", "oxo", "but", "pent", "hex", "pyridin",
            "benz", "acet", "propan", "imidazol");
    private static final List<String> ENDINGS = List.of("ane", "ol", "-2-one", "oic acid", "amide", "yl", "ene", "aldehyde", "amine", ")", " ", "ate");
    private static final List<String> CELLS = List.of("", "CCO", "\"a,b\"", "\"two\nlines\"", "\"a \"\"b\"\"\"", "=1+1", "#", " x ", "-78", "NaH", "C3", "1e400",
            "\u00b5", "\u0660", "CC>>CC");

    private final Random random;

    Grammar(long seed) {
        this.random = new Random(seed);
    }

    String smiles() {
        StringBuilder text = new StringBuilder();
        chain(text, 1 + random.nextInt(12), 0);
        return text.toString();
    }

    private void chain(StringBuilder text, int atoms, int depth) {
        for (int i = 0; i < atoms; i++) {
            text.append(i == 0 && depth == 0 ? "" : bond()).append(pick(random.nextInt(6) == 0 ? ATOMS : PLAIN));
            if (random.nextInt(12) == 0) {
                text.append(random.nextInt(5) == 0 ? "%1" : "").append(random.nextInt(5));
            }
            if (depth < 4 && random.nextInt(6) == 0) {
                text.append('(').append(bond());
                chain(text, 1 + random.nextInt(4), depth + 1);
                text.append(')');
            }
        }
    }

    private String bond() {
        return random.nextInt(10) == 0 ? pick(BONDS) : "";
    }

    String pattern() {
        StringBuilder text = new StringBuilder();
        for (int i = 1 + random.nextInt(5); i > 0; i--) {
            text.append('[').append(pick(PRIMITIVES));
            for (int more = random.nextInt(4); more > 0; more--) {
                text.append(pick(OPERATORS)).append(pick(PRIMITIVES));
            }
            text.append(']').append(i > 1 ? bond() : "");
        }
        return text.toString();
    }

    String name() {
        StringBuilder text = new StringBuilder();
        for (int i = 1 + random.nextInt(4); i > 0; i--) {
            text.append(pick(PREFIXES)).append(pick(STEMS));
        }
        return text.append(pick(ENDINGS)).toString();
    }

    String reaction() {
        return smiles() + (random.nextBoolean() ? "." + smiles() : "") + ">" + (random.nextBoolean() ? smiles() : "") + ">" + smiles();
    }

    /** A sheet with its own separator and line end. */
    String sheet() {
        String separator = pick(List.of(",", ";", "\t"));
        String end = pick(List.of("\n", "\r\n", "\r"));
        StringBuilder text = new StringBuilder(pick(List.of("", "\uFEFF", "sep=" + separator + end, "# remark" + end)));
        text.append(String.join(separator, pick(List.of("substrate", "reaction", "Substrate ", "step")), "base", "solvent", "x")).append(end);
        for (int row = random.nextInt(5); row > 0; row--) {
            for (int cell = 1 + random.nextInt(5); cell > 0; cell--) {
                text.append(pick(CELLS)).append(cell > 1 ? separator : end);
            }
        }
        return text.toString();
    }

    private String pick(List<String> words) {
        return words.get(random.nextInt(words.size()));
    }
}
