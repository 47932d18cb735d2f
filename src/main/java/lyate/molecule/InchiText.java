package lyate.molecule;

import io.github.dan2097.jnainchi.InchiStatus;
import java.util.List;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.inchi.InChIGeneratorFactory;
import org.openscience.cdk.inchi.InChIToStructure;
import org.openscience.cdk.silent.SilentChemObjectBuilder;

/**
 * An InChI as typed; its own numbers are the numbers of the atoms.
 *
 * @param text begins with {@code InChI=}
 */
record InchiText(String text) {

    private static final int LONGEST = 20_000;

    /** @throws MoleculeException in words */
    Molecule read(String input, Normaliser normaliser) throws MoleculeException {
        if (text.length() > LONGEST) {
            throw new MoleculeException("the text has " + text.length() + " characters; at most " + LONGEST + " are read");
        }
        InChIToStructure result = interpret();
        boolean understood = result.getStatus() == InchiStatus.SUCCESS || result.getStatus() == InchiStatus.WARNING;
        if (!understood || result.getAtomContainer().isEmpty()) {
            String reason = result.getMessage() == null ? "" : result.getMessage();
            throw new MoleculeException("not an InChI that is understood" + (reason.isBlank() ? "" : ": " + reason));
        }
        return normaliser.normalise(input, result.getAtomContainer(), List.of("the atoms carry the numbers of the InChI"));
    }

    private InChIToStructure interpret() throws MoleculeException {
        try {
            return InChIGeneratorFactory.getInstance().getInChIToStructure(text, SilentChemObjectBuilder.getInstance());
        } catch (CDKException | LinkageError e) {
            throw new MoleculeException("InChI cannot be read on this machine; give SMILES or a molfile instead");
        } catch (RuntimeException e) {
            throw new MoleculeException("not an InChI that is understood: it does not make sense as a whole");
        }
    }
}
