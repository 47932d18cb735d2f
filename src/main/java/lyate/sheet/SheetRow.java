package lyate.sheet;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * One row of a route sheet.
 *
 * @param header  the columns
 * @param number  1-based, comment and blank lines not counted
 * @param line    1-based line of the file on which it begins; 0 where it has none
 * @param cells   text of every column as it stands, in the order of the header
 * @param problem why the row cannot be taken apart into cells, in words; empty for a sound one
 */
public record SheetRow(SheetHeader header, int number, int line, List<String> cells, String problem) {

    public SheetRow {
        List<String> padded = new ArrayList<>(cells);
        padded.addAll(Collections.nCopies(Math.max(0, header.names().size() - cells.size()), ""));
        cells = List.copyOf(padded.subList(0, header.names().size()));
    }

    /** Text of a cell without blanks at its ends; empty where the cell is, or where there is no such column. */
    public String text(SheetColumn column) {
        int index = header.indexOf(column.header());
        return index < 0 ? "" : cells.get(index).strip();
    }

    /** What the row is called: its {@code step} cell, or its number. */
    public String name() {
        String step = text(SheetColumn.STEP);
        return step.isEmpty() ? Integer.toString(number) : step;
    }

    /** The place for messages, for example {@code row 3 (A003, line 5)}. */
    public String place() {
        String where = Stream.of(text(SheetColumn.STEP), line > 0 ? "line " + line : "").filter(part -> !part.isEmpty())
                .collect(Collectors.joining(", "));
        return "row " + number + (where.isEmpty() ? "" : " (" + where + ")");
    }
}
