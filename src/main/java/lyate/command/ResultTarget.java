package lyate.command;

import java.io.BufferedWriter;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.RandomAccessFile;
import java.io.Writer;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import lyate.sheet.AtomicFile;

/**
 * Where results go: standard output, or a file that appears under its name only when it is complete. Until then it grows
 * beside it, row by row, so that a run that is stopped or killed loses no finished row.
 */
abstract class ResultTarget implements AutoCloseable {

    /** Where results are written. */
    abstract Writer writer();

    /** Hands what is written so far to the system, so that it outlives the program. */
    abstract void flush() throws IOException;

    /** The results are complete. */
    abstract void keep() throws IOException;

    @Override
    public abstract void close() throws IOException;

    static ResultTarget standardOutput(Terminal terminal) {
        return new Output(terminal);
    }

    /**
     * A file whose part stays where the run does not come to its end.
     *
     * @param part what it is called until it is complete
     * @param from length of the part that is kept, bytes
     */
    static ResultTarget growing(Path file, Path part, long from) throws IOException {
        return new Growing(file, part, from, true);
    }

    /** A file of which a part is worth nothing. */
    static ResultTarget whole(Path file) throws IOException {
        return new Growing(file, file.resolveSibling(file.getFileName() + ".part"), 0, false);
    }

    private static final class Output extends ResultTarget {
        private final Terminal terminal;

        Output(Terminal terminal) {
            this.terminal = terminal;
        }

        @Override
        Writer writer() {
            return terminal.outWriter();
        }

        @Override
        void flush() throws IOException {
            terminal.flushResults();
        }

        @Override
        void keep() throws IOException {
            terminal.flushResults();
        }

        @Override
        public void close() {
            terminal.flush();
        }
    }

    private static final class Growing extends ResultTarget {
        private final Path file;
        private final Path part;
        private final RandomAccessFile bytes;
        private final Writer writer;
        private final boolean partStays;
        private boolean flushed;

        Growing(Path file, Path part, long from, boolean partStays) throws IOException {
            this.file = file;
            this.part = part;
            this.partStays = partStays;
            this.flushed = from > 0;
            this.bytes = new RandomAccessFile(part.toFile(), "rw");
            try {
                lock();
                bytes.setLength(from);
                bytes.seek(from);
            } catch (IOException e) {
                bytes.close();
                throw e;
            }
            this.writer = new BufferedWriter(new OutputStreamWriter(new FileOutputStream(bytes.getFD()), StandardCharsets.UTF_8));
        }

        /** The lock ends with the program. */
        private void lock() throws IOException {
            try {
                FileLock lock = bytes.getChannel().tryLock();
                if (lock == null) {
                    throw new IOException("another run is writing " + part);
                }
            } catch (OverlappingFileLockException e) {
                throw new IOException("another run is writing " + part, e);
            }
        }

        @Override
        Writer writer() {
            return writer;
        }

        @Override
        void flush() throws IOException {
            writer.flush();
            flushed = true;
        }

        @Override
        void keep() throws IOException {
            writer.flush();
            bytes.getFD().sync();
            AtomicFile.takePlace(part, file);
        }

        @Override
        public void close() throws IOException {
            try (RandomAccessFile closing = bytes) {
                writer.flush();
            } finally {
                if (!partStays || !flushed) {
                    Files.deleteIfExists(part);
                }
            }
        }
    }
}
