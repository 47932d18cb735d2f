package lyate.molecule;

/** Reads a structure in any form users have one in. Stateless; safe to share between threads. */
public final class MoleculeReader {

    /**
     * Reads SMILES.
     *
     * @throws MoleculeException in words, with a caret under the place where the text stops making sense
     */
    public Molecule read(String text) throws MoleculeException {
        return new SmilesText(text).read();
    }
}
