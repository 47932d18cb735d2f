package lyate.table;

import java.util.List;

/**
 * What a table file must look like. Every table has an {@code id} column, unique within the file.
 *
 * @param fileName name within {@code reagent-tables/}, for example {@code bases.csv}
 * @param version  the version that the file's {@code # version:} line must state
 * @param columns  the columns, in the order of the file
 */
public record Schema(String fileName, int version, List<Column> columns) {

    public Schema {
        columns = List.copyOf(columns);
        if (columns.stream().noneMatch(column -> column.name().equals("id"))) {
            throw new IllegalArgumentException(fileName + " declares no id column");
        }
    }

    /** A schema of version 1. */
    public static Schema of(String fileName, Column... columns) {
        return new Schema(fileName, 1, List.of(columns));
    }
}
