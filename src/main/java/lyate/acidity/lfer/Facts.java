package lyate.acidity.lfer;

import lyate.molecule.Molecule;

/**
 * What the sites of one molecule share, worked out once.
 *
 * @param molecule  the molecule
 * @param topology  atoms and branches
 * @param keys      structure of every branch
 * @param constants substituent constants of every branch
 */
record Facts(Molecule molecule, Topology topology, BranchKeys keys, Substituent[] constants) {

    static Facts of(Molecule molecule, Substituents substituents) {
        Topology topology = Topology.of(molecule);
        BranchKeys keys = BranchKeys.of(topology);
        return new Facts(molecule, topology, keys, substituents.of(topology, keys));
    }
}
