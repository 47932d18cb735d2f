package lyate.review;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * What handling a base can do to people: the rows of {@code base-hazards.csv}.
 *
 * <p>General rows come first: of all rows of one finding kind that fit, the last one decides; rows about the solvent alone
 * (no base named) and rows about the base do so apart. No finding means only that
 * the table has no row, never that a step is safe. Immutable; safe to share between threads.
 */
public final class BaseHazards {

    /** Stands under every safety finding. */
    public static final String STANDING_LINE =
            "The safety data sheet, the rules of your site and a qualified person decide; this note does not replace them.";

    static final Schema SCHEMA = Schema.of("base-hazards.csv", text("id"), list("bases"), list("solvents"),
            number("temperature_from").optional(), number("temperature_to").optional(),
            word("when", "always", "proton-taken"), RuleCells.kind(), RuleCells.severity(), text("sentence"),
            text("precaution"), text("source"), text("hit"), text("miss"));

    /** One row. */
    record Rule(String id, RulePlace place, BaseCondition base, Surroundings surroundings, boolean needsProton, FindingKind kind,
                Optional<Finding.Severity> severity, String sentence, String precaution, String source, String hit,
                String miss) {}

    private final List<Rule> rules;

    private BaseHazards(List<Rule> rules) {
        this.rules = List.copyOf(rules);
    }

    /**
     * Loads the rules.
     *
     * @param stockroom shelf whose bases and solvents the rules name
     * @throws TableException for a bad cell or name
     */
    public static BaseHazards load(TableFolders folders, Stockroom stockroom) {
        List<TableProblem> problems = new ArrayList<>();
        RuleCells cells = new RuleCells(stockroom, problems);
        List<Rule> rules = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            rules.add(new Rule(row.id(), RulePlace.of(row, SCHEMA), cells.families(row), cells.surroundings(row),
                    row.text("when").equals("proton-taken"),
                    RuleCells.kind(row), RuleCells.severity(row), row.text("sentence"), row.text("precaution"),
                    row.text("source"), row.text("hit"), row.text("miss")));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new BaseHazards(rules);
    }

    /**
     * The hazards of a base, most severe first.
     *
     * @param protonTaken whether the base is protonated in the step, by the substrate, the solvent or moisture
     */
    public List<Finding> of(Base base, Solvent solvent, double celsius, boolean protonTaken) {
        return deciding(base, solvent, celsius, protonTaken).stream().filter(rule -> rule.severity().isPresent())
                .map(rule -> new Finding(rule.severity().orElseThrow(), rule.kind(), RuleCells.fill(rule.sentence(), base, solvent),
                        List.of(rule.precaution(), STANDING_LINE), List.of(), rule.source()))
                .sorted(Comparator.comparing(Finding::severity)).toList();
    }

    /** The rows that decide, for each kind of finding one about the base and one about the solvent alone. */
    List<Rule> deciding(Base base, Solvent solvent, double celsius, boolean protonTaken) {
        Map<FindingKind, Rule> aboutBase = new EnumMap<>(FindingKind.class);
        Map<FindingKind, Rule> aboutSolvent = new EnumMap<>(FindingKind.class);
        for (Rule rule : rules) {
            if ((protonTaken || !rule.needsProton()) && rule.base().holdsFor(base)
                    && rule.surroundings().holdFor(solvent, celsius)) {
                (rule.base().families().isEmpty() ? aboutSolvent : aboutBase).put(rule.kind(), rule);
            }
        }
        return Stream.concat(aboutBase.values().stream(), aboutSolvent.values().stream()).toList();
    }

    List<Rule> rules() {
        return rules;
    }
}
