package lyate.sheet.reaction;

import java.util.Optional;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.molecule.ReactionFile;
import lyate.molecule.ReactionPart;
import lyate.stock.Stockroom;

/**
 * Reads a reaction: who loses the proton, at which atom, to which base, in which solvent, and what it is joined to. Immutable;
 * safe to share between threads.
 */
public final class ReactionReader {

    private final MoleculeReader molecules;
    private final DrawnShelf shelf;

    public ReactionReader(MoleculeReader molecules, Stockroom stockroom) {
        this.molecules = molecules;
        this.shelf = new DrawnShelf(molecules, stockroom);
    }

    /**
     * Reads reaction SMILES, {@code reactants>agents>products}, or the text of an RXN file, or the first reaction of an RD
     * file. Agents may be given by name.
     *
     * @throws MoleculeException where it is not a reaction, a component cannot be read, or no reactant can be the substrate
     */
    public Reaction read(String text) throws MoleculeException {
        String smiles = ReactionFile.looksLike(text) ? ReactionFile.firstSmiles(text) : text;
        DrawnReaction drawn = DrawnReaction.of(smiles, molecules, shelf);
        if (drawn.left().isEmpty()) {
            throw new MoleculeException("the reaction has no reactant");
        }
        ReactionRoles roles = new ReactionRoles(drawn, shelf);
        Optional<ReactionPart> substrate = roles.substrate();
        if (substrate.isEmpty()) {
            throw new MoleculeException("the reaction has no reactant besides base, solvent and ions");
        }
        return new Reaction(substrate.get().molecule().orElseThrow(), substrate.get().number(), roles.bases().stream().findFirst(),
                roles.solvents().stream().findFirst(), roles.acid(), roles.partner(), roles.origin());
    }
}
