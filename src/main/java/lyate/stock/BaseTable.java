package lyate.stock;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lyate.table.Column;
import lyate.table.NearestNames;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/** Reads {@code base-families.csv} and {@code bases.csv}. */
final class BaseTable {

    static final Schema FAMILIES = Schema.of("base-families.csv", text("id"), text("name"),
            word("irreversible", "yes", "no"), word("insoluble", "yes", "no"), word("strong", "yes", "no"),
            word("hindered", "yes", "no"), text("source"));

    static final List<Medium> MEDIA = List.of(Medium.WATER, Medium.DMSO, Medium.ACETONITRILE, Medium.THF);

    static final Schema BASES = basesSchema();

    private final TableFolders folders;
    private final List<TableProblem> problems = new ArrayList<>();

    private final Map<String, BaseFamily> families = new LinkedHashMap<>();

    BaseTable(TableFolders folders) {
        this.folders = folders;
        for (Row row : Table.read(FAMILIES, folders).rows()) {
            families.put(row.id(), new BaseFamily(row.id(), row.text("name"), yes(row, "irreversible"),
                    yes(row, "insoluble"), yes(row, "strong"), yes(row, "hindered"), row.text("source")));
        }
    }

    /** The ids of the families there are. */
    Set<String> familyIds() {
        return families.keySet();
    }

    private static Schema basesSchema() {
        List<Column> columns = new ArrayList<>(List.of(text("id"), text("name"), list("aliases"), text("family"),
                text("smiles"), text("conjugate_acid"), text("counter_ion")));
        MEDIA.forEach(medium -> columns.addAll(PKaCells.columns(medium.id())));
        columns.addAll(List.of(list("further_stages"), word("protons_per_formula", "1", "2", "3"),
                word("nucleophilicity", "none", "low", "medium", "high"),
                word("form", "solid", "liquid", "gas", "solution", "suspension", "dispersion"), text("stock"),
                number("strength").optional(), word("strength_unit", "mol/L", "mass-percent").optional(),
                number("molar_mass"), number("density").optional(),
                text("gas").optional(), list("highest_temperature"), text("notes").optional(), text("source")));
        return Schema.of("bases.csv", columns.toArray(Column[]::new));
    }

    /** The bases in the order of the table. */
    List<Base> read() {
        List<Base> bases = new ArrayList<>();
        for (Row row : Table.read(BASES, folders).rows()) {
            BaseFamily family = families.get(row.text("family"));
            if (family == null) {
                problems.add(row.problem("family", "a family of base-families.csv, nearest: "
                        + String.join(", ", NearestNames.of(row.text("family"), families.keySet(), 3))));
            }
            // The other cells are looked at all the same, so that one reading names every fault of the row.
            bases.add(base(row, family));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return bases;
    }

    private Base base(Row row, BaseFamily family) {
        StructureCheck.of(row, BASES.fileName(), problems, "conjugate_acid");
        return new Base(row.id(), row.text("name"), row.list("aliases"), family, row.text("smiles"),
                row.text("conjugate_acid"), row.text("counter_ion"), PKaCells.read(row, MEDIA, problems),
                PKaCells.furtherStages(row, problems), Integer.parseInt(row.text("protons_per_formula")),
                row.text("nucleophilicity"), row.text("form"), row.text("stock"), PKaCells.strength(row, problems),
                row.number("molar_mass").getAsDouble(), row.number("density"), row.text("gas"),
                highestTemperatures(row), row.text("notes"), row.text("source"));
    }

    private Map<String, Double> highestTemperatures(Row row) {
        Map<String, Double> temperatures = new HashMap<>();
        for (String entry : row.list("highest_temperature")) {
            String[] parts = entry.split(":");
            if (parts.length == 2 && parts[1].strip().matches("-?\\d+")) {
                temperatures.put(parts[0].strip(), Double.valueOf(parts[1].strip()));
            } else {
                problems.add(row.problem("highest_temperature", "entries such as thf:-20, separated by ;"));
            }
        }
        return temperatures;
    }

    private static boolean yes(Row row, String column) {
        return row.text(column).equals("yes");
    }
}
