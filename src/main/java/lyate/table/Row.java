package lyate.table;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * One row whose cells already passed the schema. Immutable.
 *
 * @param source file the row stands in
 * @param line   1-based line on which the row begins
 * @param places index of each column among the cells, shared by the rows of a table
 * @param cells  trimmed cell text, empty text for an empty cell
 */
public record Row(TableText source, int line, Map<String, Integer> places, List<String> cells) {

    public Row {
        places = Map.copyOf(places);
        cells = List.copyOf(cells);
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
        Integer place = places.get(column);
        if (place == null) {
            throw new IllegalArgumentException("no column " + column + " in " + file() + "; there are " + places.keySet());
        }
        return cells.get(place);
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
