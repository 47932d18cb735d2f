package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import lyate.acidity.MeasuredAcidities.Value;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.stock.Medium;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smiles.SmiFlavor;
import org.openscience.cdk.smiles.SmilesGenerator;
import org.openscience.cdk.smiles.SmilesParser;

class MeasuredAciditiesTest {

    private static final MeasuredAcidities MEASURED = MeasuredAcidities.load(TableFolders.packaged());

    private static Optional<Acidity> find(String smiles, String label, Role role, Medium medium) {
        Molecule molecule = Sites.molecule(smiles);
        return MEASURED.measured(molecule, Sites.site(molecule, label, role), medium);
    }

    @ParameterizedTest
    @CsvSource({
        "CC(=O)[O-],            O4, base, CC(=O)O,               O4, acid, water",
        "CC([O-])=O,            O4, base, CC(=O)O,               O4, acid, water",
        "[Na+].CC(=O)[O-],      O5, base, CC(=O)O,               O4, acid, water",
        "CC[NH+](CC)CC.[Cl-],   N3, acid, CCN(CC)CC,             N3, base, water",
        "CCN(CC)CC.Cl,          N3, base, CCN(CC)CC,             N3, base, water",
        "C[N+](=O)[O-],         C1, acid, CN(=O)=O,              C1, acid, dmso",
        "CS(C)=O,               C1, acid, C[S+](C)[O-],          C1, acid, dmso",
        "[13CH3]C(=O)O,         O4, acid, CC(=O)O,               O4, acid, water",
        "[2H]OC(C)=O,           O2, acid, CC(=O)O,               O4, acid, water",
        "Oc1ccccn1,             O1, acid, O=c1cccc[nH]1,         N7, acid, water",
        "CC(O)=CC(C)=O,         O3, acid, CC(=O)CC(C)=O,         C4, acid, water",
        "CC([O-])=CC(C)=O,      O3, base, CC(=O)CC(C)=O,         C4, acid, dmso",
        "CC(=O)[CH-]C(C)=O,     C4, base, CC(=O)CC(C)=O,         C4, acid, dmso",
        "Cc1cnc[nH]1,           N4, base, Cc1c[nH]cn1,           N6, base, water",
        "Cc1c[nH+]c[nH]1,       N6, acid, Cc1c[nH]cn1,           N6, base, water",
        "Cc1c[nH+]c[nH]1,       N4, acid, Cc1c[nH]cn1,           N6, base, water",
        "C1=NC2=CC=CC=C2N1,     N9, acid, c1ccc2[nH]cnc2c1,      N5, acid, water",
        "NC(N)=[NH2+],          N1, acid, NC(N)=N,               N4, base, water",
        "N/C(=N\\c1ccccc1)Nc1ccccc1, N3, base, N=C(Nc1ccccc1)Nc1ccccc1, N1, base, water",
        "C[C@H](O)C(=O)O,       O6, acid, CC(O)C(=O)O,           O6, acid, water",
        "[O-][n+]1ccccc1,       O1, base, O=n1ccccc1,            O1, base, water",
        "CN(C)C=[NH+]C,         C1, acid, CN(C)C=[NH+]C,         C1, acid, water",
    })
    void oneProtonHasOneValueHoweverItIsDrawn(String one, String oneSite, String oneRole, String other, String otherSite,
                                              String otherRole, String medium) {
        Optional<Acidity> first = find(one, oneSite, role(oneRole), new Medium(medium));
        Optional<Acidity> second = find(other, otherSite, role(otherRole), new Medium(medium));
        assertEquals(first, second);
        assertEquals(!one.equals(other), first.isPresent(), () -> one + " " + oneSite);
    }

    private static Role role(String word) {
        return word.equals("acid") ? Role.ACID : Role.BASE;
    }

    @Test
    void aValueHoldsOnlyAtItsSite() {
        assertTrue(find("Oc1ccc(cc1)C(=O)O", "O10", Role.ACID, Medium.WATER).isPresent(), "carboxylic proton of 4-hydroxybenzoic acid");
        assertFalse(find("Oc1ccc(cc1)C(=O)O", "O1", Role.ACID, Medium.WATER).isPresent(), "its phenolic proton was not measured in the neutral acid");
        assertFalse(find("CC(=O)CC(C)=O", "C1", Role.ACID, Medium.DMSO).isPresent(), "terminal methyl of acetylacetone");
        assertFalse(find("CC(O)=CC(C)=O", "C4", Role.ACID, Medium.DMSO).isPresent(), "vinyl proton of its enol");
        assertFalse(find("CN(C)c1ccncc1", "N2", Role.BASE, Medium.WATER).isPresent(), "dimethylamino nitrogen of DMAP");
        assertFalse(find("CN(C)C(=N)N(C)C", "N2", Role.BASE, Medium.WATER).isPresent(), "amino nitrogen of tetramethylguanidine");
    }

    @Test
    void aValueHoldsForEveryEquivalentAtom() {
        assertEquals(find("CC(C)=O", "C1", Role.ACID, Medium.DMSO), find("CC(C)=O", "C3", Role.ACID, Medium.DMSO));
        assertTrue(find("CC(C)=O", "C3", Role.ACID, Medium.DMSO).isPresent());
    }

    @Test
    void enolAndKetoneKeepTheirOwnValues() {
        assertTrue(find("CC(C)=O", "C1", Role.ACID, Medium.WATER).isPresent());
        assertFalse(find("CC(O)=C", "O3", Role.ACID, Medium.WATER).isPresent());
        assertFalse(find("C=[N+](O)[O-]", "O3", Role.ACID, Medium.WATER).isPresent(), "aci-nitromethane");
    }

    @Test
    void stagesOfAPolybasicAcidAreDifferentProtons() {
        double first = find("OP(=O)(O)O", "O1", Role.ACID, Medium.WATER).orElseThrow().pKa();
        double second = find("OP(=O)(O)[O-]", "O1", Role.ACID, Medium.WATER).orElseThrow().pKa();
        double third = find("OP(=O)([O-])[O-]", "O1", Role.ACID, Medium.WATER).orElseThrow().pKa();
        assertTrue(first < second - 3 && second < third - 3, first + ", " + second + ", " + third);
        assertEquals(third, find("[O-]P(=O)([O-])[O-]", "O1", Role.BASE, Medium.WATER).orElseThrow().pKa());
    }

    @Test
    void constitutionalIsomersAreToldApart() {
        assertFalse(find("C1CCC2CCCCC2N1", "N10", Role.BASE, Medium.WATER)
                .equals(find("C1CCCN1", "N5", Role.BASE, Medium.WATER)));
        ProtonSkeleton decalin = ProtonSkeleton.of(Sites.molecule("C1CCC2CCCCC2C1"), Role.ACID, 3);
        ProtonSkeleton bicyclopentyl = ProtonSkeleton.of(Sites.molecule("C1CCC(C1)C1CCCC1"), Role.ACID, 3);
        assertFalse(decalin.sameAs(bicyclopentyl), "same atoms, same neighbours, other rings");
    }

    @Test
    void renumberingTheAtomsChangesNothing() throws CDKException {
        Random random = new Random(20260);
        List<Value> values = MEASURED.values();
        for (int i = 0; i < values.size(); i += 7) {
            Value value = values.get(i);
            Shuffled shuffled = shuffle(value.row().text("smiles"), value.molecule().inputNumber(value.atom()) - 1, random);
            Molecule molecule = Sites.molecule(shuffled.smiles());
            ProtonSite site = Sites.site(molecule, value.molecule().symbol(value.atom()) + shuffled.number(), value.role());
            assertEquals(Optional.of(value.acidity()), MEASURED.measured(molecule, site, value.acidity().medium()),
                    () -> value.row().id() + " as " + shuffled);
        }
    }

    private record Shuffled(String smiles, int number) {}

    private static Shuffled shuffle(String smiles, int atom, Random random) throws CDKException {
        IAtomContainer molecule = new SmilesParser(SilentChemObjectBuilder.getInstance()).parseSmiles(smiles);
        IAtom site = molecule.getAtom(atom);
        IAtom[] atoms = new IAtom[molecule.getAtomCount()];
        for (int i = 0; i < atoms.length; i++) {
            atoms[i] = molecule.getAtom(i);
        }
        for (int i = atoms.length - 1; i > 0; i--) {
            int j = random.nextInt(i + 1);
            IAtom swap = atoms[i];
            atoms[i] = atoms[j];
            atoms[j] = swap;
        }
        molecule.setAtoms(atoms);
        int[] order = new int[atoms.length];
        String text = new SmilesGenerator(SmiFlavor.Default).create(molecule, order);
        return new Shuffled(text, order[molecule.indexOf(site)] + 1);
    }

    @Test
    void aBadSiteIsNamedWithItsLine(@TempDir Path folder) throws IOException {
        write(folder, "mine,my acid,CC(=O)O,C9,acid,water,4.0,0.1,25,my notebook 1");
        TableException error = assertThrows(TableException.class, () -> MeasuredAcidities.load(TableFolders.overlaidBy(folder)));
        assertTrue(error.getMessage().contains("measured-acidities.csv:3: column site: found 'C9'"), error.getMessage());
    }

    @Test
    void aUsersOwnValueReplacesThePackagedOne(@TempDir Path folder) throws IOException {
        write(folder, "mine,my acid,OC(C)=O,O1,acid,water,4.44,0.01,25,my notebook 1");
        MeasuredAcidities measured = MeasuredAcidities.load(TableFolders.overlaidBy(folder));
        Molecule acid = Sites.molecule("CC(=O)O");
        assertEquals(4.44, measured.measured(acid, Sites.site(acid, "O4", Role.ACID), Medium.WATER).orElseThrow().pKa());
    }

    private static void write(Path folder, String row) throws IOException {
        Files.writeString(folder.resolve("measured-acidities.csv"),
                "# version: 1\nid,name,smiles,site,role,medium,pka,sigma,temperature_C,source\n" + row + "\n");
    }
}
