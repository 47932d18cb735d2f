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
import java.util.OptionalDouble;
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
 * What a base and a solvent do to each other: the rows of {@code base-solvent.csv}.
 *
 * <p>General rows come first: of all rows of one finding kind that fit, the last one decides. Immutable; safe to share.
 */
public final class BaseSolventRules {

    static final Schema SCHEMA = Schema.of("base-solvent.csv", text("id"), list("bases"), list("solvents"),
            number("temperature_from").optional(), number("temperature_to").optional(), RuleCells.kind(), RuleCells.severity(),
            word("destroys", "yes", "no"), number("half_life_minutes").optional(), text("sentence"), text("source"),
            text("hit"), text("miss"));

    /** One row. */
    record Rule(String id, RulePlace place, BaseCondition base, Surroundings surroundings, FindingKind kind,
                Optional<Finding.Severity> severity, boolean destroys, OptionalDouble halfLifeMinutes, String sentence,
                String source, String hit, String miss) {}

    private final List<Rule> rules;

    private BaseSolventRules(List<Rule> rules) {
        this.rules = List.copyOf(rules);
    }

    /**
     * Loads the rules.
     *
     * @param stockroom shelf whose bases and solvents the rules name
     * @throws TableException for a bad cell or name
     */
    public static BaseSolventRules load(TableFolders folders, Stockroom stockroom) {
        List<TableProblem> problems = new ArrayList<>();
        RuleCells cells = new RuleCells(stockroom, problems);
        List<Rule> rules = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            rules.add(new Rule(row.id(), RulePlace.of(row, SCHEMA), cells.families(row), cells.surroundings(row),
                    RuleCells.kind(row), RuleCells.severity(row),
                    row.text("destroys").equals("yes"), row.number("half_life_minutes"), row.text("sentence"),
                    row.text("source"), row.text("hit"), row.text("miss")));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new BaseSolventRules(rules);
    }

    /** What happens between the two at a temperature, most severe first. */
    public List<SolventEffect> of(Base base, Solvent solvent, double celsius) {
        return deciding(base, solvent, celsius).values().stream().filter(rule -> rule.severity().isPresent())
                .map(rule -> effect(rule, base, solvent))
                .sorted(Comparator.comparing((SolventEffect effect) -> effect.finding().severity())).toList();
    }

    /** The row that decides for each kind of finding. */
    Map<FindingKind, Rule> deciding(Base base, Solvent solvent, double celsius) {
        Map<FindingKind, Rule> deciding = new EnumMap<>(FindingKind.class);
        for (Rule rule : rules) {
            if (rule.base().holdsFor(base) && rule.surroundings().holdFor(solvent, celsius)) {
                deciding.put(rule.kind(), rule);
            }
        }
        return deciding;
    }

    List<Rule> rules() {
        return rules;
    }

    private static SolventEffect effect(Rule rule, Base base, Solvent solvent) {
        List<String> evidence = new ArrayList<>(List.of("rule " + rule.id()));
        rule.halfLifeMinutes().ifPresent(minutes -> evidence.add("half-life " + duration(minutes)));
        Finding finding = new Finding(rule.severity().orElseThrow(), rule.kind(),
                RuleCells.fill(rule.sentence(), base, solvent), evidence, List.of(), rule.source());
        return new SolventEffect(rule.id(), finding, rule.destroys(), rule.halfLifeMinutes());
    }

    private static String duration(double minutes) {
        return minutes < 120 ? Math.round(minutes) + " min" : Math.round(minutes / 60) + " h";
    }
}
