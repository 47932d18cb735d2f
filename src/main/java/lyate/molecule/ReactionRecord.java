package lyate.molecule;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * One reaction of an RXN or RD file.
 *
 * @param number 1-based place in the file
 * @param line   1-based line of the file on which it begins
 * @param name   as the file gives it; may be empty
 * @param smiles reaction SMILES with the file's atom map; empty where it could not be read
 * @param data   its data items by their names, in the order of the file
 * @param problem in words why it could not be read; else empty
 */
public record ReactionRecord(int number, int line, String name, String smiles, Map<String, String> data, String problem) {

    public ReactionRecord {
        data = Collections.unmodifiableMap(new LinkedHashMap<>(data));
    }
}
