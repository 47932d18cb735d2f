package lyate.command;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import lyate.molecule.MoleculeReader;
import lyate.sheet.Conditions;
import lyate.sheet.ReactionList;
import lyate.sheet.RowSource;
import lyate.sheet.SheetException;
import lyate.sheet.SheetReader;
import lyate.sheet.SubstrateList;

/** The rows of a file or of standard input, and how much of them is read. */
final class RowInput implements AutoCloseable {

    /** What a file holds, by the end of its name. */
    enum Kind {
        SHEET, SMILES, SDF, REACTIONS;

        static Kind of(String name) {
            String lower = name.toLowerCase(Locale.ROOT);
            boolean reactions = lower.endsWith(".rxn") || lower.endsWith(".rdf");
            return reactions ? REACTIONS : lower.endsWith(".smi") ? SMILES : lower.endsWith(".sdf") ? SDF : SHEET;
        }
    }

    private final Counted bytes;
    private final long length;
    private final RowSource rows;

    /**
     * Reads up to the first row.
     *
     * @param name       a file, or {@code -} for standard input
     * @param conditions what substrates that are no sheet are set against
     * @throws SheetException where there is no usable header
     */
    RowInput(String name, Conditions conditions, MoleculeReader molecules, Terminal terminal) throws IOException, SheetException {
        boolean file = !name.equals("-");
        this.length = file ? Files.size(Path.of(name)) : 0;
        this.bytes = new Counted(file ? Files.newInputStream(Path.of(name)) : terminal.in());
        Reader text = Terminal.reader(bytes);
        try {
            this.rows = switch (Kind.of(name)) {
                case SHEET -> new SheetReader(text);
                case SMILES -> SubstrateList.ofSmiles(text, conditions);
                case SDF -> SubstrateList.ofSdf(text, molecules, conditions);
                case REACTIONS -> new ReactionList(text, conditions);
            };
        } catch (IOException | SheetException | RuntimeException e) {
            bytes.close();
            throw e;
        }
    }

    RowSource rows() {
        return rows;
    }

    /** Share of the bytes that is read, 0 to 1; 0 also where nobody knows how many there are. */
    double share() {
        return length == 0 ? 0 : Math.min(1.0, (double) bytes.count / length);
    }

    @Override
    public void close() throws IOException {
        bytes.close();
    }

    /** Counts what passes. */
    private static final class Counted extends FilterInputStream {
        private long count;

        Counted(InputStream stream) {
            super(stream);
        }

        @Override
        public int read() throws IOException {
            int letter = super.read();
            count += letter < 0 ? 0 : 1;
            return letter;
        }

        @Override
        public int read(byte[] some, int from, int most) throws IOException {
            int read = super.read(some, from, most);
            count += Math.max(0, read);
            return read;
        }
    }
}
