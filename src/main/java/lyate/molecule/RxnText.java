package lyate.molecule;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import lyate.molecule.ReactionPart.Side;

/**
 * An RXN record, V2000 or V3000, of which the first line is {@code $RXN}.
 *
 * @param lines     its lines
 * @param firstLine 1-based number of the first one in the file
 */
record RxnText(List<String> lines, int firstLine) {

    private static final String MOL = "$MOL";
    private static final String V30 = "M  V30 ";
    private static final Pattern COUNTS = Pattern.compile("( {2}\\d| \\d\\d|\\d{3}){2,3}\\s*");
    private static final Pattern BEGIN = Pattern.compile("M {2}V30 BEGIN (REACTANT|PRODUCT|AGENT)\\s*");
    private static final List<Side> ORDER = List.of(Side.REACTANT, Side.PRODUCT, Side.AGENT);

    static boolean looksLike(String text) {
        return text.stripLeading().startsWith("$RXN");
    }

    String name() {
        return lines.size() > 1 ? lines.get(1).strip() : "";
    }

    /** @throws MoleculeException in words, with the line of the file that is at fault, or the component and its line */
    String smiles() throws MoleculeException {
        Map<Side, List<String>> sides = new EnumMap<>(Side.class);
        ORDER.forEach(side -> sides.put(side, new ArrayList<>()));
        if (lines.get(0).contains("V3000")) {
            readV3000(sides);
        } else {
            readV2000(sides);
        }
        return String.join(".", sides.get(Side.REACTANT)) + ">" + String.join(".", sides.get(Side.AGENT)) + ">"
                + String.join(".", sides.get(Side.PRODUCT));
    }

    private void readV2000(Map<Side, List<String>> sides) throws MoleculeException {
        String counts = line(4);
        if (!COUNTS.matcher(counts).matches()) {
            throw at(4, "the numbers of reactants and products, three places each");
        }
        int at = 5;
        for (Side side : ORDER) {
            int column = 3 * ORDER.indexOf(side);
            int count = counts.length() < column + 3 ? 0 : Integer.parseInt(counts.substring(column, column + 3).strip());
            for (int number = 1; number <= count; number++) {
                if (!line(at).strip().equals(MOL)) {
                    throw at(at, "'" + MOL + "' before " + side.word() + " " + number + " of " + count);
                }
                int end = next(at + 1, MOL);
                sides.get(side).add(component(side, number, at + 1, String.join("\n", lines.subList(at + 1, end)) + "\n"));
                at = end;
            }
        }
        while (at < lines.size() && lines.get(at).isBlank()) {
            at++;
        }
        if (at < lines.size()) {
            throw at(at, "the end of the reaction: it announces no more than these components");
        }
    }

    private void readV3000(Map<Side, List<String>> sides) throws MoleculeException {
        Side side = null;
        boolean ended = false;
        for (int at = 4; at < lines.size(); at++) {
            Matcher begin = BEGIN.matcher(lines.get(at));
            if (begin.matches()) {
                side = Side.valueOf(begin.group(1));
            } else if (lines.get(at).startsWith(V30 + "BEGIN CTAB")) {
                if (side == null) {
                    throw at(at, "'" + V30 + "BEGIN REACTANT' or PRODUCT before a structure");
                }
                int end = next(at, V30 + "END CTAB");
                if (end == lines.size()) {
                    throw new MoleculeException("line " + (firstLine + at) + ": the structure that begins here has no '" + V30 + "END CTAB'");
                }
                String molfile = "\n\n\n  0  0  0     0  0            999 V3000\n" + String.join("\n", lines.subList(at, end + 1)) + "\nM  END\n";
                sides.get(side).add(component(side, sides.get(side).size() + 1, at, molfile));
                at = end;
            } else if (lines.get(at).startsWith("M  END")) {
                ended = true;
            }
        }
        if (!ended) {
            throw new MoleculeException("the reaction breaks off: there is no line 'M  END'");
        }
        checkCounts(sides);
    }

    private void checkCounts(Map<Side, List<String>> sides) throws MoleculeException {
        String[] counts = line(4).startsWith(V30 + "COUNTS ") ? line(4).substring((V30 + "COUNTS ").length()).strip().split("\\s+") : new String[0];
        boolean numbers = counts.length >= 2 && String.join("", counts).chars().allMatch(Character::isDigit);
        if (!numbers) {
            throw at(4, "'" + V30 + "COUNTS' and the numbers of reactants and products");
        }
        for (int i = 0; i < Math.min(counts.length, ORDER.size()); i++) {
            int found = sides.get(ORDER.get(i)).size();
            if (!counts[i].equals(Integer.toString(found))) {
                throw new MoleculeException("line " + (firstLine + 4) + ": " + counts[i] + " " + ORDER.get(i).word() + "s are announced, " + found + " are there");
            }
        }
    }

    private String component(Side side, int number, int at, String molfile) throws MoleculeException {
        String place = side.word() + " " + number + " (from line " + (firstLine + at) + "): ";
        if (!MolfileText.looksLike(molfile)) {
            throw new MoleculeException(place + "not a molfile: its line 4 states neither V2000 nor V3000");
        }
        try {
            return new MolfileText(molfile).smiles();
        } catch (MoleculeException e) {
            throw new MoleculeException(place + e.getMessage());
        }
    }

    private int next(int from, String mark) {
        int at = from;
        while (at < lines.size() && !lines.get(at).startsWith(mark)) {
            at++;
        }
        return at;
    }

    private String line(int at) {
        return at < lines.size() ? lines.get(at) : "";
    }

    private MoleculeException at(int index, String expected) {
        String found = index < lines.size() ? "found '" + lines.get(index).stripTrailing() + "'" : "the file breaks off";
        return new MoleculeException("line " + (firstLine + index) + ": " + found + ", expected " + expected);
    }
}
