package lyate.table;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A table read from every folder that has it, each row checked against the schema.
 *
 * <p>A table file starts with {@code #} lines that say what it is, its units, how rows are matched and its
 * {@code # version:}; then a header line, then rows. Blank lines and {@code #} lines between rows are skipped. A column whose
 * cells may be empty may be left out.
 *
 * @param schema what the file was checked against
 * @param rows   packaged rows in file order (replaced ones in place), then rows that a later folder added
 */
public record Table(Schema schema, List<Row> rows) {

    public Table {
        rows = List.copyOf(rows);
    }

    /**
     * Reads a table.
     *
     * @throws TableException naming file, line, column, text found and what was expected, for every bad cell
     */
    public static Table read(Schema schema, TableFolders folders) {
        List<TableFolders.Source> sources = folders.sourcesOf(schema.fileName());
        if (sources.isEmpty()) {
            throw new TableException(List.of(new TableProblem(schema.fileName(), 0, "", "no such file", "a table")));
        }
        List<TableProblem> problems = new ArrayList<>();
        Map<String, Row> rows = new LinkedHashMap<>();
        for (TableFolders.Source source : sources) {
            for (Row row : new TableParser(schema, TableText.of(source.name(), source.text()), problems).parse()) {
                rows.put(row.id(), row);
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new Table(schema, List.copyOf(rows.values()));
    }
}
