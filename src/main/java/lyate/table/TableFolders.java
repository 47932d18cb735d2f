package lyate.table;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Where tables are read from: the ones packaged with the program, then any folders of the user's own.
 * A row of a later folder replaces the row with the same {@code id}, or adds one.
 *
 * @param own the user's folders, later ones win; empty for the packaged tables alone
 */
public record TableFolders(List<Path> own) {

    private static final String PACKAGED = "/reagent-tables/";

    public TableFolders {
        own = List.copyOf(own);
    }

    /** The packaged tables alone. */
    public static TableFolders packaged() {
        return new TableFolders(List.of());
    }

    /** The packaged tables overlaid by one folder. */
    public static TableFolders overlaidBy(Path folder) {
        return new TableFolders(List.of(folder));
    }

    /** One copy of a table file: its name for messages, and its text. */
    record Source(String name, String text) {}

    /** Every copy of a table file there is, packaged first. */
    List<Source> sourcesOf(String fileName) {
        List<Source> sources = new ArrayList<>();
        packagedText(fileName).ifPresent(text -> sources.add(new Source(fileName, text)));
        for (Path folder : own) {
            Path file = folder.resolve(fileName);
            if (Files.isRegularFile(file)) {
                sources.add(new Source(file.toString(), read(file)));
            }
        }
        return sources;
    }

    private static Optional<String> packagedText(String fileName) {
        try (InputStream stream = TableFolders.class.getResourceAsStream(PACKAGED + fileName)) {
            return stream == null ? Optional.empty() : Optional.of(Utf8.decode(fileName, stream.readAllBytes()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String read(Path file) {
        try {
            return Utf8.decode(file.toString(), Files.readAllBytes(file));
        } catch (IOException e) {
            throw new TableException(List.of(new TableProblem(file.toString(), 0, "", e.getMessage(), "a readable file")));
        }
    }
}
