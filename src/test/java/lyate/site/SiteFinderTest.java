package lyate.site;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.NumberedSmiles;
import lyate.molecule.Renumbering;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Which atoms are sites, and of what kind. */
class SiteFinderTest {

    @ParameterizedTest(name = "{0} of {1}")
    @CsvSource(delimiter = '|', textBlock = """
            # SMILES                              | site | class
            CC(=O)O                               | O4  | carboxylic-oh
            OC(=O)C(F)(F)F                        | O1  | carboxylic-alpha-trihalo-oh
            OC(=O)c1ccccc1O                       | O1  | salicylic-oh
            OCC(O)C1OC(=O)C(O)=C1O                | O12 | ascorbic-3-oh
            Oc1c([N+](=O)[O-])cc([N+](=O)[O-])cc1[N+](=O)[O-] | O1 | picric-oh
            CC(C)(C)c1cc(C)cc(C(C)(C)C)c1O        | O16 | phenol-hindered-oh
            Oc1ccccn1                             | O1  | azine-2-hydroxy-oh
            Oc1cccnc1                             | O1  | azine-3-hydroxy-oh
            OCC(F)(F)F                            | O1  | alcohol-trihaloethyl-oh
            CC(C)(O)C#N                           | O4  | cyanohydrin-oh
            ONC(=O)c1ccccc1                       | O1  | hydroxamic-oh
            On1nnc2ccccc12                        | O1  | n-hydroxyazole-oh
            ON1C(=O)CCC1=O                        | O1  | nhs-oh
            OP(=O)(O)O                            | O1  | phosphoric-oh
            OP(=O)(O)[O-]                         | O1  | dihydrogen-phosphate-oh
            OB(O)c1ccccc1                         | O1  | boronic-aryl-oh
            CC(=O)Nc1ccccc1                       | N4  | anilide-nh
            CS(=O)(=O)Nc1ccccc1                   | N5  | n-aryl-sulfonamide-nh
            O=C1NS(=O)(=O)c2ccccc12               | N3  | saccharin-nh
            Nc1ccc(S(=O)(=O)Nc2ncccn2)cc1         | N9  | n-azine-sulfonamide-nh
            O=C1NC(=O)c2ccccc12                   | N3  | phthalimide-nh
            O=C1Nc2ccccc2C1=O                     | N3  | isatin-nh
            CCC1(CC)C(=O)NC(=O)NC1=O              | N8  | barbiturate-nh
            O=c1cc[nH]c(=O)[nH]1                  | N8  | uracil-3-nh
            c1ccc2[nH]ccc2c1                      | N5  | indole-nh
            c1nnn[nH]1                            | N5  | tetrazole-nh
            Cn1c(=O)c2[nH]cnc2n(C)c1=O            | N6  | xanthine-imidazole-nh
            CC(C)NC(C)C                           | N4  | amine-hindered-nh
            C[Si](C)(C)N[Si](C)(C)C               | N5  | disilazane-nh
            SC(=O)C                               | S1  | thioacid-sh
            S=c1cccc[nH]1                         | N7  | azinethione-nh
            CCO[PH](=O)OCC                        | P4  | phosphonate-ph
            Cl                                    | Cl1 | hydrochloric-hx
            """)
    void eachAcidHasItsClass(String smiles, String label, String expected) {
        Found found = Found.in(smiles, Role.ACID);
        assertEquals(expected, found.classAt(label), found.inWords());
    }

    @ParameterizedTest(name = "{0} of {1}")
    @CsvSource(delimiter = '|', textBlock = """
            # SMILES                              | site | class
            CCN(CC)CC                             | N3  | amine-tertiary-n
            C1COCCN1                              | N6  | morpholine-n
            C1CN2CCN1CC2                          | N3  | dabco-n
            NCC(=O)OC                             | N1  | amine-alpha-carbonyl-n
            Nc1ccccc1                             | N1  | aniline-n
            CN(C)c1cccc2cccc(N(C)C)c12            | N2  | proton-sponge-n
            CN(C)c1ccncc1                         | N7  | aminopyridine-4-n
            Cc1cccc(C)n1                          | N8  | lutidine-n
            c1c[nH]cn1                            | N5  | imidazole-n
            C1CCC2=NCCCN2CC1                      | N5  | dbu-n
            CN(C)C(=N)N(C)C                       | N5  | guanidine-n
            CC(C)=NO                              | N4  | oxime-n
            CC(=O)NN                              | N5  | hydrazide-n
            CC(=O)N(C)C                           | O3  | amide-o
            CC(C)=O                               | O4  | ketone-o
            CCOCC                                 | O3  | ether-o
            CS(C)=O                               | O4  | sulfoxide-o
            [O-][n+]1ccccc1                       | O1  | pyridine-n-oxide-o
            c1ccccc1P(c1ccccc1)c1ccccc1           | P7  | triaryl-phosphine-p
            CC#N                                  | N3  | nitrile-n
            CC(=O)[O-]                            | O4  | carboxylate-o
            [O-]c1ccccc1                          | O1  | phenolate-o
            C=C([O-])C                            | C1  | enolate-c
            C=C([O-])C                            | O3  | enolate-o
            C=P(c1ccccc1)(c1ccccc1)c1ccccc1       | C1  | ylide-c
            [CH2-]CCC                             | C1  | alkyl-anion-c
            CC(C)[N-]C(C)C                        | N4  | amide-ion-n
            CN(C)C=C                              | C5  | enamine-c
            """)
    void eachBaseHasItsClass(String smiles, String label, String expected) {
        Found found = Found.in(smiles, Role.BASE);
        assertEquals(expected, found.classAt(label), found.inWords());
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "CC(C)(C)C, C1, 12", "c1ccccc1, c1, 6", "C1CCCCC1, C1, 12", "CC(=O)OCC, C1, 3", "OC(=O)CCC(=O)O, O1, 2",
        "NCCN, N1, 4", "CC(=O)C, C1, 6", "C1=CC=CC=C1, C1, 6", "[2H]OC, O2, 1", "O, O1, 2"})
    void hydrogensOfEquivalentAtomsAreCountedTogether(String smiles, String label, int hydrogens) {
        Found found = Found.in(smiles, Role.ACID);
        int atom = found.molecule().atomLabelled(label).orElseThrow();
        List<ProtonSite> there = found.sites().stream().filter(site -> site.equivalent().contains(atom)).toList();
        assertEquals(1, there.size(), found.inWords());
        assertEquals(hydrogens, there.get(0).hydrogens(), found.inWords());
    }

    @ParameterizedTest
    @MethodSource("lyate.site.BroadMolecules#smiles")
    void everyAtomWithHydrogenIsASiteOfOneClass(String smiles) {
        Molecule molecule = Found.read(smiles);
        Map<Integer, Integer> sitesOf = new TreeMap<>();
        for (ProtonSite site : Found.FINDER.sites(molecule, Role.ACID)) {
            site.equivalent().forEach(atom -> sitesOf.merge(atom, 1, Integer::sum));
        }
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            int expected = molecule.hydrogens(atom) > 0 ? 1 : 0;
            assertEquals(expected, sitesOf.getOrDefault(atom, 0), NumberedSmiles.of(molecule, atom));
        }
    }

    @ParameterizedTest
    @MethodSource("lyate.site.BroadMolecules#smiles")
    void noHydrogenOnAHeteroatomEndsInTheFallback(String smiles) {
        Found found = Found.in(smiles, Role.ACID);
        assertTrue(!found.has("any-xh") && !found.has("other-nh") && !found.has("other-sh"), found.inWords());
    }

    @ParameterizedTest
    @MethodSource("lyate.site.BroadMolecules#smiles")
    void theOrderOfAtomsAndTheDrawnFormChangeNothing(String smiles) throws MoleculeException {
        Molecule one = Found.read(smiles);
        for (int seed = 0; seed < 5; seed++) {
            Renumbering other = Renumbering.of(one, seed);
            assertEquals(described(one, null), described(other.molecule(), inverse(other)), other.toString());
        }
    }

    private static int[] inverse(Renumbering renumbering) {
        int[] before = new int[renumbering.placeThen().length];
        for (int atom = 0; atom < before.length; atom++) {
            before[renumbering.placeThen()[atom]] = atom;
        }
        return before;
    }

    /** Class and hydrogens of every site, by its atoms in the numbering of the first molecule. */
    private static List<String> described(Molecule molecule, int[] numbers) {
        List<String> sites = new ArrayList<>();
        for (ProtonSite site : Found.FINDER.sites(molecule)) {
            List<Integer> atoms = site.equivalent().stream().map(atom -> numbers == null ? atom : numbers[atom]).sorted().toList();
            sites.add(site.siteClass().id() + " " + atoms + " " + site.hydrogens());
        }
        return sites.stream().sorted().toList();
    }

    @Test
    void anAcylatedNitrogenIsNoBaseButItsOxygenIs() {
        Found found = Found.in("CC(=O)N(C)C", Role.BASE);
        assertEquals("", found.classAt("N4"), found.inWords());
        assertEquals("amide-o", found.classAt("O3"));
    }

    @Test
    void aHydrocarbonHasNoBaseSite() {
        assertEquals(List.of(), Found.in("CC1CCC(C=C)CC1c1ccccc1", Role.BASE).sites());
    }
}
