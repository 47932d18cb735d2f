package lyate.stock;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.List;
import lyate.table.Column;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/** Reads {@code acids.csv}. */
final class AcidTable {

    private static final List<String> USES = List.of("quench", "salt", "deprotection");
    private static final List<Medium> MEDIA = List.of(Medium.WATER, Medium.DMSO, Medium.ACETONITRILE);

    static final Schema SCHEMA = schema();

    private AcidTable() {}

    private static Schema schema() {
        List<Column> columns = new ArrayList<>(List.of(text("id"), text("name"), list("aliases"), text("smiles")));
        MEDIA.forEach(medium -> columns.addAll(PKaCells.columns(medium.id())));
        columns.addAll(List.of(list("further_stages"), list("uses"), word("form", "solid", "liquid", "gas", "solution"),
                text("stock"), number("strength").optional(), word("strength_unit", "mol/L", "mass-percent").optional(),
                number("molar_mass"), number("density").optional(), text("notes").optional(), text("source")));
        return Schema.of("acids.csv", columns.toArray(Column[]::new));
    }

    /** The acids in the order of the table. */
    static List<Acid> read(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Acid> acids = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            if (!USES.containsAll(row.list("uses"))) {
                problems.add(row.problem("uses", "words out of " + String.join(", ", USES)));
            }
            StructureCheck.of(row, SCHEMA.fileName(), problems);
            acids.add(new Acid(row.id(), row.text("name"), row.list("aliases"), row.text("smiles"),
                    PKaCells.read(row, MEDIA, problems), PKaCells.furtherStages(row, problems), row.list("uses"),
                    row.text("form"), row.text("stock"), PKaCells.strength(row, problems),
                    row.number("molar_mass").getAsDouble(), row.number("density"), row.text("notes"), row.text("source")));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return acids;
    }
}
