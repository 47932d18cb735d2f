package lyate.window;

/** The fields of the step strip, in reading order. */
enum StepField {
    SUBSTRATE("Substrate", "SMILES, InChI, systematic name or pasted molfile", ""),
    BASE("Base", "name, abbreviation or formula", ""),
    EQUIVALENTS("Equivalents", "moles of base per mole of substrate", "eq"),
    SOLVENT("Solvent", "name or abbreviation", ""),
    TEMPERATURE("Temperature", "of the deprotonation", "\u00b0C"),
    CONCENTRATION("Concentration", "of the substrate", "mol/L"),
    WATER("Water", "in the solvent, by mass", "ppm"),
    PARTNER("Partner", "electrophile or additive in the same flask (optional)", "");

    private final String label;
    private final String hint;
    private final String unit;

    StepField(String label, String hint, String unit) {
        this.label = label;
        this.hint = hint;
        this.unit = unit;
    }

    String label() {
        return label;
    }

    /** What goes in, in words. */
    String hint() {
        return hint;
    }

    /** Unit of a number; empty for text. */
    String unit() {
        return unit;
    }

    boolean isNumber() {
        return !unit.isEmpty();
    }
}
