package lyate.molecule;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Says what is wrong with a SMILES and where. */
final class SmilesError {

    /** An atom as OpenSMILES writes it: in brackets, or one of the organic subset. */
    private static final Pattern ATOM = Pattern.compile("\\[[^\\]]*\\]|Cl|Br|[BCNOPSFI*bcnops]");
    private static final Pattern AROMATIC = Pattern.compile("\\[\\d*(?:se|as|te|si|[bcnops])[^\\]]*\\]|[bcnops]");
    private static final int WIDEST = 100;

    private SmilesError() {}

    /** Number of atoms the text seems to hold. */
    static int atoms(String text) {
        Matcher atoms = ATOM.matcher(text);
        int count = 0;
        while (atoms.find()) {
            count++;
        }
        return count;
    }

    /** @param reason what the parser said; its last line may be a caret line */
    static MoleculeException of(String text, String reason) {
        if (reason.contains("ekul")) {
            return noKekuleForm(text);
        }
        String[] lines = reason.split("\n");
        int column = lines[lines.length - 1].strip().equals("^") ? lines[lines.length - 1].indexOf('^') : text.length();
        return new MoleculeException("not SMILES: " + words(lines[0]) + caret(text, column));
    }

    private static MoleculeException noKekuleForm(String text) {
        Matcher first = AROMATIC.matcher(text);
        int column = first.find() ? first.start() : 0;
        return new MoleculeException("the aromatic atoms cannot be given alternating single and double bonds;"
                + " is a hydrogen missing, as in [nH]?" + caret(text, column));
    }

    /** The parser's reason without the text it repeats. */
    private static String words(String line) {
        String reason = line.replaceFirst("^could not parse '.*', ", "").replaceFirst(":?\\s*$", "");
        if (reason.startsWith("Unexpected error")) {
            return "it does not make sense as a whole";
        }
        return reason.isEmpty() ? reason : Character.toLowerCase(reason.charAt(0)) + reason.substring(1);
    }

    /** Offset of the atom that has the given 1-based number, or -1. */
    static int offsetOfAtom(String text, int number) {
        Matcher atoms = ATOM.matcher(text);
        for (int seen = 0; atoms.find();) {
            if (++seen == number) {
                return atoms.start();
            }
        }
        return -1;
    }

    /** The text and a caret under one place of it, each on a line of its own; long texts are cut to what is near. */
    static String caret(String text, int wanted) {
        int column = Math.max(0, Math.min(wanted, text.length()));
        int from = Math.max(0, Math.min(column - WIDEST / 2, text.length() - WIDEST));
        int to = Math.min(text.length(), from + WIDEST);
        return "\n" + text.substring(from, to) + "\n" + " ".repeat(column - from) + "^";
    }
}
