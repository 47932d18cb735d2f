package lyate.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** A ranking of bases or acids as CSV. */
public final class RankingCsv implements ResultWriter<Placed> {

    private final SafeCsv csv;

    /**
     * Writes the header line at once.
     *
     * @param what name of the column that names them: {@code base} or {@code acid}
     */
    public RankingCsv(Appendable out, String what) throws IOException {
        this.csv = new SafeCsv(out);
        List<String> names = new ArrayList<>(List.of("rank", what));
        names.addAll(ReviewCells.COLUMNS);
        names.add("why");
        csv.row(names);
    }

    @Override
    public void write(Placed placed) throws IOException {
        List<String> cells = new ArrayList<>(List.of(Integer.toString(placed.place()), placed.choice().reagent().name()));
        cells.addAll(ReviewCells.of(placed.choice().judgement()));
        cells.add(placed.choice().why());
        csv.row(cells);
    }
}
