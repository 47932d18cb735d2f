package lyate.report;

import java.io.IOException;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.QuoteMode;

/**
 * CSV that a spreadsheet opens as data: a cell that it would take for a formula gets an apostrophe in front.
 * Numbers keep their sign.
 */
final class SafeCsv {

    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder().setRecordSeparator("\n")
            .setQuoteMode(QuoteMode.MINIMAL).get();

    private final Appendable out;

    SafeCsv(Appendable out) {
        this.out = out;
    }

    void row(List<String> cells) throws IOException {
        out.append(text(cells)).append('\n');
    }

    /** A record without its line end. */
    static String text(List<String> cells) {
        return FORMAT.format(cells.stream().map(SafeCsv::safe).toArray());
    }

    static String safe(String cell) {
        boolean number = cell.matches("[-+]?(\\d+[.,]?\\d*|[.,]\\d+)([eE][-+]?\\d+)?|-?inf");
        return !cell.isEmpty() && !number && "=+-@\t\r\n".indexOf(cell.charAt(0)) >= 0 ? "'" + cell : cell;
    }
}
