package lyate.stock;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lyate.table.Column;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/** Reads {@code solvents.csv}. */
final class SolventTable {

    static final Schema SCHEMA = schema();

    private SolventTable() {}

    private static Schema schema() {
        List<Column> columns = new ArrayList<>(List.of(text("id"), text("name"), list("aliases"), text("smiles"),
                word("kind", "protic", "dipolar-aprotic", "low-polarity"), text("scale")));
        for (String medium : List.of("water", "dmso", "own")) {
            columns.addAll(PKaCells.columns(medium));
        }
        columns.addAll(List.of(number("boiling_point"), number("melting_point").optional(), number("density"),
                number("permittivity").optional(), number("heat_capacity").optional(), number("molar_mass"),
                number("typical_water_ppm").optional(), number("saturation_ppm").optional(), text("notes").optional(),
                text("source")));
        return Schema.of("solvents.csv", columns.toArray(Column[]::new));
    }

    /** The solvents in the order of the table. */
    static List<Solvent> read(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Solvent> solvents = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            solvents.add(solvent(row, problems));
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return solvents;
    }

    private static Solvent solvent(Row row, List<TableProblem> problems) {
        StructureCheck.of(row, SCHEMA.fileName(), problems);
        Map<Medium, KnownPKa> donorPKas = new HashMap<>(
                PKaCells.read(row, List.of(Medium.WATER, Medium.DMSO), problems));
        PKaCells.read(row, "own", problems).ifPresent(value -> donorPKas.put(new Medium(row.id()), value));
        return new Solvent(row.id(), row.text("name"), row.list("aliases"), row.text("smiles"), kind(row),
                new Medium(row.text("scale")), donorPKas, row.number("boiling_point").getAsDouble(),
                row.number("melting_point"), row.number("density").getAsDouble(), row.number("permittivity"),
                row.number("heat_capacity"), row.number("molar_mass").getAsDouble(), row.number("typical_water_ppm"),
                row.number("saturation_ppm"), row.text("notes"), row.text("source"));
    }

    private static Solvent.Kind kind(Row row) {
        return switch (row.text("kind")) {
            case "protic" -> Solvent.Kind.PROTIC;
            case "dipolar-aprotic" -> Solvent.Kind.DIPOLAR_APROTIC;
            default -> Solvent.Kind.LOW_POLARITY;
        };
    }
}
