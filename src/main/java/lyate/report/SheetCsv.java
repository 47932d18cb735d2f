package lyate.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import lyate.sheet.ReviewedRow;
import lyate.sheet.SheetHeader;

/**
 * A reviewed sheet: every column it came with, in its order, then what the review adds. A row that could not be judged
 * keeps its own cells and has empty ones for the rest. Result columns of an earlier run are replaced.
 */
public final class SheetCsv implements ResultWriter<ReviewedRow> {

    private final SafeCsv csv;
    private final List<Integer> kept = new ArrayList<>();

    /** Writes the header line at once. */
    public SheetCsv(Appendable out, SheetHeader header) throws IOException {
        this.csv = new SafeCsv(out);
        List<String> names = new ArrayList<>();
        for (int i = 0; i < header.names().size(); i++) {
            if (!ReviewCells.COLUMNS.contains(header.names().get(i))) {
                kept.add(i);
                names.add(header.names().get(i));
            }
        }
        names.addAll(ReviewCells.COLUMNS);
        csv.row(names);
    }

    @Override
    public void write(ReviewedRow reviewed) throws IOException {
        List<String> cells = new ArrayList<>();
        kept.forEach(index -> cells.add(reviewed.row().cells().get(index)));
        cells.addAll(reviewed.review().map(ReviewCells::of).orElseGet(ReviewCells::none));
        csv.row(cells);
    }
}
