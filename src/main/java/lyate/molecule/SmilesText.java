package lyate.molecule;

import org.openscience.cdk.exception.InvalidSmilesException;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smiles.SmilesParser;

/** SMILES as typed. */
record SmilesText(String text) {

    Molecule read() throws MoleculeException {
        try {
            IAtomContainer parsed = new SmilesParser(SilentChemObjectBuilder.getInstance()).parseSmiles(text.strip());
            return new Normaliser(text).normalise(parsed);
        } catch (InvalidSmilesException e) {
            throw new MoleculeException(e.getMessage());
        }
    }
}
