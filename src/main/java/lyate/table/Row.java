package lyate.table;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * One row whose cells already passed the schema.
 *
 * @param source file the row stands in
 * @param line    1-based line on which the row begins
 * @param cells  trimmed cell text by column name, empty text for an empty cell
 */
public record Row(TableText source, int line, Map<String, String> cells) {

    public Row {
        cells = Map.copyOf(cells);
    }

    /** Name of the file the row stands in. */
    public String file() {
        return source.file();
    }

    /** The row's unique name. */
    public String id() {
        return text("id");
    }

    /** Cell text, empty where the cell is empty. */
    public String text(String column) {
        String cell = cells.get(column);
        if (cell == null) {
            throw new IllegalArgumentException("no column " + column + " in " + file() + "; there are " + cells.keySet());
        }
        return cell;
    }

    /** Whether the cell holds anything. */
    public boolean has(String column) {
        return !text(column).isEmpty();
    }

    /** The number in a cell, or empty: a missing number is never zero. */
    public OptionalDouble number(String column) {
        return has(column) ? OptionalDouble.of(Double.parseDouble(text(column))) : OptionalDouble.empty();
    }

    /** The {@code ;}-separated texts of a cell. */
    public List<String> list(String column) {
        return Arrays.stream(text(column).split(";")).map(String::trim).filter(text -> !text.isEmpty()).toList();
    }

    /** A problem with one cell of this row, for checks that go beyond the schema. */
    public TableProblem problem(String column, String expected) {
        return source.problem(line, column, text(column), expected);
    }
}
