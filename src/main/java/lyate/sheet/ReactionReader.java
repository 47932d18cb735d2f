package lyate.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;

/**
 * Reads reaction SMILES ({@code reactants>agents>products}). The first reactant that is neither base nor solvent is the
 * substrate; base and solvent are found by structure among the agents, then among the other reactants.
 */
public final class ReactionReader {

    private final MoleculeReader molecules;
    private final List<Shelved<Base>> bases;
    private final List<Shelved<Solvent>> solvents;

    /**
     * Something on the shelf by its parts.
     *
     * @param item  what it is
     * @param parts canonical SMILES of its components
     */
    private record Shelved<T>(T item, List<String> parts) {}

    public ReactionReader(MoleculeReader molecules, Stockroom stockroom) {
        this.molecules = molecules;
        this.bases = stockroom.bases().stream().map(base -> new Shelved<>(base, parts(base.smiles()))).toList();
        this.solvents = stockroom.solvents().stream().map(solvent -> new Shelved<>(solvent, parts(solvent.smiles()))).toList();
    }

    /**
     * Reads a reaction SMILES and tells apart what is substrate, base and solvent.
     *
     * @throws MoleculeException where it is not a reaction or has no usable reactant
     */
    public Reaction read(String text) throws MoleculeException {
        String[] sides = text.strip().split("\\s", 2)[0].split(">", -1);
        if (sides.length != 3) {
            throw new MoleculeException("not a reaction SMILES: expected reactants>agents>products, found '" + text + "'");
        }
        List<String> reactants = components(sides[0]);
        List<String> others = new ArrayList<>(parts(sides[1]));
        reactants.forEach(reactant -> others.addAll(parts(reactant)));
        Optional<Shelved<Base>> base = among(bases, others);
        base.ifPresent(found -> found.parts().forEach(others::remove));
        Optional<Shelved<Solvent>> solvent = among(solvents, parts(sides[1]));
        List<String> notSubstrate = new ArrayList<>(base.map(Shelved::parts).orElse(List.of()));
        notSubstrate.addAll(solvent.map(Shelved::parts).orElse(List.of()));
        return new Reaction(substrate(reactants, notSubstrate), base.map(Shelved::item), solvent.map(Shelved::item));
    }

    private Molecule substrate(List<String> reactants, List<String> notSubstrate) throws MoleculeException {
        if (reactants.isEmpty()) {
            throw new MoleculeException("the reaction has no reactant");
        }
        MoleculeException reason = new MoleculeException("the reaction has no reactant besides base and solvent");
        for (String reactant : reactants) {
            try {
                if (!notSubstrate.contains(key(reactant))) {
                    return molecules.read(reactant);
                }
            } catch (MoleculeException e) {
                reason = e;
            }
        }
        throw reason;
    }

    /** The item all of whose parts are there, the one of most parts first. */
    private static <T> Optional<Shelved<T>> among(List<Shelved<T>> shelf, List<String> present) {
        return shelf.stream().filter(item -> holds(present, item.parts()))
                .max(Comparator.comparingInt(item -> item.parts().size()));
    }

    private static boolean holds(List<String> present, List<String> wanted) {
        List<String> left = new ArrayList<>(present);
        return !wanted.isEmpty() && wanted.stream().allMatch(left::remove);
    }

    private List<String> parts(String smiles) {
        return components(smiles).stream().map(this::key).toList();
    }

    /** Canonical SMILES, or the text itself for a bare ion, which is written in one way only. */
    private String key(String component) {
        try {
            return molecules.read(component).canonicalKey();
        } catch (MoleculeException e) {
            return component;
        }
    }

    private static List<String> components(String smiles) {
        return smiles.isEmpty() ? List.of() : List.of(smiles.split("\\."));
    }
}
