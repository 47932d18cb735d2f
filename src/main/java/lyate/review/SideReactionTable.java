package lyate.review;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import lyate.molecule.AtomPattern;
import lyate.molecule.MoleculeException;
import lyate.review.SideReactionRule.Agent;
import lyate.review.SideReactionRule.Condition;
import lyate.review.SideReactionRule.ProtonsFirst;
import lyate.review.SideReactionRule.Range;
import lyate.review.SideReactionRule.Target;
import lyate.stock.Stockroom;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/** Reads {@code side-reactions.csv}. */
final class SideReactionTable {

    static final Schema SCHEMA = Schema.of("side-reactions.csv",
            text("id"), word("agent", "base", "acid"), word("target", "substrate", "partner"), text("smarts"),
            list("bases"), word("nucleophilicity", "none", "low", "medium", "high").optional(),
            word("pka_scale", "water", "dmso").optional(), number("pka_at_least").optional(), number("pka_at_most").optional(),
            number("acid_pka_at_most").optional(), list("solvents"), number("temperature_from").optional(),
            number("temperature_to").optional(),
            word("protons_first", "none", "fast", "all", "lasting"), number("base_left").optional(),
            number("log_k_from").optional(), number("log_k_to").optional(),
            list("unless"), text("unless_smarts").optional(), RuleCells.kind(), RuleCells.severity(),
            word("wins", "yes", "no"), text("sentence"), text("source"), text("hit"), text("miss"));

    private final List<TableProblem> problems = new ArrayList<>();
    private final RuleCells cells;

    SideReactionTable(Stockroom stockroom) {
        this.cells = new RuleCells(stockroom, problems);
    }

    /** The rules in the order of the table. */
    List<SideReactionRule> read(TableFolders folders) {
        List<SideReactionRule> rules = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            Optional<AtomPattern> pattern = pattern(row, "smarts");
            Optional<AtomPattern> unless = pattern(row, "unless_smarts");
            // The other cells are looked at even where the pattern is broken, so that one reading names every fault of the row.
            rules.add(rule(row, pattern, unless));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return rules;
    }

    private SideReactionRule rule(Row row, Optional<AtomPattern> pattern, Optional<AtomPattern> unless) {
        return new SideReactionRule(row.id(), RulePlace.of(row, SCHEMA), Agent.valueOf(upper(row.text("agent"))),
                Target.valueOf(upper(row.text("target"))),
                pattern.orElse(null), cells.base(row), row.number("acid_pka_at_most"), cells.surroundings(row),
                ProtonsFirst.valueOf(upper(row.text("protons_first"))), row.number("base_left").orElse(0),
                new Range(row.number("log_k_from"), row.number("log_k_to")), conditions(row), unless,
                RuleCells.kind(row), RuleCells.severity(row), row.text("wins").equals("yes"), row.text("sentence"),
                row.text("source"), row.text("hit"), row.text("miss"));
    }

    private List<Condition> conditions(Row row) {
        List<Condition> conditions = new ArrayList<>();
        for (String word : row.list("unless")) {
            try {
                conditions.add(Condition.valueOf(upper(word)));
            } catch (IllegalArgumentException e) {
                problems.add(row.problem("unless", "matching-alkoxide, matching-solvent, intended-atom or no-stereocentre"));
            }
        }
        return conditions;
    }

    private Optional<AtomPattern> pattern(Row row, String column) {
        if (!row.has(column)) {
            return Optional.empty();
        }
        try {
            return Optional.of(AtomPattern.compile(row.text(column)));
        } catch (MoleculeException e) {
            problems.add(row.problem(column, "a SMARTS pattern (" + e.getMessage() + ")"));
            return Optional.empty();
        }
    }

    private static String upper(String word) {
        return word.toUpperCase(Locale.ROOT).replace('-', '_');
    }
}
