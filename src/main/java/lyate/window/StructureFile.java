package lyate.window;

import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import lyate.molecule.ReactionFile;
import lyate.molecule.ReactionRecord;

/** Takes the structures out of a file that was dropped on the window: .mol, .sdf, .rxn, .rdf, .smi, or any text that holds such. */
final class StructureFile {

    private static final long MOST_BYTES = 5_000_000;
    private static final int MOST_STRUCTURES = 500;

    private StructureFile() {}

    /**
     * The structures as texts that a substrate field understands, in the order of the file.
     *
     * @throws IOException in words where the file cannot be read, is too large or holds none
     */
    static List<String> read(Path file) throws IOException {
        String name = file.getFileName().toString();
        if (Files.size(file) > MOST_BYTES) {
            throw new IOException(name + " has " + Files.size(file) + " bytes; at most " + MOST_BYTES + " are read from a dropped file");
        }
        List<String> structures = split(text(file), name.toLowerCase(Locale.ROOT));
        if (structures.isEmpty()) {
            throw new IOException(name + " holds no structure");
        }
        if (structures.size() > MOST_STRUCTURES) {
            throw new IOException(name + " holds " + structures.size() + " structures; at most " + MOST_STRUCTURES + " become steps");
        }
        return structures;
    }

    private static String text(Path file) throws IOException {
        try {
            return Files.readString(file);
        } catch (CharacterCodingException e) {
            throw new IOException(file.getFileName() + " is not text in UTF-8", e);
        }
    }

    private static List<String> split(String text, String name) throws IOException {
        if (ReactionFile.looksLike(text)) {
            return reactions(text);
        }
        if (text.contains("V2000") || text.contains("V3000") || name.endsWith(".mol") || name.endsWith(".sdf")) {
            return records(text);
        }
        List<String> structures = new ArrayList<>();
        for (String line : text.lines().map(String::strip).filter(line -> !line.isEmpty() && !line.startsWith("#")).toList()) {
            // A name may follow the SMILES.
            structures.add(name.endsWith(".smi") || name.endsWith(".smiles") ? line.split("\\s", 2)[0] : line);
        }
        return structures;
    }

    /** Reactions as reaction SMILES, which a field of one line shows. */
    private static List<String> reactions(String text) throws IOException {
        List<String> reactions = new ArrayList<>();
        for (ReactionRecord entry : ReactionFile.records(new StringReader(text)).toList()) {
            if (!entry.problem().isEmpty()) {
                throw new IOException("reaction " + entry.number() + ", line " + entry.line() + ": " + entry.problem());
            }
            reactions.add(entry.smiles());
        }
        return reactions;
    }

    /** The molfiles of an SD file, without the data behind them. */
    private static List<String> records(String text) {
        List<String> records = new ArrayList<>();
        for (String record : text.split("(?m)^\\$\\$\\$\\$.*\\R?")) {
            if (!record.isBlank()) {
                String[] lines = record.split("\\R", -1);
                int end = Arrays.asList(lines).indexOf("M  END");
                records.add(String.join("\n", end < 0 ? lines : Arrays.copyOf(lines, end + 1)) + "\n");
            }
        }
        return records;
    }
}
