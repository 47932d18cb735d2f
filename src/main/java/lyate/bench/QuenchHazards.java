package lyate.bench;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.review.Finding;
import lyate.review.Finding.Severity;
import lyate.review.SideReactions;
import lyate.stock.Stockroom;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * Groups hurt by the water of a work-up: by base the rows of {@code quench-hazards.csv}, by acid those of
 * {@code side-reactions.csv} about acid, with the pH in place of the acid's pKa. Loaded once; immutable; safe to share
 * between threads.
 */
public final class QuenchHazards {

    static final Schema SCHEMA = Schema.of("quench-hazards.csv", text("id"), text("group"), text("smarts"), number("above_ph"),
            word("severity", "stop", "caution", "note"), text("sentence"), text("source"), text("hit"), text("miss"));

    private static final double ROOM_CELSIUS = 25;

    /** One row. */
    record Rule(String id, AtomPattern pattern, double abovePH, Severity severity, String sentence, String source, String hit,
                String miss) {

        Optional<GroupHazard> in(Molecule molecule, double highestPH) {
            List<Integer> atoms = highestPH <= abovePH ? List.of() : IntStream.range(0, molecule.atomCount())
                    .filter(atom -> pattern.matches(molecule, atom)).boxed().toList();
            return atoms.isEmpty() ? Optional.empty() : Optional.of(new GroupHazard(atoms, false, severity, sentence, source));
        }
    }

    private final List<Rule> rules;
    private final SideReactions underAcid;

    private QuenchHazards(List<Rule> rules, SideReactions underAcid) {
        this.rules = List.copyOf(rules);
        this.underAcid = underAcid;
    }

    /**
     * Loads the rules.
     *
     * @param stockroom shelf whose bases and solvents the side reactions name
     * @throws TableException for a bad cell
     */
    public static QuenchHazards load(TableFolders folders, Stockroom stockroom) {
        List<TableProblem> problems = new ArrayList<>();
        List<Rule> rules = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            rule(row, problems).ifPresent(rules::add);
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new QuenchHazards(rules, SideReactions.load(folders, stockroom));
    }

    /** Groups of the molecule that water between two pH values would hurt: by acid first, then by base. */
    public List<GroupHazard> of(Molecule molecule, double lowestPH, double highestPH) {
        List<GroupHazard> hazards = new ArrayList<>();
        for (Finding finding : underAcid.underAcid(molecule, lowestPH, ROOM_CELSIUS)) {
            hazards.add(new GroupHazard(finding.atoms(), true, finding.severity(), finding.sentence(), finding.source()));
        }
        rules.forEach(rule -> rule.in(molecule, highestPH).ifPresent(hazards::add));
        return hazards;
    }

    List<Rule> rules() {
        return rules;
    }

    private static Optional<Rule> rule(Row row, List<TableProblem> problems) {
        try {
            double abovePH = row.number("above_ph").getAsDouble();
            String where = abovePH > 0 ? String.format(Locale.ROOT, " above pH %s", Double.toString(abovePH).replaceAll("\\.0$", "")) : "";
            return Optional.of(new Rule(row.id(), AtomPattern.compile(row.text("smarts")), abovePH,
                    Severity.valueOf(row.text("severity").toUpperCase(Locale.ROOT)),
                    "The " + row.text("group") + " " + row.text("sentence") + where + ".", row.text("source"), row.text("hit"), row.text("miss")));
        } catch (MoleculeException e) {
            problems.add(row.problem("smarts", "a SMARTS pattern: " + e.getMessage()));
            return Optional.empty();
        }
    }
}
