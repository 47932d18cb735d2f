package lyate.sheet.reaction;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Who is who in a reaction; what the reader says where a reaction is odd; how it bears hostile ones. */
class ReactionReaderTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final ReactionReader READER = new ReactionReader(new MoleculeReader(), STOCKROOM);
    private static final List<String> BASE_NAMES = STOCKROOM.bases().stream().flatMap(Base::names).toList();
    private static final ThreadMXBean CLOCK = ManagementFactory.getThreadMXBean();
    private static final long LONGEST_NANOS = 5_000_000_000L;

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "Oc1ccccc1.CI>K2CO3.acetone>COc1ccccc1|k2co3|acetone",
        "Oc1ccccc1.CI>NaH.DMF>COc1ccccc1|nah|dmf",
        "Oc1ccccc1.CI.[K+].[K+].[O-]C([O-])=O.CN(C)C=O>>COc1ccccc1|k2co3|dmf",
        "CC#CC.C#CCO>[Li]CCCC.C1CCOC1>[Li+].[C-]#CCO|n-buli|thf",
        "OCc1ccccc1.CI>[Na+].[H-].C1CCOC1>COCc1ccccc1|nah|thf",
        "CC(=O)CC(C)=O.CI>CCN(CC)CC.CN(C)c1ccncc1.ClCCl>CC(=O)C(C)C(C)=O|dmap|dcm",
        "CC(=O)CC(C)=O.CI>[H-].[Na+].[Li+].[CH2-]CCC.C1CCOC1>CCC(=O)CC(C)=O|n-buli|thf",
    })
    void baseAndSolventByStructureOrNameOnEitherSide(String reaction, String base, String solvent) throws MoleculeException {
        Reaction read = READER.read(reaction);
        assertEquals(Optional.of(base), read.base().map(Base::id));
        assertEquals(Optional.of(solvent), read.solvent().map(Solvent::id));
    }

    /** Many of the names read as SMILES of something odd as well: THF as tritium, hydrogen and fluorine. */
    @Test
    void everySolventIsKnownByEachOfItsNamesOverTheArrow() {
        List<String> unknown = STOCKROOM.solvents().stream().flatMap(solvent -> solvent.names()
                .filter(name -> !name.matches(".*[\\s.>].*") && BASE_NAMES.stream().noneMatch(name::equalsIgnoreCase))
                .filter(name -> !solventOver("O=C1CCCCC1>" + name + ">C[Si](C)(C)OC1=CCCCC1").equals(Optional.of(solvent.id())))).toList();
        assertEquals(List.of(), unknown);
    }

    private static Optional<String> solventOver(String reaction) {
        try {
            return READER.read(reaction).solvent().map(Solvent::id);
        } catch (MoleculeException e) {
            return Optional.of(e.getMessage());
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "O=Cc1ccccc1.CC(C)=O>[Na+].[OH-]>CC(=O)CC(O)c1ccccc1|2|C3H6O|C7H6O",
        "c1c[nH]cn1.CI>[H-].[Na+]>Cn1ccnc1|1|C3H4N2|CH3I",
        "C1CCNCC1.CC(Cl)=O>CCN(CC)CC>CC(=O)N1CCCCC1|1|C5H11N|C2H3ClO",
        "CC#N.C=O>[Na+].[OH-]>OCCC#N|1|C2H3N|CH2O",
    })
    void whatIsOnTheShelfMayBeTheSubstrateOrTheElectrophile(String reaction, int place, String substrate, String partner) throws MoleculeException {
        Reaction read = READER.read(reaction);
        assertEquals(place, read.reactant());
        assertEquals(substrate, read.substrate().formula());
        assertEquals(Optional.of(partner), read.partner().map(Molecule::formula));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "Oc1ccccc1.CI.BrCc1ccccc1>>COc1ccccc1|benzyl bromide is drawn, but none of its atoms are in the products",
        "Oc1ccccc1>[H-].[Na+]>COc1ccccc1|1 atom of the products comes from nothing that is drawn",
        "OCCc1ccccc1>>CC(C)(C)[Si](C)(C)OCCc1ccccc1|7 atoms of the products come from nothing that is drawn",
        "Oc1ccccc1.CI>CCN(CC)CC.CN(C)c1ccncc1>COc1ccccc1|several bases are drawn (4-(dimethylamino)pyridine, triethylamine); the strongest was taken",
        "Oc1ccccc1.CI>CC(C)=O.CN(C)C=O>COc1ccccc1|several solvents are drawn (acetone, N,N-dimethylformamide); the first was taken",
    })
    void whatIsOddIsSaid(String reaction, String remark) throws MoleculeException {
        Reaction read = READER.read(reaction);
        assertEquals(List.of(remark), read.origin().remarks());
        assertTrue(read.origin().sure(), "the site does not depend on it");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CC(C)=O>>|no product is drawn",
        "CC(C)=O>>CC(C)=O|no proton leaves or arrives",
        "CC(C)O>>CC(C)=O|hydrogen leaves two neighbours at once, which is an oxidation",
        "C1CCCCC1>>c1ccccc1|hydrogen leaves two neighbours at once, which is an oxidation",
        "OB(O)c1ccccc1.Brc1ccccc1>[O-]C([O-])=O.[Na+].[Na+]>c1ccc(cc1)-c1ccccc1|no proton leaves or arrives",
        "CC(=O)OCC.[OH-].[Na+]>>CC(=O)[O-].[Na+].CCO|no proton leaves or arrives",
        "CC(=O)C.[Li+].[CH2-]CCC>>CCCCC(C)(C)O|no proton leaves or arrives",
        "CC(C)(C)[Si](C)(C)OCC>>OCC|no proton leaves or arrives",
    })
    void noSiteIsInvented(String reaction, String reason) throws MoleculeException {
        Reaction read = READER.read(reaction);
        assertEquals(Optional.empty(), read.origin().site());
        assertFalse(read.origin().sure());
        assertEquals("unsure: " + reason, read.origin().confidence());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "Oc1ccc(O)cc1C.CI.CI>>COc1ccc(OC)cc1C|2 sites lose a proton|1",
        "C#C.C#CC>>C#CC#CC|both ends of a new bond lose hydrogen, which is an oxidation|1",
        "CCOC(=O)CC(=O)OCC.C=O.CNC>>CCOC(=O)C(CN(C)C)C(=O)OCC|2 sites lose a proton|1",
        "CC(=O)c1ccc(C(C)=O)c(Cl)c1.CI.CI>>CCC(=O)c1ccc(C(=O)CC)c(Cl)c1|2 sites lose a proton|1",
    })
    void aSiteThatMayBeAnotherIsUnsureAndNamesTheOther(String reaction, String doubt, int alternatives) throws MoleculeException {
        Reaction read = READER.read(reaction);
        assertTrue(read.origin().doubts().contains(doubt), read.origin().toString());
        assertEquals(alternatives, read.origin().alternatives().size());
    }

    @Test
    void aDeprotectionIsNoMereProtonation() throws MoleculeException {
        Reaction read = READER.read("CC(C)(C)OC(=O)N1CCCCC1.OC(=O)C(F)(F)F>>C1CC[NH2+]CC1.[O-]C(=O)C(F)(F)F");
        assertTrue(read.origin().arrives());
        assertEquals("unsure: bonds are made or broken as well, which is more than a protonation", read.origin().confidence());
    }

    /** One molecule drawn, two react. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CCOC(C)=O>[Na+].CC[O-]>CCOC(=O)CC(C)=O|C5",
        "CC(C)=O>[Ba+2].[OH-].[OH-]>CC(=O)CC(C)(C)O|C1",
        "O=C1CCCC1>[Na+].[OH-]>O=C1CCCC1=C1CCCC1|C3",
    })
    void selfCondensation(String reaction, String site) throws MoleculeException {
        assertEquals(Optional.of(site), READER.read(reaction).origin().site());
        assertTrue(READER.read(reaction).origin().sure());
    }

    /** Which of two isomers is drawn as product decides. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CCC(C)=O.CI>LDA>CCC(=O)CC|C4", "CCC(C)=O.CI>LDA>CC(C)C(C)=O|C2",
        "CC1CCCCC1=O.CI>LDA>CC1CCCC(C)C1=O|C6", "CC1CCCCC1=O.CI>KOtBu>CC1(C)CCCCC1=O|C2",
        "NCCO.CC(Cl)=O>>CC(=O)NCCO|N1", "NCCO.CC(Cl)=O>>CC(=O)OCCN|O4",
        "Cc1cc[nH]n1.CI>NaH>Cc1ccn(C)n1|N5", "Cc1cc[nH]n1.CI>NaH>Cc1ccnn1C|N5",
    })
    void theProductDecides(String reaction, String site) throws MoleculeException {
        assertEquals(Optional.of(site), READER.read(reaction).origin().site());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "C.>>C|reactant 2: there is nothing between two dots",
        "CCO.CC(C>>C|reactant 2: not SMILES: unclosed branch detected, SMILES may be truncated",
        "CCO>>CC(C|product 1: not SMILES: unclosed branch detected, SMILES may be truncated",
        "C[*]>>C|reactant 1: atom 2 is a placeholder (*), not an element: draw the whole structure",
        "CCO>NoSuch>C|agent 1: 'NoSuch' is neither SMILES nor the name of a base, solvent, acid or electrophile in the tables",
        "CCO>>C>C|not a reaction SMILES: expected reactants>agents>products, found 'CCO>>C>C'",
    })
    void whatCannotBeReadIsNamed(String reaction, String problem) {
        MoleculeException refused = assertThrows(MoleculeException.class, () -> READER.read(reaction));
        assertEquals(problem, refused.getMessage().lines().findFirst().orElseThrow());
    }

    static Stream<String> hostile() {
        String chain = "C".repeat(240);
        String peptide = "NC(C)C(=O)".repeat(40);
        String ladder = "C1CC1".repeat(60);
        return Stream.of("C".repeat(500) + ">>" + "C".repeat(500), chain + ".CI>>C" + chain, "O" + chain + ".CI>>CO" + chain,
                "CC(=O)" + peptide + "OC.CI>[H-].[Na+]>CC(=O)N(C)C(C)C(=O)" + peptide.substring("NC(C)C(=O)".length()) + "OC",
                ladder + ".CI>>" + ladder + "C", "C".repeat(100) + ".C".repeat(50) + ">>" + "C".repeat(150), "C.".repeat(59) + "C>>" + "C".repeat(60),
                "C.".repeat(200) + "C>>C", "[Na+].[Cl-]>[K+]>[Br-]", "OCC(O)C(O)C(O)C(O)C=O>>C(CO)CCCC", chain + ">>" + "N".repeat(1),
                "c1ccccc1.c1ccccc1.c1ccccc1.c1ccccc1>>c1ccc(cc1)-c1ccc(cc1)-c1ccc(cc1)-c1ccccc1");
    }

    @ParameterizedTest
    @MethodSource("hostile")
    void hostileReactionsAreAnsweredOrRefusedInTime(String reaction) {
        long start = CLOCK.getCurrentThreadCpuTime();
        try {
            Reaction read = READER.read(reaction);
            assertTrue(read.origin().site().isPresent() || !read.origin().confidence().isBlank());
        } catch (MoleculeException e) {
            assertFalse(e.getMessage().isBlank());
        }
        assertTrue(CLOCK.getCurrentThreadCpuTime() - start < LONGEST_NANOS);
    }

    @ParameterizedTest
    @ValueSource(ints = {60, 120, 200})
    void largeMoleculesKeepTheirSite(int atoms) throws MoleculeException {
        Reaction read = READER.read("O" + "CCOCC(C)".repeat(atoms / 6) + ".CI>>CO" + "CCOCC(C)".repeat(atoms / 6));
        assertEquals(Optional.of("O1"), read.origin().site());
        assertTrue(read.origin().sure());
    }

    /** The same question gets the same answer, whatever was asked before and on whichever thread. */
    @Test
    void threadsDoNotDisturbEachOther() {
        List<String> texts = ReactionSet.rows().stream().map(ReactionSet.Row::reaction).toList();
        List<String> alone = texts.stream().map(ReactionReaderTest::origin).toList();
        assertEquals(alone, texts.parallelStream().map(ReactionReaderTest::origin).toList());
    }

    private static String origin(String text) {
        try {
            return READER.read(text).origin().toString();
        } catch (MoleculeException e) {
            return e.getMessage();
        }
    }
}
