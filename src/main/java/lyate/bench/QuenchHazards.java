package lyate.bench;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.review.Finding.Severity;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * Groups hurt by acid or base in a work-up: the rows of {@code quench-hazards.csv}. Loaded once; immutable; safe to share
 * between threads.
 */
public final class QuenchHazards {

    static final Schema SCHEMA = Schema.of("quench-hazards.csv", text("id"), text("group"), text("smarts"),
            number("below_ph").optional(), number("above_ph").optional(), word("severity", "stop", "caution", "note"),
            text("sentence"), text("source"), text("hit"), text("miss"));

    /** One row. */
    record Rule(String id, String group, AtomPattern pattern, double pH, boolean acid, Severity severity, String sentence,
                String source, String hit, String miss) {

        Optional<GroupHazard> in(Molecule molecule, double lowestPH, double highestPH) {
            if (acid ? lowestPH >= pH : highestPH <= pH) {
                return Optional.empty();
            }
            List<Integer> atoms = IntStream.range(0, molecule.atomCount())
                    .filter(atom -> pattern.matches(molecule, atom)).boxed().toList();
            return atoms.isEmpty() ? Optional.empty()
                    : Optional.of(new GroupHazard(group, atoms, pH, acid, severity, sentence, source));
        }
    }

    private final List<Rule> rules;

    private QuenchHazards(List<Rule> rules) {
        this.rules = List.copyOf(rules);
    }

    /**
     * Loads the rules.
     *
     * @throws TableException for a bad cell
     */
    public static QuenchHazards load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Rule> rules = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            rule(row, problems).ifPresent(rules::add);
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new QuenchHazards(rules);
    }

    /** Groups of the molecule that water between two pH values would hurt, in the order of the table. */
    public List<GroupHazard> of(Molecule molecule, double lowestPH, double highestPH) {
        return rules.stream().flatMap(rule -> rule.in(molecule, lowestPH, highestPH).stream()).toList();
    }

    List<Rule> rules() {
        return rules;
    }

    private static Optional<Rule> rule(Row row, List<TableProblem> problems) {
        OptionalDouble below = row.number("below_ph");
        OptionalDouble above = row.number("above_ph");
        if (below.isPresent() == above.isPresent()) {
            problems.add(row.problem("below_ph", "a pH either here or in above_ph"));
            return Optional.empty();
        }
        try {
            return Optional.of(new Rule(row.id(), row.text("group"), AtomPattern.compile(row.text("smarts")),
                    below.orElseGet(above::getAsDouble), below.isPresent(),
                    Severity.valueOf(row.text("severity").toUpperCase(Locale.ROOT)), row.text("sentence"), row.text("source"),
                    row.text("hit"), row.text("miss")));
        } catch (MoleculeException e) {
            problems.add(row.problem("smarts", "a SMARTS pattern: " + e.getMessage()));
            return Optional.empty();
        }
    }
}
