package lyate.sheet;

import java.io.IOException;
import java.io.StringReader;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A route sheet held whole, to be changed and saved: what is not changed is written back as it was read, byte by byte.
 * Immutable.
 *
 * @param header  the columns
 * @param lines   the rows with what stands around them in the file
 * @param dialect how the file is written
 * @param head    everything up to and including the header line
 * @param tail    comment and blank lines after the last row
 */
public record RouteSheet(SheetHeader header, List<Line> lines, Dialect dialect, String head, String tail) {

    /**
     * A row as it stands in the file.
     *
     * @param row  its cells
     * @param lead comment and blank lines before it
     * @param text the row with its line end
     */
    record Line(SheetRow row, String lead, String text) {}

    public RouteSheet {
        lines = List.copyOf(lines);
    }

    /** A sheet of the usual columns without rows. */
    public static RouteSheet empty() {
        SheetHeader header = new SheetHeader(SheetColumn.headers());
        return new RouteSheet(header, List.of(), Dialect.USUAL, Dialect.USUAL.record(header.names()), "");
    }

    /**
     * Reads a file.
     *
     * @throws SheetException where it is not UTF-8 or has no usable header
     */
    public static RouteSheet read(Path file) throws IOException, SheetException {
        try {
            return parse(StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(Files.readAllBytes(file))).toString());
        } catch (CharacterCodingException e) {
            throw new SheetException(file + " is not UTF-8 text; save it as CSV UTF-8");
        }
    }

    /**
     * Reads a text.
     *
     * @throws SheetException where it has no usable header
     */
    public static RouteSheet parse(String text) throws SheetException {
        try {
            SheetReader reader = new SheetReader(new StringReader(text));
            List<Line> lines = new ArrayList<>();
            RawRecord raw = reader.nextRaw();
            for (; !raw.text().isEmpty(); raw = reader.nextRaw()) {
                lines.add(new Line(reader.row(raw), raw.lead(), raw.text()));
            }
            RawRecord head = reader.headerRecord();
            return new RouteSheet(reader.header(), lines, reader.dialect(), head.lead() + head.text(), raw.lead());
        } catch (IOException e) {
            throw new IllegalStateException("reading from memory failed", e);
        }
    }

    /** The rows, in the order of the file. */
    public List<SheetRow> rows() {
        return lines.stream().map(Line::row).toList();
    }

    /** The sheet with one cell changed; a column the sheet lacks is added at the end. Rows count from 0. */
    public RouteSheet withCell(int row, String column, String text) {
        RouteSheet wide = header.indexOf(column) >= 0 ? this : withColumn(column);
        List<String> cells = new ArrayList<>(wide.lines.get(row).row().cells());
        cells.set(wide.header.indexOf(column), text);
        List<Line> changed = new ArrayList<>(wide.lines);
        changed.set(row, wide.line(wide.lines.get(row), cells));
        return new RouteSheet(wide.header, changed, dialect, wide.head, tail);
    }

    /** The sheet with one more row at the end, cells in the order of the header. */
    public RouteSheet withRow(List<String> cells) {
        List<Line> more = new ArrayList<>(lines);
        String whole = text();
        String lead = whole.endsWith("\n") || whole.endsWith("\r") ? tail : tail + dialect.lineEnd();
        int number = lines.size() + 1;
        more.add(new Line(new SheetRow(header, number, 0, cells, ""), lead, dialect.record(cells)));
        return new RouteSheet(header, more, dialect, head, "");
    }

    /** The sheet without one row. Rows count from 0. */
    public RouteSheet withoutRow(int row) {
        List<Line> fewer = new ArrayList<>(lines);
        fewer.remove(row);
        return new RouteSheet(header, fewer, dialect, head, tail);
    }

    /**
     * The sheet with its rows in another order, each with the comment lines before it; rows are numbered anew.
     *
     * @param order index of the present row at every place; rows left out are dropped
     */
    public RouteSheet withOrder(List<Integer> order) {
        List<Line> sorted = new ArrayList<>();
        for (int from : order) {
            Line line = lines.get(from);
            SheetRow row = line.row();
            String text = line.text().endsWith("\n") || line.text().endsWith("\r") ? line.text() : line.text() + dialect.lineEnd();
            sorted.add(new Line(new SheetRow(header, sorted.size() + 1, row.line(), row.cells(), row.problem()), line.lead(), text));
        }
        return new RouteSheet(header, sorted, dialect, head, tail);
    }

    private RouteSheet withColumn(String column) {
        List<String> names = new ArrayList<>(header.names());
        names.add(column);
        RouteSheet wide = new RouteSheet(new SheetHeader(names), List.of(), dialect, "", tail);
        List<Line> widened = lines.stream().map(line -> wide.line(line, line.row().cells())).toList();
        int headerAt = head.length() - lastRecordLength();
        return new RouteSheet(wide.header, widened, dialect, head.substring(0, headerAt) + dialect.record(names), tail);
    }

    /** The header record is the last of the head: its length, line end included. */
    private int lastRecordLength() {
        String bare = head.stripTrailing();
        int quotes = 0;
        for (int at = bare.length() - 1; at >= 0; at--) {
            quotes += bare.charAt(at) == '"' ? 1 : 0;
            boolean lineEnd = bare.charAt(at) == '\n' || bare.charAt(at) == '\r';
            if (lineEnd && quotes % 2 == 0) {
                return head.length() - at - 1;
            }
        }
        return head.length();
    }

    private Line line(Line before, List<String> cells) {
        SheetRow row = before.row();
        List<String> padded = new SheetRow(header, row.number(), row.line(), cells, "").cells();
        return new Line(new SheetRow(header, row.number(), row.line(), padded, ""), before.lead(), dialect.record(padded));
    }

    /** The whole file as it would be saved. */
    public String text() {
        StringBuilder text = new StringBuilder(head);
        lines.forEach(line -> text.append(line.lead()).append(line.text()));
        return text.append(tail).toString();
    }

    /**
     * Whether somebody else has written a file since.
     *
     * @param known its text as it was read or saved last
     * @return false also where the file is gone, for then nothing is lost
     */
    public static boolean changedSince(Path file, String known) throws IOException {
        return Files.exists(file) && !Arrays.equals(Files.readAllBytes(file), known.getBytes(StandardCharsets.UTF_8));
    }

    /** Saves; the file is either as it was before or completely the new one, whatever happens meanwhile. */
    public void save(Path file) throws IOException {
        AtomicFile.write(file, text().getBytes(StandardCharsets.UTF_8));
    }
}
