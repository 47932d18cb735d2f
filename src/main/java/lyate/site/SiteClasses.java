package lyate.site;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.molecule.AtomPattern;
import lyate.molecule.MoleculeException;
import lyate.site.SiteClass.ClassValue;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * The rows of {@code site-classes.csv}, general ones first: of all rows that match an atom the last one decides.
 *
 * @param rows in file order
 */
public record SiteClasses(List<SiteClass> rows) {

    /** What {@code site-classes.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("site-classes.csv",
            text("id"), text("name"), word("role", "acid", "base"), text("smarts"), text("family"),
            number("pka_water").optional(), number("sigma_water").optional(), text("source_water").optional(),
            number("pka_dmso").optional(), number("sigma_dmso").optional(), text("source_dmso").optional(),
            text("hit"), text("miss"));

    public SiteClasses {
        rows = List.copyOf(rows);
    }

    /**
     * Loads the table and compiles its patterns.
     *
     * @throws TableException for a bad cell, a pattern that does not compile, or a value without sigma and source
     */
    public static SiteClasses load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<SiteClass> classes = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            read(row, problems).ifPresent(classes::add);
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new SiteClasses(classes);
    }

    private static Optional<SiteClass> read(Row row, List<TableProblem> problems) {
        try {
            Role role = row.text("role").equals("acid") ? Role.ACID : Role.BASE;
            return Optional.of(new SiteClass(row.id(), row.text("name"), role, AtomPattern.compile(row.text("smarts")),
                    row.text("family"), value(row, "water", problems), value(row, "dmso", problems),
                    row.text("hit"), row.text("miss")));
        } catch (MoleculeException e) {
            problems.add(row.problem("smarts", "a SMARTS pattern (" + e.getMessage() + ")"));
            return Optional.empty();
        }
    }

    private static Optional<ClassValue> value(Row row, String medium, List<TableProblem> problems) {
        if (!row.has("pka_" + medium)) {
            return Optional.empty();
        }
        if (!row.has("sigma_" + medium) || !row.has("source_" + medium)) {
            problems.add(row.problem("pka_" + medium, "a sigma and a source beside the value"));
            return Optional.empty();
        }
        return Optional.of(new ClassValue(row.number("pka_" + medium).getAsDouble(),
                row.number("sigma_" + medium).getAsDouble(), row.text("source_" + medium)));
    }
}
