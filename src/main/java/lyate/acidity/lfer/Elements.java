package lyate.acidity.lfer;

/** Elements by the names that substituent tables use. */
final class Elements {

    private Elements() {}

    static boolean halogen(int atomicNumber) {
        return atomicNumber == 9 || atomicNumber == 17 || atomicNumber == 35 || atomicNumber == 53;
    }

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
