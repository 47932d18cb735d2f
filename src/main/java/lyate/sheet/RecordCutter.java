package lyate.sheet;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.util.ArrayDeque;
import java.util.Deque;

/**
 * Cuts a sheet into records, one at a time. A record goes on while a quote is open; one that stays open too long is cut
 * after its first line, so that a forgotten quote costs one row and not the rest of the sheet.
 */
final class RecordCutter {

    private static final String BYTE_ORDER_MARK = "\uFEFF";
    private static final int LONGEST_RECORD = 200_000;
    private static final int MOST_LINES = 2_000;

    private final BufferedReader source;
    private final Deque<String> waiting = new ArrayDeque<>();
    private int line = 1;

    RecordCutter(Reader source) {
        this.source = new BufferedReader(source);
    }

    /** The next record; its text is empty at the end of the file. */
    RawRecord next() throws IOException {
        StringBuilder lead = new StringBuilder();
        String text = nextLine();
        if (line == 1 && text.startsWith(BYTE_ORDER_MARK)) {
            lead.append(BYTE_ORDER_MARK);
            text = text.substring(1);
        }
        while (!text.isEmpty() && (text.isBlank() || text.startsWith("#"))) {
            lead.append(text);
            line++;
            text = nextLine();
        }
        int first = line;
        String record = open(text) ? completed(text) : text;
        line += (int) Math.max(0, record.lines().count());
        return new RawRecord(first, lead.toString(), record);
    }

    /** The record with the lines that close its quote, or its first line alone where they do not come. */
    private String completed(String firstLine) throws IOException {
        Deque<String> more = new ArrayDeque<>();
        StringBuilder record = new StringBuilder(firstLine);
        boolean open = true;
        while (open && record.length() < LONGEST_RECORD && more.size() < MOST_LINES) {
            String text = nextLine();
            if (text.isEmpty()) {
                break;
            }
            more.addLast(text);
            record.append(text);
            open ^= open(text);
        }
        if (!open) {
            return record.toString();
        }
        while (!more.isEmpty()) {
            waiting.addFirst(more.removeLast());
        }
        return firstLine;
    }

    private static boolean open(String text) {
        return text.chars().filter(letter -> letter == '"').count() % 2 == 1;
    }

    /** The next line with its line end; empty at the end of the file. */
    private String nextLine() throws IOException {
        if (!waiting.isEmpty()) {
            return waiting.removeFirst();
        }
        StringBuilder text = new StringBuilder();
        for (int letter = source.read(); letter >= 0; letter = source.read()) {
            if (text.length() < LONGEST_RECORD) {
                text.append((char) letter);
            }
            if (letter == '\n' || letter == '\r' && !lineFeedFollows()) {
                break;
            }
        }
        return text.toString();
    }

    private boolean lineFeedFollows() throws IOException {
        source.mark(1);
        boolean follows = source.read() == '\n';
        source.reset();
        return follows;
    }
}
