package lyate.table;

import java.util.List;

/**
 * One declared column of a table.
 *
 * @param name     header text, exactly as in the file
 * @param kind     what a cell may hold
 * @param required whether an empty cell is an error
 * @param allowed  for {@link Kind#WORD}: the words a cell may hold; empty for every other kind
 */
public record Column(String name, Kind kind, boolean required, List<String> allowed) {

    /** What a cell may hold. */
    public enum Kind {
        /** Free text. */
        TEXT,
        /** A finite decimal number with a point. */
        NUMBER,
        /** One word of a closed list. */
        WORD,
        /** Texts separated by {@code ;}. */
        LIST
    }

    /** A text column that must be filled. */
    public static Column text(String name) {
        return new Column(name, Kind.TEXT, true, List.of());
    }

    /** A number column that must be filled. */
    public static Column number(String name) {
        return new Column(name, Kind.NUMBER, true, List.of());
    }

    /** A column of {@code ;}-separated texts. */
    public static Column list(String name) {
        return new Column(name, Kind.LIST, false, List.of());
    }

    /** A column that holds one of the given words. */
    public static Column word(String name, String... allowed) {
        return new Column(name, Kind.WORD, true, List.of(allowed));
    }

    /** The same column, whose cells may be empty. */
    public Column optional() {
        return new Column(name, kind, false, allowed);
    }
}
