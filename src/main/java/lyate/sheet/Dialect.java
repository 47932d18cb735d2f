package lyate.sheet;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.apache.commons.csv.QuoteMode;

/**
 * How a CSV file is written.
 *
 * @param delimiter comma, semicolon or tab
 * @param lineEnd   what ends its lines
 */
record Dialect(char delimiter, String lineEnd) {

    /** What sheets are written in unless they came otherwise. */
    static final Dialect USUAL = new Dialect(',', "\n");

    private static final Pattern STATED = Pattern.compile("sep=(.)\\s*", Pattern.CASE_INSENSITIVE);

    /** Whether the line does nothing but state the delimiter, as some spreadsheets write it. */
    static boolean stated(String line) {
        return STATED.matcher(line).matches();
    }

    /** The dialect whose delimiter stands most often in the header line, outside quotes. */
    static Dialect of(String headerLine) {
        String bare = headerLine.replaceAll("\"[^\"]*\"", "");
        char best = ',';
        for (char candidate : new char[] {';', '\t'}) {
            if (count(bare, candidate) > count(bare, best)) {
                best = candidate;
            }
        }
        String lineEnd = headerLine.endsWith("\r\n") ? "\r\n" : headerLine.endsWith("\r") ? "\r" : "\n";
        return new Dialect(best, lineEnd);
    }

    private static long count(String text, char wanted) {
        return text.chars().filter(letter -> letter == wanted).count();
    }

    /**
     * The cells of one record, as they stand between delimiters.
     *
     * @throws IOException where its quotes are not in order
     */
    List<String> cells(String record) throws IOException {
        CSVFormat format = CSVFormat.RFC4180.builder().setDelimiter(delimiter).setIgnoreEmptyLines(true).get();
        try (CSVParser parser = CSVParser.parse(record, format)) {
            List<CSVRecord> records = parser.getRecords();
            return records.isEmpty() ? List.of() : new ArrayList<>(records.get(0).toList());
        } catch (UncheckedIOException e) {
            throw e.getCause();
        }
    }

    /** One record with its line end; cells are quoted where they must be. */
    String record(List<String> cells) {
        CSVFormat format = CSVFormat.RFC4180.builder().setDelimiter(delimiter).setRecordSeparator(lineEnd)
                .setQuoteMode(QuoteMode.MINIMAL).get();
        return format.format(cells.toArray()) + lineEnd;
    }
}
