package lyate.molecule;

import java.io.Reader;
import java.util.List;
import java.util.stream.Stream;
import lyate.table.TableFolders;

/**
 * Reads a structure in any form users have one in: SMILES, InChI, molfile (V2000 and V3000) or systematic name.
 * Immutable; safe to share between threads.
 */
public final class MoleculeReader {

    static {
        SilentLog.install();
    }

    private static final Normaliser PACKAGED = new Normaliser(TableFolders.packaged());

    private final Normaliser normaliser;

    /** A reader that knows the packaged variants of drawing and counter-ions. */
    public MoleculeReader() {
        this(PACKAGED);
    }

    private MoleculeReader(Normaliser normaliser) {
        this.normaliser = normaliser;
    }

    /**
     * A reader that knows the variants of drawing in {@code normalisations.csv} and the ions in {@code counter-ions.csv} of
     * the given folders.
     */
    public static MoleculeReader load(TableFolders folders) {
        return new MoleculeReader(new Normaliser(folders));
    }

    /**
     * Reads one structure: by its unmistakable form if it has one, else as SMILES, else as a name.
     *
     * @throws MoleculeException in words; for SMILES with a caret under the place where the text stops making sense
     */
    public Molecule read(String text) throws MoleculeException {
        if (text.isBlank()) {
            throw new MoleculeException("there is no structure: the text is empty");
        }
        if (MolfileText.looksLike(text)) {
            return new MolfileText(text).read(normaliser);
        }
        String line = text.strip();
        if (line.contains("\n")) {
            throw new MoleculeException("there are several lines, but no molfile: line 4 states neither V2000 nor V3000");
        }
        return line.startsWith("InChI=") ? new InchiText(line).read(text, normaliser) : smilesOrName(text, line);
    }

    /** Reads SMILES and nothing else. */
    Molecule readSmiles(String text) throws MoleculeException {
        return new SmilesText(text).read(text, normaliser, List.of());
    }

    /** Reads a molfile; the data that follow its structure in an SD file are passed over. */
    Molecule readMolfile(String text) throws MoleculeException {
        if (!MolfileText.looksLike(text)) {
            throw new MoleculeException("not a molfile: line 4 states neither V2000 nor V3000");
        }
        return new MolfileText(text).read(normaliser);
    }

    /**
     * Reads an SD file record by record, as the stream is drawn.
     *
     * @param sdf closed by the caller
     */
    public Stream<SdfRecord> readSdf(Reader sdf) {
        return SdfRecords.stream(sdf, this);
    }

    private Molecule smilesOrName(String text, String line) throws MoleculeException {
        try {
            return new SmilesText(line).read(text, normaliser, List.of());
        } catch (MoleculeException notSmiles) {
            SystematicName name = new SystematicName(line);
            if (!name.likely()) {
                throw notSmiles;
            }
            return name.read(text, normaliser);
        }
    }
}
