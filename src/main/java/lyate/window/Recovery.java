package lyate.window;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.LongPredicate;
import javax.swing.Timer;
import lyate.sheet.AtomicFile;
import lyate.sheet.RouteSheet;
import lyate.sheet.SheetException;

/**
 * Keeps a copy of unsaved changes, one file per running program, so that a crash costs at most a few seconds of work. The
 * name of the file holds the number of the process; a copy whose process is gone was left behind by a crash.
 */
final class Recovery implements AutoCloseable {

    private static final int DELAY_MILLIS = 2000;
    private static final String PREFIX = "unsaved-";
    private static final String SUFFIX = ".csv";

    private final Path folder;
    private final SheetDocument document;
    private final Timer timer = new Timer(DELAY_MILLIS, event -> write());

    Recovery(Path folder, SheetDocument document) {
        this.folder = folder;
        this.document = document;
        timer.setRepeats(false);
        document.onChange(timer::restart);
    }

    private Path file() {
        return folder.resolve(PREFIX + ProcessHandle.current().pid() + SUFFIX);
    }

    /** Writes the copy, or removes it where nothing is unsaved; trouble with the disk must not disturb the work. */
    void write() {
        try {
            if (document.isModified()) {
                Files.createDirectories(folder);
                AtomicFile.write(file(), document.state().sheet().text().getBytes(StandardCharsets.UTF_8));
            } else {
                Files.deleteIfExists(file());
            }
        } catch (IOException e) {
            timer.setInitialDelay(10 * DELAY_MILLIS);
        }
    }

    /** The sheets crashed programs left behind; files that cannot be read are left alone. */
    static List<Path> leftBehind(Path folder, LongPredicate isRunning) {
        List<Path> found = new ArrayList<>();
        if (!Files.isDirectory(folder)) {
            return found;
        }
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, PREFIX + "*" + SUFFIX)) {
            for (Path file : files) {
                String name = file.getFileName().toString();
                String number = name.substring(PREFIX.length(), name.length() - SUFFIX.length());
                if (number.matches("\\d{1,10}") && !isRunning.test(Long.parseLong(number))) {
                    found.add(file);
                }
            }
        } catch (IOException e) {
            return List.of();
        }
        return found;
    }

    /** Whether a process of that number runs. */
    static boolean isRunning(long number) {
        return ProcessHandle.of(number).map(ProcessHandle::isAlive).orElse(false);
    }

    /** Reads a copy and takes it out of the folder. */
    static Optional<RouteSheet> take(Path file) {
        try {
            RouteSheet sheet = RouteSheet.read(file);
            Files.delete(file);
            return sheet.rows().isEmpty() ? Optional.empty() : Optional.of(sheet);
        } catch (IOException | SheetException e) {
            return Optional.empty();
        }
    }

    /** The program ends in an orderly way: no copy is needed any more. */
    @Override
    public void close() {
        timer.stop();
        try {
            Files.deleteIfExists(file());
        } catch (IOException e) {
            // A copy that stays is offered next time; nothing is lost.
            timer.stop();
        }
    }
}
