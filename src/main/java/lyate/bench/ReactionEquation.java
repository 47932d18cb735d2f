package lyate.bench;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A reaction equation such as {@code CaH2(s) + 2 H2O(l) -> CaH2O2(s) + 2 H2(g)}.
 *
 * @param coefficients by substance id; negative for what is used up
 */
record ReactionEquation(Map<String, Integer> coefficients) {

    private static final Pattern TERM = Pattern.compile("(?:(\\d+)\\s+)?(\\S+)");
    private static final Pattern ELEMENT = Pattern.compile("([A-Z][a-z]?)(\\d*)");

    /**
     * Reads an equation.
     *
     * @throws IllegalArgumentException naming the part that cannot be read
     */
    static ReactionEquation parse(String text) {
        String[] sides = text.split("->");
        if (sides.length != 2) {
            throw new IllegalArgumentException("two sides with -> between them");
        }
        Map<String, Integer> coefficients = new LinkedHashMap<>();
        add(sides[0], -1, coefficients);
        add(sides[1], 1, coefficients);
        return new ReactionEquation(Map.copyOf(coefficients));
    }

    private static void add(String side, int sign, Map<String, Integer> coefficients) {
        for (String part : side.strip().split("\\s+\\+\\s+")) {
            Matcher term = TERM.matcher(part.strip());
            if (!term.matches()) {
                throw new IllegalArgumentException("a substance with at most a whole number in front, not '" + part + "'");
            }
            int count = term.group(1) == null ? 1 : Integer.parseInt(term.group(1));
            coefficients.merge(term.group(2), sign * count, Integer::sum);
        }
    }

    /** What does not balance, for example {@code {H=1}}; charges count as the element {@code +}. Empty when all is well. */
    Map<String, Integer> imbalance(UnaryOperator<String> formulaOf) {
        Map<String, Integer> sum = new TreeMap<>();
        coefficients.forEach((substance, count) ->
                composition(formulaOf.apply(substance)).forEach((element, atoms) ->
                        sum.merge(element, count * atoms, Integer::sum)));
        sum.values().removeIf(count -> count == 0);
        return sum;
    }

    /** Atoms by element of a formula without brackets, charge as the element {@code +}. */
    static Map<String, Integer> composition(String formula) {
        Map<String, Integer> atoms = new TreeMap<>();
        String elements = formula.replaceAll("[+-]+$", "");
        String charges = formula.substring(elements.length());
        Matcher element = ELEMENT.matcher(elements);
        int end = 0;
        while (element.find() && element.start() == end) {
            end = element.end();
            atoms.merge(element.group(1), element.group(2).isEmpty() ? 1 : Integer.parseInt(element.group(2)), Integer::sum);
        }
        if (end != elements.length() || end == 0) {
            throw new IllegalArgumentException("elements with their numbers such as C2H6O, not '" + formula + "'");
        }
        Arrays.stream(charges.split("")).filter(sign -> !sign.isEmpty())
                .forEach(sign -> atoms.merge("+", sign.equals("+") ? 1 : -1, Integer::sum));
        return atoms;
    }
}
