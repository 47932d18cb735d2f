package lyate.molecule;

import java.io.IOException;
import java.util.Arrays;
import java.util.Comparator;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.graph.GraphUtil;
import org.openscience.cdk.graph.invariant.Canon;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.smiles.SmiFlavor;
import org.openscience.cdk.smiles.SmilesGenerator;
import uk.ac.ebi.beam.Functions;
import uk.ac.ebi.beam.Graph;

/** The SMILES a molecule is written as. */
final class SmilesWriter {

    private SmilesWriter() {}

    /**
     * Canonical SMILES of the constitution, neither configuration nor isotopes. It shows the Kekule form, which the toolkit
     * brings into one of its equals; aromatic symbols would leave open which one is meant in rings that are not aromatic.
     */
    static String constitution(IAtomContainer molecule) {
        return write(molecule, SmiFlavor.Canonical);
    }

    /**
     * SMILES with configuration and isotopes, atoms in the canonical order of the constitution. (The toolkit's own
     * canonical form with configuration needs a native library.)
     */
    static String full(IAtomContainer molecule) {
        String smiles = write(inCanonicalOrder(molecule), SmiFlavor.UseAromaticSymbols | SmiFlavor.Stereo | SmiFlavor.AtomicMass);
        return smiles.contains("\\") || smiles.contains("/") ? withOneChoiceOfSlashes(smiles) : smiles;
    }

    /** SMILES with configuration, isotopes and atom map, as drawn. */
    static String mapped(IAtomContainer molecule) {
        return write(molecule, SmiFlavor.Isomeric | SmiFlavor.AtomAtomMap);
    }

    /** {@code C/C=C/C} and {@code C\C=C\C} say the same. */
    private static String withOneChoiceOfSlashes(String smiles) {
        try {
            return Functions.normaliseDirectionalLabels(Graph.fromSmiles(smiles)).toSmiles();
        } catch (IOException e) {
            throw new IllegalStateException("a SMILES just written could not be read", e);
        }
    }

    private static IAtomContainer inCanonicalOrder(IAtomContainer molecule) {
        long[] labels = Canon.label(molecule, GraphUtil.toAdjList(molecule));
        IAtomContainer copy = copy(molecule);
        IAtom[] atoms = new IAtom[labels.length];
        for (IAtom atom : copy.atoms()) {
            atoms[(int) labels[atom.getIndex()] - 1] = atom;
        }
        copy.setAtoms(atoms);
        IBond[] bonds = new IBond[copy.getBondCount()];
        for (int i = 0; i < bonds.length; i++) {
            bonds[i] = copy.getBond(i);
        }
        Arrays.sort(bonds, Comparator.comparingInt(SmilesWriter::lowerEnd).thenComparingInt(SmilesWriter::upperEnd));
        copy.setBonds(bonds);
        return copy;
    }

    private static int lowerEnd(IBond bond) {
        return Math.min(bond.getBegin().getIndex(), bond.getEnd().getIndex());
    }

    private static int upperEnd(IBond bond) {
        return Math.max(bond.getBegin().getIndex(), bond.getEnd().getIndex());
    }

    private static IAtomContainer copy(IAtomContainer molecule) {
        try {
            return molecule.clone();
        } catch (CloneNotSupportedException e) {
            throw new IllegalStateException("molecules can be copied", e);
        }
    }

    private static String write(IAtomContainer molecule, int flavour) {
        try {
            return new SmilesGenerator(flavour).create(molecule);
        } catch (CDKException e) {
            throw new IllegalStateException("a perceived molecule could not be written as SMILES", e);
        }
    }
}
