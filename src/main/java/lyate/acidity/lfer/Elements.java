package lyate.acidity.lfer;

/** Symbols of the elements that substituent tables name. */
final class Elements {

    private Elements() {}

    /** The symbol, or {@code *} for an element without constants of its own. */
    static String symbol(int atomicNumber) {
        return switch (atomicNumber) {
            case 5 -> "B";
            case 6 -> "C";
            case 7 -> "N";
            case 8 -> "O";
            case 9 -> "F";
            case 14 -> "Si";
            case 15 -> "P";
            case 16 -> "S";
            case 17 -> "Cl";
            case 34 -> "Se";
            case 35 -> "Br";
            case 53 -> "I";
            default -> "*";
        };
    }
}
