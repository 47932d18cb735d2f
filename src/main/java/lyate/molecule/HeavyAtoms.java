package lyate.molecule;

import java.util.Map;
import java.util.OptionalLong;

/**
 * A number for the heavy atoms of a molecule by element, which can be told from its SMILES without reading it: equal for
 * isomers, whatever their hydrogens, bonds and charges, and rarely equal for others.
 */
public final class HeavyAtoms {

    /** Reading never sets one of these aside, as it does with metals and counter-ions. */
    private static final Map<String, Integer> KEPT = Map.ofEntries(Map.entry("B", 5), Map.entry("C", 6), Map.entry("N", 7),
            Map.entry("O", 8), Map.entry("F", 9), Map.entry("Si", 14), Map.entry("P", 15), Map.entry("S", 16), Map.entry("Cl", 17),
            Map.entry("As", 33), Map.entry("Se", 34), Map.entry("Br", 35), Map.entry("Te", 52), Map.entry("I", 53));

    private HeavyAtoms() {}

    /** Of a molecule that was read. */
    public static long of(Molecule molecule) {
        long sum = 0;
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            sum += number(molecule.atomicNumber(atom));
        }
        return sum;
    }

    /** Of sound SMILES text; empty where it has several components, metals, or atoms of no definite element. */
    public static OptionalLong ofSmiles(String smiles) {
        long sum = 0;
        for (int i = 0; i < smiles.length(); i++) {
            char letter = smiles.charAt(i);
            String symbol = "";
            if (letter == '[') {
                symbol = symbolAt(smiles, afterIsotope(smiles, i + 1), true);
                i = smiles.indexOf(']', i);
            } else if (Character.isLetter(letter)) {
                symbol = symbolAt(smiles, i, false);
                i += symbol.length() - 1;
            } else if (letter == '.' || letter == '*' || Character.isWhitespace(letter)) {
                return OptionalLong.empty();
            }
            boolean heavy = !symbol.isEmpty() && !symbol.equals("H");
            if (heavy && !KEPT.containsKey(symbol) || i < 0) {
                return OptionalLong.empty();
            }
            sum += heavy ? number(KEPT.get(symbol)) : 0;
        }
        return OptionalLong.of(sum);
    }

    private static int afterIsotope(String smiles, int from) {
        int at = from;
        while (at < smiles.length() && Character.isDigit(smiles.charAt(at))) {
            at++;
        }
        return at;
    }

    /** Element symbol, written large where the atom is aromatic. Outside of brackets only Cl and Br have two letters. */
    private static String symbolAt(String smiles, int at, boolean inBrackets) {
        if (at >= smiles.length()) {
            return "?";
        }
        char first = Character.toUpperCase(smiles.charAt(at));
        char second = at + 1 < smiles.length() ? smiles.charAt(at + 1) : ' ';
        String two = "" + first + second;
        boolean both = inBrackets ? Character.isLowerCase(second) : two.equals("Cl") || two.equals("Br");
        return both && Character.isUpperCase(smiles.charAt(at)) || two.equals("Se") || two.equals("As") || two.equals("Te")
                ? two : String.valueOf(first);
    }

    private static long number(int element) {
        return (long) element * element * 0x9E3779B97F4A7C15L >>> 7;
    }
}
