package lyate.table;

import java.util.regex.Pattern;

/** Says what a cell should hold where it does not. */
final class CellCheck {

    private static final Pattern NUMBER = Pattern.compile("[-+]?(\\d+\\.?\\d*|\\.\\d+)([eE][-+]?\\d+)?");

    private CellCheck() {}

    /** What was expected, or empty text where the cell is sound. */
    static String expected(Column column, String cell) {
        if (cell.isEmpty()) {
            return column.required() ? "a value" : "";
        }
        return switch (column.kind()) {
            case TEXT, LIST -> "";
            case NUMBER -> isNumber(cell) ? "" : "a number such as 10.5";
            case WORD -> column.allowed().contains(cell) ? "" : "one of " + String.join(", ", column.allowed());
        };
    }

    private static boolean isNumber(String cell) {
        return plainDecimal(cell) || NUMBER.matcher(cell).matches() && Double.isFinite(Double.parseDouble(cell));
    }

    /** What most numbers look like, told without the pattern: tables hold tens of thousands. */
    private static boolean plainDecimal(String cell) {
        int points = 0;
        int from = cell.charAt(0) == '-' ? 1 : 0;
        for (int i = from; i < cell.length(); i++) {
            char letter = cell.charAt(i);
            points += letter == '.' ? 1 : 0;
            if (letter != '.' && (letter < '0' || letter > '9')) {
                return false;
            }
        }
        return points <= 1 && cell.length() - from > points && cell.length() < 300;
    }
}
