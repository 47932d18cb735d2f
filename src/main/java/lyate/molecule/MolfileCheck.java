package lyate.molecule;

import java.util.List;
import java.util.regex.Pattern;

/** Finds the line of a molfile that is at fault, before the toolkit stumbles over it without saying where. */
final class MolfileCheck {

    private static final Pattern COUNTS = Pattern.compile("( {2}\\d| \\d\\d|\\d{3}){2}.*");
    private static final Pattern ATOM = Pattern.compile("(\\s*-?\\d+\\.\\d+){3}\\s+\\S.*");
    private static final Pattern BOND = Pattern.compile("( {2}\\d| \\d\\d|\\d{3}){3}.*");

    private MolfileCheck() {}

    /** @throws MoleculeException with the number of the first line that is not what the counts line announces */
    static void v2000(List<String> lines) throws MoleculeException {
        if (!COUNTS.matcher(lines.get(3)).matches()) {
            throw at(lines, 3, "the numbers of atoms and bonds, three places each");
        }
        int atoms = number(lines.get(3), 0);
        int bonds = number(lines.get(3), 3);
        for (int i = 4; i < 4 + atoms; i++) {
            if (i >= lines.size() || !ATOM.matcher(lines.get(i)).matches()) {
                throw at(lines, i, "atom " + (i - 3) + " of " + atoms + ": three coordinates and an element");
            }
        }
        for (int i = 4 + atoms; i < 4 + atoms + bonds; i++) {
            String what = "bond " + (i - 3 - atoms) + " of " + bonds + ": two atom numbers from 1 to " + atoms + " and a bond type";
            if (i >= lines.size() || !BOND.matcher(lines.get(i)).matches() || !joinsTwo(lines.get(i), atoms)) {
                throw at(lines, i, what);
            }
        }
        ends(lines);
    }

    /** @throws MoleculeException where the connection table is not closed */
    static void v3000(List<String> lines) throws MoleculeException {
        for (String mark : List.of("BEGIN CTAB", "COUNTS", "END CTAB")) {
            if (lines.stream().noneMatch(line -> line.startsWith("M  V30 " + mark))) {
                throw new MoleculeException("the molfile has no line 'M  V30 " + mark + "'");
            }
        }
        ends(lines);
    }

    private static void ends(List<String> lines) throws MoleculeException {
        if (lines.stream().noneMatch(line -> line.startsWith("M  END"))) {
            throw new MoleculeException("the molfile breaks off: there is no line 'M  END'");
        }
    }

    private static boolean joinsTwo(String line, int atoms) {
        int first = number(line, 0);
        int second = number(line, 3);
        return first != second && Math.min(first, second) >= 1 && Math.max(first, second) <= atoms;
    }

    private static int number(String line, int column) {
        return Integer.parseInt(line.substring(column, column + 3).strip());
    }

    private static MoleculeException at(List<String> lines, int index, String expected) {
        String found = index < lines.size() ? "found '" + lines.get(index).stripTrailing() + "'" : "the molfile breaks off";
        return new MoleculeException("line " + (index + 1) + " of the molfile: " + found + ", expected " + expected);
    }
}
