package lyate.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import lyate.review.Judgement;
import lyate.sheet.ReviewedRow;
import lyate.sheet.SheetHeader;
import lyate.sheet.SheetRow;

/**
 * A reviewed sheet: every column it came with, in its order, then what the review adds. A row that could not be judged
 * keeps its own cells and has empty ones for the rest. Result columns of an earlier run are replaced.
 */
public final class SheetCsv implements ResultWriter<ReviewedRow> {

    private final SafeCsv csv;
    private final SheetHeader header;
    private final List<Integer> kept = new ArrayList<>();

    /** Writes nothing yet; {@link #begin()} writes the header line. */
    public SheetCsv(Appendable out, SheetHeader header) {
        this.csv = new SafeCsv(out);
        this.header = header;
        for (int i = 0; i < header.names().size(); i++) {
            if (!ReviewCells.COLUMNS.contains(header.names().get(i))) {
                kept.add(i);
            }
        }
    }

    /** Writes the header line. */
    public SheetCsv begin() throws IOException {
        csv.row(names());
        return this;
    }

    private List<String> names() {
        List<String> names = new ArrayList<>();
        kept.forEach(index -> names.add(header.names().get(index)));
        names.addAll(ReviewCells.COLUMNS);
        return names;
    }

    private List<String> given(SheetRow row) {
        return kept.stream().map(index -> row.cells().get(index)).toList();
    }

    @Override
    public void write(ReviewedRow reviewed) throws IOException {
        write(reviewed.row(), reviewed.review().map(ReviewCells::of).orElseGet(ReviewCells::none));
    }

    /** Writes a row and what became of it. */
    public void write(SheetRow row, Judgement judgement) throws IOException {
        write(row, ReviewCells.of(judgement));
    }

    private void write(SheetRow row, List<String> added) throws IOException {
        List<String> cells = new ArrayList<>(given(row));
        cells.addAll(added);
        csv.row(cells);
    }

    /** The header line without its line end, as it is written. */
    String headerText() {
        return SafeCsv.text(names());
    }

    /** What the line of a row begins with, before the cells that the review adds. */
    String textOf(SheetRow row) {
        return SafeCsv.text(given(row)) + ",";
    }
}
