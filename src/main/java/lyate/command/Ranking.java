package lyate.command;

import java.io.IOException;
import java.util.List;
import lyate.report.JsonList;
import lyate.report.Placed;
import lyate.report.RankingCsv;
import lyate.report.RankingText;
import lyate.report.ResultWriter;
import lyate.review.Ranked;

/** Writes a ranking, shared by the commands that make one. */
final class Ranking {

    private Ranking() {}

    /**
     * Writes the first of a ranking.
     *
     * @param what what is ranked: {@code base} or {@code acid}
     * @param top  how many are shown, 0 for all
     */
    static void write(Terminal terminal, Format format, String what, List<? extends Ranked> ranked, int top) throws IOException {
        ResultWriter<Placed> writer = switch (format) {
            case TEXT -> new RankingText(terminal.outWriter());
            case CSV -> new RankingCsv(terminal.outWriter(), what);
            case JSON -> new JsonList<>(terminal.outWriter(), Placed::describe);
        };
        for (int place = 1; place <= ranked.size() && (top <= 0 || place <= top); place++) {
            writer.write(new Placed(place, ranked.get(place - 1)));
        }
        writer.finish();
    }
}
