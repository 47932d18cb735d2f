package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import org.openscience.cdk.exception.InvalidSmilesException;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smiles.SmilesParser;

/**
 * SMILES as typed, a title allowed after it.
 *
 * @param text without surrounding blanks
 */
record SmilesText(String text) {

    /** Costly to make, never changed after that, and keeps nothing of what it reads: one serves all threads. */
    private static final SmilesParser PARSER = new SmilesParser(SilentChemObjectBuilder.getInstance());

    /** Longer texts hold more atoms than are handled. */
    private static final int LONGEST = 20_000;

    /** @throws MoleculeException with a caret under the place where the text stops making sense */
    Molecule read(String input, Normaliser normaliser, List<String> notes) throws MoleculeException {
        if (text.length() > LONGEST) {
            throw new MoleculeException("the text has " + text.length() + " characters; at most " + LONGEST + " are read");
        }
        // The toolkit walks along chains by recursion; what is too large anyway must not reach it.
        if (text.length() > Refusals.MOST_ATOMS && SmilesError.atoms(text) > Refusals.MOST_ATOMS) {
            throw Refusals.tooLarge(SmilesError.atoms(text));
        }
        IAtomContainer parsed = parse();
        try {
            return normaliser.normalise(input, parsed, withTitle(notes));
        } catch (MoleculeException e) {
            throw e.inputNumber().isPresent() ? underAtom(e, e.inputNumber().getAsInt()) : e;
        }
    }

    /** Every atom in the order of the text. */
    IAtomContainer parse() throws MoleculeException {
        try {
            return PARSER.parseSmiles(text);
        } catch (InvalidSmilesException e) {
            throw SmilesError.of(text, e.getMessage());
        }
    }

    private List<String> withTitle(List<String> notes) {
        String title = text.replaceFirst("^\\S+\\s*", "");
        if (title.isEmpty() || title.startsWith("|")) {
            return notes;
        }
        List<String> all = new ArrayList<>(notes);
        all.add("'" + title + "' after the SMILES is taken as its title");
        return all;
    }

    private MoleculeException underAtom(MoleculeException problem, int inputNumber) {
        int offset = SmilesError.offsetOfAtom(text, inputNumber);
        String place = offset < 0 ? "" : SmilesError.caret(text, offset);
        return new MoleculeException(problem.getMessage() + place, inputNumber);
    }
}
