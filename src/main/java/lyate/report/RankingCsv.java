package lyate.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** A ranking of bases as CSV. */
public final class RankingCsv implements ResultWriter<Placed> {

    private final SafeCsv csv;

    /** Writes the header line at once. */
    public RankingCsv(Appendable out) throws IOException {
        this.csv = new SafeCsv(out);
        List<String> names = new ArrayList<>(List.of("rank", "base"));
        names.addAll(ReviewCells.COLUMNS);
        names.add("why");
        csv.row(names);
    }

    @Override
    public void write(Placed placed) throws IOException {
        List<String> cells = new ArrayList<>(List.of(Integer.toString(placed.place()), placed.base().base().name()));
        cells.addAll(ReviewCells.of(placed.base().review()));
        cells.add(placed.base().why());
        csv.row(cells);
    }
}
