package lyate.review;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.review.KineticPreference.Control;
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
 * Which of two C-H positions loses its proton first: the rows of {@code kinetic-preferences.csv}.
 *
 * <p>General rows come first: of all rows that fit, the last one decides. Immutable; safe to share between threads.
 */
final class KineticPreferences {

    static final Schema SCHEMA = Schema.of("kinetic-preferences.csv", text("id"), word("control", "rate", "equilibrium"),
            list("bases"), list("solvents"), number("temperature_from").optional(), number("temperature_to").optional(),
            text("prefers"), text("over"), text("sentence"), text("source"), text("hit"), text("miss"));

    private final List<KineticPreference> rules;

    private KineticPreferences(List<KineticPreference> rules) {
        this.rules = List.copyOf(rules);
    }

    /**
     * Loads the rules.
     *
     * @param stockroom shelf whose bases and solvents the rules name
     * @throws TableException for a bad cell, pattern or name
     */
    static KineticPreferences load(TableFolders folders, Stockroom stockroom) {
        List<TableProblem> problems = new ArrayList<>();
        RuleCells cells = new RuleCells(stockroom, problems);
        List<KineticPreference> rules = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            Optional<AtomPattern> prefers = pattern(row, "prefers", problems);
            Optional<AtomPattern> over = pattern(row, "over", problems);
            Control control = row.text("control").equals("rate") ? Control.RATE : Control.EQUILIBRIUM;
            if (prefers.isPresent() && over.isPresent()) {
                rules.add(new KineticPreference(row.id(), control, cells.families(row), cells.surroundings(row),
                        prefers.get(), over.get(), row.text("sentence"), row.text("source"), row.text("hit"), row.text("miss")));
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new KineticPreferences(rules);
    }

    /**
     * The row that says one position goes before another, if one does.
     *
     * @param preferredAtom index of the atom asked about
     * @param otherAtom     index of the atom it is set against
     * @param celsius       temperature of the deprotonation
     */
    Optional<KineticPreference> preference(Molecule molecule, int preferredAtom, int otherAtom, Base base, double celsius,
                                           Solvent solvent) {
        if (molecule.symmetryClass(preferredAtom) == molecule.symmetryClass(otherAtom)) {
            return Optional.empty();
        }
        return rules.stream().filter(rule -> rule.holds(molecule, preferredAtom, otherAtom, base, celsius, solvent))
                .reduce((earlier, later) -> later);
    }

    List<KineticPreference> rules() {
        return rules;
    }

    private static Optional<AtomPattern> pattern(Row row, String column, List<TableProblem> problems) {
        try {
            return Optional.of(AtomPattern.compile(row.text(column)));
        } catch (MoleculeException e) {
            problems.add(row.problem(column, "a SMARTS pattern (" + e.getMessage() + ")"));
            return Optional.empty();
        }
    }
}
