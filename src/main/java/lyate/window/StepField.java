package lyate.window;

/** The fields of the step strip, in reading order. */
enum StepField {
    SUBSTRATE("Substrate", "Substrate", "SMILES, InChI, systematic name or pasted molfile", ""),
    BASE("Base", "Base", "name, abbreviation or formula", ""),
    EQUIVALENTS("Equiv.", "Equivalents", "moles of base per mole of substrate", "eq"),
    SOLVENT("Solvent", "Solvent", "name or abbreviation", ""),
    TEMPERATURE("T / \u00b0C", "Temperature", "of the deprotonation", "\u00b0C"),
    CONCENTRATION("c / mol L\u207b\u00b9", "Concentration", "of the substrate", "mol/L"),
    WATER("H\u2082O / ppm", "Water", "in the solvent, by mass", "ppm"),
    PARTNER("Partner", "Partner", "electrophile or additive in the same flask (optional)", "");

    private final String label;
    private final String name;
    private final String hint;
    private final String unit;

    StepField(String label, String name, String hint, String unit) {
        this.label = label;
        this.name = name;
        this.hint = hint;
        this.unit = unit;
    }

    /** Short label with the unit. */
    String label() {
        return label;
    }

    /** Name in full. */
    String fullName() {
        return name;
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
