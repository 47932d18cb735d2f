# What the reference toolkit (RDKit) says of the SMILES on standard input, one line each: the heavy atoms' facts in the order of the
# text, kinds parted by tabs, atoms by blanks: hydrogens, size of the smallest ring (0: none), aromatic, symmetry class,
# configuration stated; a line "-" where the toolkit does not read the SMILES.
import sys

from rdkit import Chem, RDLogger

RDLogger.DisableLog("rdApp.*")


def facts(smiles):
    molecule = Chem.MolFromSmiles(smiles)
    if molecule is None:
        return "-"
    rings = molecule.GetRingInfo()
    # The classes are those of the constitution: configuration and isotopes taken off, as in the program.
    flat = Chem.Mol(molecule)
    Chem.RemoveStereochemistry(flat)
    for atom in flat.GetAtoms():
        atom.SetIsotope(0)
        atom.SetAtomMapNum(0)
    classes = list(Chem.CanonicalRankAtoms(flat, breakTies=False))
    atoms = list(molecule.GetAtoms())
    smallest = [min((len(ring) for ring in rings.AtomRings() if atom.GetIdx() in ring), default=0) for atom in atoms]
    return "\t".join(" ".join(str(int(value)) for value in values) for values in (
        [atom.GetTotalNumHs() for atom in atoms],
        smallest,
        [atom.GetIsAromatic() for atom in atoms],
        classes,
        [atom.GetChiralTag() != Chem.ChiralType.CHI_UNSPECIFIED for atom in atoms]))


for line in sys.stdin:
    print(facts(line.rstrip("\n")), flush=False)
