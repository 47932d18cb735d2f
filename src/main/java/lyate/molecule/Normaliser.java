package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import lyate.table.TableFolders;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;

/** Turns whatever was read into the one form the program works with, and refuses in words what it cannot use. */
final class Normaliser {

    private final Normalisations variants;
    private final CounterIons counterIons;

    /** @throws lyate.table.TableException for a bad cell of the tables it needs */
    Normaliser(TableFolders folders) {
        this.variants = Normalisations.load(folders);
        this.counterIons = CounterIons.load(folders);
    }

    /**
     * @param input what the user gave
     * @param read  every atom of it in input order; changed by this method
     * @param notes what reading already assumed, in words
     */
    Molecule normalise(String input, IAtomContainer read, List<String> notes) throws MoleculeException {
        List<String> warnings = new ArrayList<>(notes);
        InputNumbers.assign(read);
        Refusals.check(read);
        StereoMarks.forgetMeaningless(read);
        Hydrogens.fold(read, warnings);
        StereoMarks.forgetMeaningless(read);
        Metals.split(read, warnings);
        List<IAtom> odd = Valence.oddAtoms(read);
        variants.apply(read, odd, warnings);
        Components components = Components.of(read, counterIons);
        checkSubstrate(components.substrate(), odd);
        components.counterIons().forEach(Perception::markRings);
        return new Molecule(input, Perception.of(components.substrate(), warnings), components.counterIons(), warnings);
    }

    private static void checkSubstrate(IAtomContainer substrate, List<IAtom> odd) throws MoleculeException {
        if (substrate.getAtomCount() > Refusals.MOST_HEAVY_ATOMS) {
            throw Refusals.tooLarge(substrate.getAtomCount());
        }
        for (IAtom atom : odd) {
            if (substrate.contains(atom)) {
                Valence.check(atom);
            }
        }
    }
}
