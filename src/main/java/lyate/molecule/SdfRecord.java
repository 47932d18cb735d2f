package lyate.molecule;

import java.util.Optional;

/**
 * One record of an SD file: a molecule, or why there is none.
 *
 * @param number   1-based place in the file
 * @param name     its first line, stripped; may be empty
 * @param molecule present where it could be read
 * @param problem  in words where it could not; else empty
 */
public record SdfRecord(int number, String name, Optional<Molecule> molecule, String problem) {}
