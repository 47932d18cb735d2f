package lyate.acidity.lfer;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.List;
import java.util.Optional;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * The rows of {@code estimate-pools.csv}.
 *
 * @param all in file order
 */
public record Pools(List<Pool> all) {

    static final Schema SCHEMA = Schema.of("estimate-pools.csv", text("id"), word("medium", "water", "dmso"), text("pool"),
            list("groups"), number("base_pool"), number("base_line"), number("slope_pool"), number("slope_line"),
            number("similarity"), number("form"), number("noise"), text("source"));

    public Pools {
        all = List.copyOf(all);
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell
     */
    public static Pools load(TableFolders folders) {
        return new Pools(Table.read(SCHEMA, folders).rows().stream().map(Pools::pool).toList());
    }

    private static Pool pool(Row row) {
        return new Pool(new Medium(row.text("medium")), row.text("pool"), row.list("groups"), value(row, "base_pool"),
                value(row, "base_line"), value(row, "slope_pool"), value(row, "slope_line"), value(row, "similarity"),
                value(row, "form"), value(row, "noise"));
    }

    private static double value(Row row, String column) {
        return row.number(column).getAsDouble();
    }

    /** The pool of a group in a medium. */
    public Optional<Pool> of(Medium medium, String group) {
        return all.stream().filter(pool -> pool.medium().equals(medium) && pool.groups().contains(group)).findFirst();
    }
}
