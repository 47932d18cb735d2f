package lyate.stock;

import java.util.Locale;

/**
 * A solvent in which a pKa scale exists. Two pKa values are compared only within one medium.
 *
 * @param id the solvent's id in {@code solvents.csv}, for example {@code water}
 */
public record Medium(String id) {

    public static final Medium WATER = new Medium("water");
    public static final Medium DMSO = new Medium("dmso");
    public static final Medium ACETONITRILE = new Medium("mecn");
    public static final Medium THF = new Medium("thf");

    /** The medium as it is written: the usual abbreviation of the solvent, or its name. */
    public String symbol() {
        return switch (id) {
            case "dmso", "thf", "dmf", "nmp", "hmpa", "mibk" -> id.toUpperCase(Locale.ROOT);
            case "mecn" -> "MeCN";
            case "dmac" -> "DMAc";
            case "meoh" -> "methanol";
            case "etoh" -> "ethanol";
            default -> id;
        };
    }
}
