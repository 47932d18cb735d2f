package lyate.bench;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import lyate.stock.Base;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * Heats of bases with proton donors, from {@code enthalpies.csv} and {@code base-heats.csv} by Hess's law. Loaded once;
 * immutable; safe to share between threads.
 */
public final class Enthalpies {

    static final Schema FORMATION = Schema.of("enthalpies.csv", text("id"), text("name"), text("formula"),
            number("enthalpy"), text("source"));
    static final Schema REACTIONS = Schema.of("base-heats.csv", text("id"), list("bases"),
            word("donor", "water", "methanol", "ethanol", "acid"), text("equation"), text("source"));
    private static final Map<String, String> DONORS =
            Map.of("water", "H2O(l)", "methanol", "CH4O(l)", "ethanol", "C2H6O(l)", "acid", "H+(aq)");

    /** A proton donor for which heats may be known. */
    public enum Donor {
        WATER, METHANOL, ETHANOL,
        /** A strong acid in water. */
        ACID;

        String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /**
     * Heat of one reaction at 25 degrees C.
     *
     * @param kiloJoulePerProton enthalpy change per proton of the donor; negative where heat is given off
     * @param protonsPerFormula  protons one formula unit of the base takes in this reaction
     * @param gases              gas set free, mol per formula unit of the base, by name
     * @param equation           the reaction it belongs to
     * @param source             where the enthalpies of formation come from
     */
    public record ReactionHeat(double kiloJoulePerProton, int protonsPerFormula, Map<String, Integer> gases, String equation,
                               String source) {

        public ReactionHeat {
            gases = Map.copyOf(gases);
        }
    }

    private final Map<String, ReactionHeat> heats;

    private Enthalpies(Map<String, ReactionHeat> heats) {
        this.heats = Map.copyOf(heats);
    }

    /**
     * Loads the tables.
     *
     * @throws TableException for a bad cell, an equation that names an unknown substance or does not balance
     */
    public static Enthalpies load(TableFolders folders) {
        Map<String, Row> substances = new LinkedHashMap<>();
        Table.read(FORMATION, folders).rows().forEach(row -> substances.put(row.id(), row));
        List<TableProblem> problems = new ArrayList<>();
        substances.values().forEach(row -> checkFormula(row, problems));
        Map<String, ReactionHeat> heats = new LinkedHashMap<>();
        for (Row row : problems.isEmpty() ? Table.read(REACTIONS, folders).rows() : List.<Row>of()) {
            heat(row, substances, problems).ifPresent(heat ->
                    row.list("bases").forEach(base -> heats.put(key(base, row.text("donor")), heat)));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new Enthalpies(heats);
    }

    /** Heat of a base with a donor, where the tables hold one. */
    public Optional<ReactionHeat> of(Base base, Donor donor) {
        return Optional.ofNullable(heats.get(key(base.id(), donor.word())));
    }

    private static String key(String base, String donor) {
        return base + " + " + donor;
    }

    private static void checkFormula(Row row, List<TableProblem> problems) {
        try {
            ReactionEquation.composition(row.text("formula"));
        } catch (IllegalArgumentException e) {
            problems.add(row.problem("formula", e.getMessage()));
        }
    }

    private static Optional<ReactionHeat> heat(Row row, Map<String, Row> substances, List<TableProblem> problems) {
        try {
            ReactionEquation equation = ReactionEquation.parse(row.text("equation"));
            String donor = DONORS.get(row.text("donor"));
            String wrong = complaint(equation, donor, substances);
            if (!wrong.isEmpty()) {
                problems.add(row.problem("equation", wrong));
                return Optional.empty();
            }
            double enthalpy = equation.coefficients().entrySet().stream().mapToDouble(term ->
                    term.getValue() * substances.get(term.getKey()).number("enthalpy").orElseThrow()).sum();
            String sources = String.join("; ", new TreeSet<>(equation.coefficients().keySet().stream()
                    .map(substance -> substances.get(substance).text("source")).toList()));
            int protons = -equation.coefficients().get(donor);
            return Optional.of(new ReactionHeat(enthalpy / protons, protons, gases(equation, substances), row.text("equation"), sources));
        } catch (IllegalArgumentException e) {
            problems.add(row.problem("equation", e.getMessage()));
            return Optional.empty();
        }
    }

    private static Map<String, Integer> gases(ReactionEquation equation, Map<String, Row> substances) {
        Map<String, Integer> gases = new LinkedHashMap<>();
        equation.coefficients().forEach((id, count) -> {
            if (count > 0 && id.endsWith("(g)")) {
                gases.put(substances.get(id).text("name"), count);
            }
        });
        return gases;
    }

    /** What should have been there, or empty text. */
    private static String complaint(ReactionEquation equation, String donor, Map<String, Row> substances) {
        List<String> unknown = equation.coefficients().keySet().stream().filter(id -> !substances.containsKey(id)).toList();
        if (!unknown.isEmpty()) {
            return "substances of enthalpies.csv; it has no " + String.join(", ", unknown);
        }
        Map<String, Integer> imbalance = equation.imbalance(id -> substances.get(id).text("formula"));
        if (!imbalance.isEmpty()) {
            return "both sides to balance; the right one differs by " + imbalance;
        }
        if (equation.coefficients().getOrDefault(donor, 0) >= 0) {
            return "the donor " + donor + " on the left side";
        }
        boolean oneBase = equation.coefficients().entrySet().stream()
                .allMatch(term -> term.getValue() >= -1 || term.getKey().equals(donor));
        return oneBase ? "" : "one formula unit of the base";
    }
}
