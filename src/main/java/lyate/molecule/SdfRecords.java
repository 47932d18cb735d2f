package lyate.molecule;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.util.Optional;
import java.util.Spliterator;
import java.util.Spliterators.AbstractSpliterator;
import java.util.function.Consumer;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;

/** Cuts an SD file into records, one at a time. */
final class SdfRecords extends AbstractSpliterator<SdfRecord> {

    private static final int LONGEST_RECORD = 2_000_000;

    private final BufferedReader lines;
    private final MoleculeReader reader;
    private int number;

    private SdfRecords(Reader sdf, MoleculeReader reader) {
        super(Long.MAX_VALUE, Spliterator.ORDERED | Spliterator.NONNULL);
        this.lines = new BufferedReader(sdf);
        this.reader = reader;
    }

    static Stream<SdfRecord> stream(Reader sdf, MoleculeReader reader) {
        return StreamSupport.stream(new SdfRecords(sdf, reader), false);
    }

    @Override
    public boolean tryAdvance(Consumer<? super SdfRecord> action) {
        StringBuilder record = new StringBuilder();
        boolean tooLong = false;
        String line = next();
        while (line != null && !line.startsWith("$$$$")) {
            tooLong |= record.length() + line.length() > LONGEST_RECORD;
            if (!tooLong) {
                record.append(line).append('\n');
            }
            line = next();
        }
        boolean closed = line != null;
        if (!closed && record.toString().isBlank()) {
            return false;
        }
        action.accept(read(record.toString(), tooLong));
        return true;
    }

    private SdfRecord read(String record, boolean tooLong) {
        number++;
        String name = record.lines().findFirst().orElse("").strip();
        if (tooLong) {
            return new SdfRecord(number, name, Optional.empty(), "the record has more than " + LONGEST_RECORD + " characters");
        }
        try {
            return new SdfRecord(number, name, Optional.of(reader.readMolfile(record)), "");
        } catch (MoleculeException e) {
            return new SdfRecord(number, name, Optional.empty(), e.getMessage());
        }
    }

    private String next() {
        try {
            return lines.readLine();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
