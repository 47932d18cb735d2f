package lyate.command;

import java.io.IOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Optional;

/**
 * Where results go: standard output, or a file that appears under its name only when it is complete. Until then it
 * grows as {@code NAME.part}, so that an interrupted run loses no finished row.
 */
final class ResultTarget implements AutoCloseable {

    private final Optional<Path> file;
    private final Path part;
    private final Writer writer;
    private final Terminal terminal;

    ResultTarget(Optional<Path> file, Terminal terminal) throws IOException {
        this.file = file;
        this.terminal = terminal;
        this.part = file.map(path -> path.resolveSibling(path.getFileName() + ".part")).orElse(null);
        this.writer = part == null ? terminal.outWriter() : Files.newBufferedWriter(part, StandardCharsets.UTF_8);
    }

    Writer writer() {
        return writer;
    }

    /** The results are complete. */
    void keep() throws IOException {
        if (file.isPresent()) {
            writer.close();
            Files.move(part, file.get(), StandardCopyOption.REPLACE_EXISTING);
        }
    }

    @Override
    public void close() throws IOException {
        if (file.isPresent()) {
            writer.close();
        } else {
            terminal.flush();
        }
    }
}
