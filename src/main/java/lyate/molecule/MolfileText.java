package lyate.molecule;

import java.io.IOException;
import java.io.StringReader;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.io.DefaultChemObjectReader;
import org.openscience.cdk.io.MDLV2000Reader;
import org.openscience.cdk.io.MDLV3000Reader;
import org.openscience.cdk.silent.SilentChemObjectBuilder;

/**
 * A molfile, V2000 or V3000.
 *
 * @param text the whole file, or one record of an SD file without its data
 */
record MolfileText(String text) {

    private static final Pattern V2000 = Pattern.compile("V2000[ \\t]*$");
    private static final Pattern V3000 = Pattern.compile("V3000[ \\t]*$");
    private static final int LONGEST = 1_000_000;

    /** Whether line 4 states the version, as every molfile does. */
    static boolean looksLike(String text) {
        return text.lines().skip(3).findFirst().filter(line -> V2000.matcher(line).find() || V3000.matcher(line).find()).isPresent();
    }

    /** @throws MoleculeException in words, with the line number where one line is at fault */
    Molecule read(Normaliser normaliser) throws MoleculeException {
        return normaliser.normalise(text, parsed(), List.of());
    }

    /**
     * The structure as SMILES with its configuration and atom map, nothing normalised.
     *
     * @throws MoleculeException as {@link #read}
     */
    String smiles() throws MoleculeException {
        IAtomContainer parsed = parsed();
        Refusals.check(parsed);
        return SmilesWriter.mapped(parsed);
    }

    private IAtomContainer parsed() throws MoleculeException {
        if (text.length() > LONGEST) {
            throw new MoleculeException("the molfile has " + text.length() + " characters; at most " + LONGEST + " are read");
        }
        List<String> lines = text.lines().toList();
        boolean old = V2000.matcher(lines.get(3)).find();
        if (old) {
            MolfileCheck.v2000(lines);
        } else {
            MolfileCheck.v3000(lines);
        }
        IAtomContainer read = parse(old, String.join("\n", lines) + "\n");
        refuseStrangeBonds(read);
        InputNumbers.assign(read);
        refuseStrangeMap(read);
        AromaticBonds.settle(read);
        return read;
    }

    private static void refuseStrangeMap(IAtomContainer read) throws MoleculeException {
        for (IAtom atom : read.atoms()) {
            if (atom.getMapIdx() < 0) {
                throw new MoleculeException("the molfile numbers " + InputNumbers.label(atom) + " " + atom.getMapIdx()
                        + " in its atom map; expected 1 or more, or 0 for none", InputNumbers.of(atom));
            }
        }
    }

    private static void refuseStrangeBonds(IAtomContainer read) throws MoleculeException {
        Set<Set<Integer>> joined = new HashSet<>();
        for (IBond bond : read.bonds()) {
            int begin = read.indexOf(bond.getBegin()) + 1;
            int end = read.indexOf(bond.getEnd()) + 1;
            if (begin == end) {
                throw new MoleculeException("the molfile has a bond from atom " + begin + " to itself", begin);
            }
            if (!joined.add(Set.of(begin, end))) {
                throw new MoleculeException("the molfile has two bonds between atoms " + begin + " and " + end, begin);
            }
        }
    }

    private static IAtomContainer parse(boolean old, String molfile) throws MoleculeException {
        StringReader source = new StringReader(molfile);
        try (DefaultChemObjectReader reader = old ? new MDLV2000Reader(source) : new MDLV3000Reader(source)) {
            IAtomContainer read = reader.read(SilentChemObjectBuilder.getInstance().newAtomContainer());
            if (read == null) {
                throw new MoleculeException("the molfile holds no structure");
            }
            return read;
        } catch (CDKException | IOException | RuntimeException e) {
            throw new MoleculeException("the molfile could not be read: " + firstLine(e.getMessage()));
        }
    }

    private static String firstLine(String message) {
        return message == null ? "a line of it does not make sense" : message.lines().findFirst().orElse("");
    }
}
