package lyate.fit;

import lyate.molecule.Molecule;
import lyate.site.Role;

/**
 * A measured value whose site the file does not name.
 *
 * @param place    file and line, for messages
 * @param molecule the molecule
 * @param role     whether the first proton lost or the first one gained was measured
 * @param pKa      the value
 * @param noise    its standard uncertainty as a multiple of a reliable one's
 */
record UnplacedRow(String place, Molecule molecule, Role role, double pKa, double noise) {}
