package lyate.molecule;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Spliterator;
import java.util.Spliterators.AbstractSpliterator;
import java.util.function.Consumer;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;

/** Reads RXN files (one reaction) and RD files (many, with data), V2000 and V3000, reaction by reaction. */
public final class ReactionFile {

    private static final int MOST_LINES = 200_000;

    private ReactionFile() {}

    /** Whether a text is an RXN or RD file. */
    public static boolean looksLike(String text) {
        return RxnText.looksLike(text) || text.stripLeading().startsWith("$RDFILE");
    }

    /**
     * The reactions as the stream is drawn; one that cannot be read says why.
     *
     * @param file closed by the caller
     */
    public static Stream<ReactionRecord> records(Reader file) {
        return StreamSupport.stream(new Records(new BufferedReader(file)), false);
    }

    /**
     * The first reaction as reaction SMILES.
     *
     * @throws MoleculeException where there is none, or it cannot be read
     */
    public static String firstSmiles(String text) throws MoleculeException {
        Optional<ReactionRecord> first = records(new StringReader(text)).findFirst();
        if (first.isEmpty() || !first.get().problem().isEmpty()) {
            throw new MoleculeException(first.map(ReactionRecord::problem).orElse("there is no reaction in it"));
        }
        return first.get().smiles();
    }

    /** Cuts the file at the lines that begin a reaction. */
    private static final class Records extends AbstractSpliterator<ReactionRecord> {

        private final BufferedReader file;
        private String ahead;
        private int lineNumber;
        private int number;

        Records(BufferedReader file) {
            super(Long.MAX_VALUE, Spliterator.ORDERED | Spliterator.NONNULL);
            this.file = file;
        }

        @Override
        public boolean tryAdvance(Consumer<? super ReactionRecord> action) {
            while (number == 0 && (ahead == null || !beginsRecord(ahead))) {
                advance();
                if (ahead == null) {
                    return false;
                }
            }
            if (ahead == null) {
                return false;
            }
            int first = lineNumber;
            List<String> lines = new ArrayList<>();
            boolean rxnSeen = false;
            do {
                if (lines.size() < MOST_LINES) {
                    lines.add(ahead);
                }
                rxnSeen |= ahead.startsWith("$RXN");
                advance();
            } while (ahead != null && !(ahead.startsWith("$RFMT") || ahead.startsWith("$MFMT") || ahead.startsWith("$RXN") && rxnSeen));
            number++;
            action.accept(record(lines, first));
            return true;
        }

        private static boolean beginsRecord(String line) {
            return line.startsWith("$RXN") || line.startsWith("$RFMT") || line.startsWith("$MFMT");
        }

        private void advance() {
            try {
                ahead = file.readLine();
                lineNumber++;
                if (lineNumber == 1 && ahead != null && ahead.startsWith("\uFEFF")) {
                    ahead = ahead.substring(1);
                }
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }

        private ReactionRecord record(List<String> lines, int first) {
            int rxn = indexOf(lines, "$RXN", 0);
            int end = Math.min(indexOf(lines, "$DTYPE", 0), indexOf(lines, "$DATUM", 0));
            Map<String, String> data = new LinkedHashMap<>();
            String name = "";
            try {
                readData(lines, end, first, data);
                if (lines.size() == MOST_LINES) {
                    throw new MoleculeException("the record has " + MOST_LINES + " lines or more");
                }
                if (rxn > end || rxn == lines.size()) {
                    throw new MoleculeException("line " + first + ": the record holds no reaction: there is no line '$RXN'");
                }
                RxnText reaction = new RxnText(lines.subList(rxn, end), first + rxn);
                name = reaction.name();
                return new ReactionRecord(number, first, name, reaction.smiles(), data, "");
            } catch (MoleculeException e) {
                return new ReactionRecord(number, first, name, "", data, e.getMessage());
            }
        }

        private static void readData(List<String> lines, int from, int first, Map<String, String> data) throws MoleculeException {
            String name = null;
            StringBuilder value = new StringBuilder();
            for (int at = from; at < lines.size(); at++) {
                String line = lines.get(at);
                if (line.startsWith("$DTYPE")) {
                    put(data, name, value);
                    name = line.substring("$DTYPE".length()).strip();
                } else if (line.startsWith("$DATUM")) {
                    if (name == null) {
                        throw new MoleculeException("line " + (first + at) + ": '$DATUM' without '$DTYPE' before it");
                    }
                    value.setLength(0);
                    value.append(line.substring("$DATUM".length()).strip());
                } else {
                    value.append(value.length() == 0 || line.isBlank() ? "" : "\n").append(line.strip());
                }
            }
            put(data, name, value);
        }

        private static void put(Map<String, String> data, String name, StringBuilder value) {
            if (name != null) {
                data.put(name, value.toString());
            }
            value.setLength(0);
        }

        private static int indexOf(List<String> lines, String mark, int from) {
            for (int at = from; at < lines.size(); at++) {
                if (lines.get(at).startsWith(mark)) {
                    return at;
                }
            }
            return lines.size();
        }
    }
}
