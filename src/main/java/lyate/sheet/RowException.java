package lyate.sheet;

import java.util.List;
import java.util.stream.Collectors;

/**
 * A row cannot be turned into a step; the message names every column at fault, what was found and what was expected, in one
 * line.
 */
public final class RowException extends Exception {

    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;

    /**
     * One thing wrong with a row.
     *
     * @param column header of the column; empty where the whole row is meant
     * @param reason what was found and what was expected, in words
     */
    public record Problem(String column, String reason) {

        Problem(SheetColumn column, String reason) {
            this(column.header(), reason);
        }

        /** In one line: a quoted text with a caret under it becomes the place in that text. */
        @Override
        public String toString() {
            return column.isEmpty() ? inOneLine() : "column " + column + ": " + inOneLine();
        }

        private String inOneLine() {
            List<String> lines = reason.lines().toList();
            int caret = lines.size() - 1;
            if (caret < 2 || !lines.get(caret).strip().equals("^")) {
                return String.join(" ", lines);
            }
            String said = String.join(" ", lines.subList(0, caret - 1));
            return said + ", at character " + (lines.get(caret).indexOf('^') + 1) + " of '" + lines.get(caret - 1) + "'";
        }
    }

    public RowException(List<Problem> problems) {
        super(problems.stream().map(Problem::toString).collect(Collectors.joining("; ")));
        this.problems = List.copyOf(problems);
    }

    /** Every problem, in the order of the columns. */
    public List<Problem> problems() {
        return problems;
    }
}
