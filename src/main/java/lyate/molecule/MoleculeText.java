package lyate.molecule;

import java.io.IOException;
import java.io.StringWriter;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.io.MDLV2000Writer;
import org.openscience.cdk.smiles.SmiFlavor;
import org.openscience.cdk.smiles.SmilesGenerator;

/** Writes a molecule as text for other programs; counter-ions are left out. */
public final class MoleculeText {

    private MoleculeText() {}

    /** SMILES with configuration and isotopes, atoms in the order of the input. */
    public static String smiles(Molecule molecule) {
        try {
            return new SmilesGenerator(SmiFlavor.Isomeric).create(molecule.container());
        } catch (CDKException e) {
            throw new IllegalStateException("a molecule that was read can be written", e);
        }
    }

    /** Molfile V2000 with the layout of {@link MoleculeDrawing}. */
    public static String molfile(Molecule molecule) {
        StringWriter text = new StringWriter();
        try (MDLV2000Writer writer = new MDLV2000Writer(text)) {
            writer.write(new DrawingMaker(molecule).laidOut());
        } catch (CDKException | IOException e) {
            throw new IllegalStateException("a molecule that was read can be written", e);
        }
        return text.toString();
    }
}
