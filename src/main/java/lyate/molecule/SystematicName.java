package lyate.molecule;

import java.util.List;
import uk.ac.cam.ch.wwmm.opsin.NameToStructure;
import uk.ac.cam.ch.wwmm.opsin.OpsinResult;
import uk.ac.cam.ch.wwmm.opsin.OpsinResult.OPSIN_RESULT_STATUS;

/**
 * A systematic name as typed.
 *
 * @param text without surrounding blanks
 */
record SystematicName(String text) {

    private static final int LONGEST = 1000;

    /** Whether the text holds letters that no SMILES has outside brackets, at least two of them. */
    boolean likely() {
        String outside = text.replaceAll("\\[[^\\]]*\\]", "").replaceAll("Cl|Br", "");
        return outside.chars().filter(letter -> Character.isLetter(letter) && "BCNOPSFIHbcnopslr".indexOf(letter) < 0).count() > 1;
    }

    /** @throws MoleculeException that says which part of the name is not understood */
    Molecule read(String input, Normaliser normaliser) throws MoleculeException {
        if (text.length() > LONGEST) {
            throw new MoleculeException("the name has " + text.length() + " characters; at most " + LONGEST + " are read");
        }
        OpsinResult result = NameToStructure.getInstance().parseChemicalName(text);
        if (result.getStatus() == OPSIN_RESULT_STATUS.FAILURE) {
            throw new MoleculeException("neither SMILES nor a systematic name that is understood: " + result.getMessage());
        }
        String smiles = result.getSmiles();
        String understood = "the name is understood as " + smiles + ", whose order numbers the atoms";
        String doubt = result.getStatus() == OPSIN_RESULT_STATUS.WARNING ? " (" + result.getMessage() + ")" : "";
        return new SmilesText(smiles).read(input, normaliser, List.of(understood + doubt));
    }
}
