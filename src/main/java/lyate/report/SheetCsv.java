package lyate.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.review.Judgement;
import lyate.review.SiteOrigin;
import lyate.sheet.ReviewedRow;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetHeader;
import lyate.sheet.SheetRow;

/**
 * A reviewed sheet: every column it came with, in its order, then what the review adds. A row that could not be judged
 * keeps its own cells and has empty ones for the rest. Result columns of an earlier run are replaced. A sheet with a column
 * {@code reaction} gets two more: the site the reaction means, and how sure that is.
 */
public final class SheetCsv implements ResultWriter<ReviewedRow> {

    private static final List<String> REACTION_COLUMNS = List.of("reaction_site", "reaction_confidence");

    private final SafeCsv csv;
    private final SheetHeader header;
    private final boolean reactions;
    private final List<Integer> kept = new ArrayList<>();

    /** Writes nothing yet; {@link #begin()} writes the header line. */
    public SheetCsv(Appendable out, SheetHeader header) {
        this.csv = new SafeCsv(out);
        this.header = header;
        this.reactions = header.has(SheetColumn.REACTION);
        for (int i = 0; i < header.names().size(); i++) {
            boolean ours = ReviewCells.COLUMNS.contains(header.names().get(i)) || reactions && REACTION_COLUMNS.contains(header.names().get(i));
            if (!ours) {
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
        names.addAll(reactions ? REACTION_COLUMNS : List.of());
        return names;
    }

    private List<String> given(SheetRow row) {
        return kept.stream().map(index -> row.cells().get(index)).toList();
    }

    @Override
    public void write(ReviewedRow reviewed) throws IOException {
        write(reviewed.row(), reviewed.review().map(ReviewCells::of).orElseGet(ReviewCells::none),
                reviewed.review().flatMap(review -> review.step().origin()));
    }

    /** Writes a row and what became of it. */
    public void write(SheetRow row, Judgement judgement) throws IOException {
        write(row, ReviewCells.of(judgement), Optional.empty());
    }

    private void write(SheetRow row, List<String> added, Optional<SiteOrigin> origin) throws IOException {
        List<String> cells = new ArrayList<>(given(row));
        cells.addAll(added);
        if (reactions) {
            cells.add(origin.flatMap(SiteOrigin::site).orElse(""));
            cells.add(origin.map(SiteOrigin::confidence).orElse(""));
        }
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
