package lyate.report;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.NoSuchElementException;
import lyate.sheet.RowSource;
import lyate.sheet.SheetRow;

/**
 * The rows that a run which was stopped or killed has left in its unfinished result.
 *
 * @param rows    how many are whole
 * @param refused how many of them could not be judged
 * @param bytes   length of the file up to the end of the last whole one
 */
public record FinishedRows(int rows, int refused, long bytes) {

    /**
     * Reads an unfinished result and sets it against the rows it should hold; draws those that it does hold.
     *
     * @throws IOException also where it belongs to another sheet, or to one that was changed since
     */
    public static FinishedRows read(Path part, RowSource rows) throws IOException {
        SheetCsv format = new SheetCsv(new StringBuilder(), rows.header());
        try (Reader text = new BufferedReader(new InputStreamReader(Files.newInputStream(part), StandardCharsets.UTF_8))) {
            String header = line(text);
            if (header.isEmpty()) {
                return new FinishedRows(0, 0, 0);
            }
            if (!header.equals(format.headerText() + "\n")) {
                throw new IOException(part + " cannot be continued: it has other columns than the sheet; delete it to start again");
            }
            FinishedRows finished = new FinishedRows(0, 0, length(header));
            for (String line = line(text); !line.isEmpty(); line = line(text)) {
                finished = finished.with(line, format.textOf(next(rows, part, finished)), part);
            }
            return finished;
        }
    }

    private static SheetRow next(RowSource rows, Path part, FinishedRows finished) throws IOException {
        try {
            return rows.next();
        } catch (NoSuchElementException e) {
            throw new IOException(part + " cannot be continued: it has more rows than the sheet, which has " + finished.rows()
                    + "; delete it to start again", e);
        }
    }

    private FinishedRows with(String line, String given, Path part) throws IOException {
        if (!line.startsWith(given)) {
            throw new IOException(part + " cannot be continued: its row " + (rows + 1)
                    + " is not that of the sheet, which was changed since; delete it to start again");
        }
        boolean judged = line.charAt(given.length()) != ',';
        return new FinishedRows(rows + 1, refused + (judged ? 0 : 1), bytes + length(line));
    }

    private static long length(String line) {
        return line.getBytes(StandardCharsets.UTF_8).length;
    }

    /** The next record with its line end; empty at the end of the file and for a record that was cut off. */
    private static String line(Reader text) throws IOException {
        StringBuilder line = new StringBuilder();
        boolean quoted = false;
        for (int letter = text.read(); letter >= 0; letter = text.read()) {
            line.append((char) letter);
            quoted ^= letter == '"';
            if (letter == '\n' && !quoted) {
                return line.toString();
            }
        }
        return "";
    }
}
