package lyate.review;

import static lyate.table.Column.list;
import static lyate.table.Column.text;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.stock.Acid;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * What handling an acid can do to people: the rows of {@code acid-hazards.csv}. General rows come first: of all rows of one
 * finding kind that fit, the last one decides. No finding means only that the table has no row, never that an acid is safe.
 * Immutable; safe to share between threads.
 */
public final class AcidHazards {

    static final Schema SCHEMA = Schema.of("acid-hazards.csv", text("id"), list("acids"), list("solvents"), RuleCells.kind(),
            RuleCells.severity(), text("sentence"), text("precaution"), text("source"), text("hit"), text("miss"));

    /** One row. */
    record Rule(String id, RulePlace place, List<String> acids, Surroundings surroundings, FindingKind kind,
                Optional<Finding.Severity> severity, String sentence, String precaution, String source, String hit, String miss) {}

    private final List<Rule> rules;

    private AcidHazards(List<Rule> rules) {
        this.rules = List.copyOf(rules);
    }

    /**
     * Loads the rules.
     *
     * @param stockroom shelf whose acids and solvents the rules name
     * @throws TableException for a bad cell or name
     */
    public static AcidHazards load(TableFolders folders, Stockroom stockroom) {
        List<TableProblem> problems = new ArrayList<>();
        RuleCells cells = new RuleCells(stockroom, problems);
        List<Rule> rules = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            rules.add(new Rule(row.id(), RulePlace.of(row, SCHEMA), cells.acids(row), cells.solvents(row), RuleCells.kind(row),
                    RuleCells.severity(row), row.text("sentence"), row.text("precaution"), row.text("source"), row.text("hit"),
                    row.text("miss")));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new AcidHazards(rules);
    }

    /** The hazards of an acid, most severe first. */
    public List<Finding> of(Acid acid, Solvent solvent) {
        return deciding(acid, solvent).values().stream().filter(rule -> rule.severity().isPresent())
                .map(rule -> new Finding(rule.severity().orElseThrow(), rule.kind(), RuleCells.fill(rule.sentence(), acid, solvent),
                        List.of(rule.precaution(), BaseHazards.STANDING_LINE), List.of(), rule.source()))
                .sorted(Comparator.comparing(Finding::severity)).toList();
    }

    /** The row that decides for each kind of finding. */
    Map<FindingKind, Rule> deciding(Acid acid, Solvent solvent) {
        Map<FindingKind, Rule> deciding = new EnumMap<>(FindingKind.class);
        for (Rule rule : rules) {
            if (Choice.allows(rule.acids(), acid.id()::equals) && rule.surroundings().holdFor(solvent, 0)) {
                deciding.put(rule.kind(), rule);
            }
        }
        return deciding;
    }

    List<Rule> rules() {
        return rules;
    }
}
