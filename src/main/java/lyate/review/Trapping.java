package lyate.review;

import static lyate.table.Column.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
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
 * Says where an electrophile takes the anion of a partial equilibrium away for good, from {@code trapping.csv}: the verdict
 * stays partial, the reaction may still go to its end. Immutable; safe to share between threads.
 */
final class Trapping {

    static final Schema SCHEMA = Schema.of("trapping.csv", text("id"), text("name"), text("smarts"), text("source"), text("hit"), text("miss"));

    /** One row. */
    record Electrophile(String id, String name, AtomPattern pattern, String source, String hit, String miss) {

        boolean isIn(Molecule molecule) {
            return IntStream.range(0, molecule.atomCount()).anyMatch(atom -> pattern.matches(molecule, atom));
        }
    }

    private final List<Electrophile> electrophiles;

    private Trapping(List<Electrophile> electrophiles) {
        this.electrophiles = List.copyOf(electrophiles);
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell
     */
    static Trapping load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Electrophile> electrophiles = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            try {
                electrophiles.add(new Electrophile(row.id(), row.text("name"), AtomPattern.compile(row.text("smarts")), row.text("source"),
                        row.text("hit"), row.text("miss")));
            } catch (MoleculeException e) {
                problems.add(row.problem("smarts", "a SMARTS pattern (" + e.getMessage() + ")"));
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new Trapping(electrophiles);
    }

    /** A note where the verdict is partial and the partner traps the anion. */
    List<Finding> of(Situation situation) {
        if (situation.verdict() != Verdict.PARTIAL) {
            return List.of();
        }
        Optional<Electrophile> trap = situation.step().partner().flatMap(partner ->
                electrophiles.stream().filter(electrophile -> electrophile.isIn(partner)).findFirst());
        return trap.map(electrophile -> List.of(finding(situation, electrophile))).orElse(List.of());
    }

    private static Finding finding(Situation situation, Electrophile trap) {
        Donor intended = situation.intended();
        String sentence = String.format(Locale.ROOT, "The %s takes the anion of %s away for good: the reaction can go to its end through"
                + " the partial equilibrium, at the pace that the little anion allows.", trap.name(), intended.label());
        return new Finding(Severity.NOTE, FindingKind.TRAPPING, sentence, List.of(String.format(Locale.ROOT, "log K %.1f at %s",
                intended.logK(), intended.label())), intended.site().equivalent(), trap.source());
    }

    List<Electrophile> electrophiles() {
        return electrophiles;
    }
}
