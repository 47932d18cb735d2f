package lyate.command;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HexFormat;
import java.util.List;
import lyate.table.TableFolders;
import lyate.table.TableListing;

/**
 * What a result is called until it is complete: its name, a digest of program and tables, and {@code .part}. A run of
 * another program or with other tables never takes it for its own.
 *
 * @param result the name it is to have
 * @param part   the name it has until then
 */
record UnfinishedResult(Path result, Path part) {

    private static final String END = ".part";
    private static final int DIGEST_BYTES = 4;

    static UnfinishedResult of(Path result, String program, TableFolders folders) {
        StringBuilder madeWith = new StringBuilder(program);
        TableListing.of(folders).forEach(copy -> madeWith.append('\n').append(copy.fileName()).append(' ').append(copy.digest()));
        try {
            byte[] hash = MessageDigest.getInstance("SHA-256").digest(madeWith.toString().getBytes(StandardCharsets.UTF_8));
            String digest = HexFormat.of().formatHex(hash, 0, DIGEST_BYTES);
            return new UnfinishedResult(result, result.resolveSibling(result.getFileName() + "." + digest + END));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }

    /** Whether an earlier run of this program with these tables has left something. */
    boolean isThere() throws IOException {
        return Files.exists(part) && Files.size(part) > 0;
    }

    /** Everything earlier runs have left of a result of this name, whatever they were made with, empty files apart. */
    List<Path> all() throws IOException {
        Path folder = part.toAbsolutePath().getParent();
        String name = result.getFileName().toString();
        List<Path> found = new ArrayList<>();
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, file -> file.getFileName().toString().startsWith(name + "."))) {
            for (Path file : files) {
                String rest = file.getFileName().toString().substring(name.length());
                if (Files.size(file) > 0 && rest.matches("\\.[0-9a-f]{" + 2 * DIGEST_BYTES + "}\\" + END)) {
                    found.add(result.resolveSibling(file.getFileName()));
                }
            }
        }
        Collections.sort(found);
        return found;
    }
}
