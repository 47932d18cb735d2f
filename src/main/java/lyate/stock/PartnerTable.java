package lyate.stock;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import lyate.table.NearestNames;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/** Reads {@code partners.csv}. */
final class PartnerTable {

    static final Schema SCHEMA = Schema.of("partners.csv", text("id"), text("name"), list("aliases"), text("kind"),
            text("smiles"), list("tolerated_bases"), list("consuming_bases"), number("molar_mass"),
            number("density").optional(), number("boiling_point").optional(), text("notes").optional(), text("source"));

    private PartnerTable() {}

    /** The partners in the order of the table; {@code families} are the ids of the base families there are. */
    static List<Partner> read(TableFolders folders, Set<String> families) {
        List<TableProblem> problems = new ArrayList<>();
        List<Partner> partners = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            for (String column : List.of("tolerated_bases", "consuming_bases")) {
                row.list(column).stream().filter(family -> !families.contains(family)).forEach(family ->
                        problems.add(row.problem(column, "families of base-families.csv instead of " + family + ", nearest: "
                                + String.join(", ", NearestNames.of(family, families, 3)))));
            }
            StructureCheck.of(row, SCHEMA.fileName(), problems);
            partners.add(new Partner(row.id(), row.text("name"), row.list("aliases"), row.text("kind"), row.text("smiles"),
                    row.list("tolerated_bases"), row.list("consuming_bases"), row.number("molar_mass").getAsDouble(),
                    row.number("density"), row.number("boiling_point"), row.text("notes"), row.text("source")));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return partners;
    }
}
