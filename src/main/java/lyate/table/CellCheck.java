package lyate.table;

/** Says what a cell should hold where it does not. */
final class CellCheck {

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
        return cell.matches("[-+]?(\\d+\\.?\\d*|\\.\\d+)([eE][-+]?\\d+)?") && Double.isFinite(Double.parseDouble(cell));
    }
}
