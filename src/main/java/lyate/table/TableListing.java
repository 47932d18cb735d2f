package lyate.table;

import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;

/** Which tables there are, and in which copies. */
public final class TableListing {

    /** A table that is certain to be packaged; its place is the place of the others. */
    private static final String SIGNPOST = "/reagent-tables/site-classes.csv";

    private TableListing() {}

    /**
     * One copy of a table.
     *
     * @param fileName name within its folder
     * @param origin   {@code packaged}, or the file it was read from
     * @param version  what its {@code # version:} line states; empty where there is none
     * @param rows     rows below the header
     * @param summary  its first comment line
     * @param digest   first 12 hexadecimal digits of the SHA-256 of its text: two tables of one digest are the same
     */
    public record Copy(String fileName, String origin, String version, int rows, String summary, String digest) {}

    /** Every copy of every table, by name, packaged ones first. */
    public static List<Copy> of(TableFolders folders) {
        List<Copy> copies = new ArrayList<>();
        for (String name : names(folders)) {
            for (TableFolders.Source source : folders.sourcesOf(name)) {
                copies.add(copy(name, source));
            }
        }
        return copies;
    }

    /** Names of the packaged tables. */
    public static SortedSet<String> packagedNames() {
        try {
            URI place = TableListing.class.getResource(SIGNPOST).toURI();
            if (!place.getScheme().equals("jar")) {
                return csvFiles(Path.of(place).getParent());
            }
            try (FileSystem jar = FileSystems.newFileSystem(place, Map.of())) {
                return csvFiles(jar.getPath(SIGNPOST).getParent());
            }
        } catch (URISyntaxException | IOException e) {
            throw new IllegalStateException("the packaged tables cannot be listed", e);
        }
    }

    private static SortedSet<String> names(TableFolders folders) {
        SortedSet<String> names = packagedNames();
        folders.own().forEach(folder -> names.addAll(csvFiles(folder)));
        return names;
    }

    /** Names of the CSV files in a folder. */
    public static SortedSet<String> csvFiles(Path folder) {
        try (Stream<Path> files = Files.list(folder)) {
            SortedSet<String> names = new TreeSet<>();
            files.map(file -> file.getFileName().toString()).filter(name -> name.endsWith(".csv")).forEach(names::add);
            return names;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Copy copy(String name, TableFolders.Source source) {
        List<String> head = source.text().lines().takeWhile(line -> line.startsWith("#")).map(line -> line.substring(1).strip()).toList();
        String version = head.stream().filter(line -> line.startsWith("version:")).map(line -> line.substring(8).strip())
                .findFirst().orElse("");
        String origin = source.name().equals(name) ? "packaged" : source.name();
        return new Copy(name, origin, version, rows(source.text()), head.stream().findFirst().orElse(""), digest(source.text()));
    }

    private static String digest(String text) {
        try {
            byte[] hash = MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(hash, 0, 6);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }

    private static int rows(String text) {
        CSVFormat format = CSVFormat.RFC4180.builder().setCommentMarker('#').setIgnoreEmptyLines(true).get();
        try (CSVParser parser = CSVParser.builder().setReader(new StringReader(text)).setFormat(format).get()) {
            return Math.max(0, parser.getRecords().size() - 1);
        } catch (IOException | UncheckedIOException e) {
            return 0;
        }
    }
}
