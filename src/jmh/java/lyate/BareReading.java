package lyate;

import org.openscience.cdk.aromaticity.Aromaticity;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.graph.Cycles;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smiles.SmilesParser;

/** The least a program can do with a molecule, with the toolkit alone: parse, rings, aromaticity. */
public final class BareReading {

    private final SmilesParser parser = new SmilesParser(SilentChemObjectBuilder.getInstance());

    IAtomContainer read(String smiles) throws CDKException {
        IAtomContainer molecule = parser.parseSmiles(smiles);
        Cycles.markRingAtomsAndBonds(molecule);
        Aromaticity.apply(Aromaticity.Model.Daylight, molecule);
        return molecule;
    }

    /** A whole program: reads one SMILES and says how many atoms it has. */
    public static void main(String[] arguments) throws CDKException {
        System.out.println(new BareReading().read(arguments[0]).getAtomCount() + " atoms");
    }
}
