package lyate.sheet;

import java.util.Arrays;
import java.util.List;

/** The columns of a route sheet that mean something; every other column passes through. */
public enum SheetColumn {
    /** Name of the row. */
    STEP("step"),
    /** What is to lose a proton, in any form a structure can have. */
    SUBSTRATE("substrate"),
    /** Label of the atom meant, for example {@code C3}; empty: the most acidic one. */
    SITE("site"),
    /** What is to take the proton, by name. */
    BASE("base"),
    /** Moles of base per mole of substrate. */
    BASE_EQUIV("base_equiv"),
    /** What they are in, by name. */
    SOLVENT("solvent"),
    /** Degrees Celsius. */
    TEMPERATURE("temperature_C"),
    /** Substrate, mol/L. */
    CONCENTRATION("concentration_M"),
    /** Water in the solvent, mass ppm. */
    WATER("water_ppm"),
    /** Electrophile or additive in the same flask. */
    ELECTROPHILE("electrophile"),
    /** Substrate used, mmol. */
    AMOUNT_MILLIMOLE("amount_mmol"),
    /** Substrate used as weighed out, g; in place of mmol. */
    AMOUNT_GRAMS("amount_g"),
    /** Strength of the base found by titration, mol/L. */
    BASE_TITRATED("base_titrated_M"),
    /** Whatever the chemist wants to remember. */
    NOTES("notes"),
    /** Reaction SMILES, in place of substrate. */
    REACTION("reaction");

    private final String header;

    SheetColumn(String header) {
        this.header = header;
    }

    /** The column's name in the header line. */
    public String header() {
        return header;
    }

    /** The names of all columns. */
    public static List<String> headers() {
        return Arrays.stream(values()).map(SheetColumn::header).toList();
    }
}
