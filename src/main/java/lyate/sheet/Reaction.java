package lyate.sheet;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.stock.Base;
import lyate.stock.Solvent;

/**
 * What a reaction SMILES says of a step.
 *
 * @param substrate the reactant that carries the proton; its atoms are numbered from its own first one
 * @param base      the base among the agents, if one is on the shelf
 * @param solvent   the solvent among the agents, if one is on the shelf
 */
public record Reaction(Molecule substrate, Optional<Base> base, Optional<Solvent> solvent) {}
