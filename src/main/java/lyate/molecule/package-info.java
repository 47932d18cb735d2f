/**
 * The structure a user gave, read, normalised and perceived once; start with {@link lyate.molecule.MoleculeReader}.
 * The only package that knows the cheminformatics toolkit's molecules and patterns.
 */
package lyate.molecule;
