package lyate.table;

/**
 * One thing wrong with a table, said so that the owner of the file can mend it.
 *
 * @param file     file the cell stands in
 * @param line     1-based line in that file, 0 where the whole file is meant
 * @param column   header of the column, empty where the whole row is meant
 * @param found    offending text
 * @param expected what should stand there
 * @param excerpt  the line and its neighbours with a caret under the place; empty where there is none to show
 */
public record TableProblem(String file, int line, String column, String found, String expected, String excerpt) {

    /** A problem without an excerpt. */
    public TableProblem(String file, int line, String column, String found, String expected) {
        this(file, line, column, found, expected, "");
    }

    @Override
    public String toString() {
        String place = line > 0 ? file + ":" + line : file;
        String cell = column.isEmpty() ? "" : ": column " + column;
        String message = place + cell + ": found '" + found + "', expected " + expected;
        return excerpt.isEmpty() ? message : message + "\n" + excerpt;
    }
}
