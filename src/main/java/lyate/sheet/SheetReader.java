package lyate.sheet;

import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.NoSuchElementException;

/**
 * Reads a route sheet row by row; keeps none of them. Tolerates a byte order mark, any line ends, semicolons or tabs,
 * comment lines, missing columns and line breaks in quoted cells. A row that cannot be taken apart says so itself.
 */
public final class SheetReader implements RowSource {

    /** What a decoder puts where the bytes are no letter. */
    private static final char NO_LETTER = '\uFFFD';
    private static final String NOT_UTF_8 = "the input is not UTF-8 text; save it as CSV UTF-8";

    private final RecordCutter cutter;
    private final Dialect dialect;
    private final RawRecord headerRecord;
    private final SheetHeader header;
    private RawRecord next;
    private int number;

    /**
     * Reads up to the header line.
     *
     * @param sheet closed by the caller
     * @throws SheetException where there is no usable header
     */
    public SheetReader(Reader sheet) throws IOException, SheetException {
        this.cutter = new RecordCutter(sheet);
        this.headerRecord = firstRecord();
        checkLetters();
        this.dialect = Dialect.of(headerRecord.text());
        this.header = new SheetHeader(headerCells());
        header.check();
        this.next = cutter.next();
    }

    private void checkLetters() throws SheetException {
        if (headerRecord.text().indexOf(NO_LETTER) >= 0 || headerRecord.text().indexOf('\0') >= 0) {
            throw new SheetException(NOT_UTF_8);
        }
    }

    private RawRecord firstRecord() throws IOException, SheetException {
        RawRecord first = cutter.next();
        if (Dialect.stated(first.text())) {
            RawRecord following = cutter.next();
            first = new RawRecord(following.line(), first.lead() + first.text() + following.lead(), following.text());
        }
        if (first.text().isEmpty()) {
            throw new SheetException("the sheet is empty; its first line should be " + String.join(",", SheetColumn.headers()));
        }
        return first;
    }

    private List<String> headerCells() throws SheetException {
        try {
            return dialect.cells(headerRecord.text()).stream().map(String::strip).toList();
        } catch (IOException e) {
            throw new SheetException("line " + headerRecord.line() + ": the quotes of the header are not in order");
        }
    }

    @Override
    public SheetHeader header() {
        return header;
    }

    Dialect dialect() {
        return dialect;
    }

    /** The header with what stands before it. */
    RawRecord headerRecord() {
        return headerRecord;
    }

    @Override
    public boolean hasNext() {
        return !next.text().isEmpty();
    }

    @Override
    public SheetRow next() {
        return row(nextRaw());
    }

    /** The next record as it stands; at the end of the file its text is empty. */
    RawRecord nextRaw() {
        RawRecord raw = next;
        try {
            if (!raw.text().isEmpty()) {
                next = cutter.next();
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return raw;
    }

    /** A record taken apart into cells. */
    SheetRow row(RawRecord raw) {
        if (raw.text().isEmpty()) {
            throw new NoSuchElementException("the sheet has no further row");
        }
        number++;
        try {
            List<String> cells = dialect.cells(raw.text());
            boolean excess = cells.stream().skip(header.names().size()).anyMatch(cell -> !cell.isBlank());
            String problem = excess ? cells.size() + " cells, but the header has " + header.names().size() + " columns"
                    : raw.text().indexOf(NO_LETTER) >= 0 ? NOT_UTF_8 : "";
            return new SheetRow(header, number, raw.line(), cells, problem);
        } catch (IOException e) {
            return new SheetRow(header, number, raw.line(), List.of(), "a quoted cell is not closed, or text follows its closing quote");
        }
    }
}
