package lyate.review;

import lyate.table.Row;
import lyate.table.Schema;

/**
 * Where a rule stands.
 *
 * @param file file name, a path for a table of the user's own
 * @param line 1-based line
 * @param own  whether it is not a packaged row
 */
record RulePlace(String file, int line, boolean own) {

    static RulePlace of(Row row, Schema schema) {
        return new RulePlace(row.file(), row.line(), !row.file().equals(schema.fileName()));
    }

    @Override
    public String toString() {
        return file + ":" + line;
    }
}
