package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import lyate.molecule.MoleculeReader;
import lyate.review.Step;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** A row becomes the step it means, or every column at fault is named. */
class StepReaderTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private final StepReader reader = new StepReader(new MoleculeReader(), STOCKROOM);

    @Test
    void everythingSaid() throws RowException, SheetException {
        Step step = read("step,substrate,site,base,base_equiv,solvent,temperature_C,concentration_M,water_ppm,electrophile",
                "A1,CC(=O)CC(=O)OCC,C4,NaOEt,\"1,05\",EtOH,\u221278,0.5,200,CCBr");
        assertEquals("A1", step.id());
        assertEquals("C4", step.intendedSite().orElseThrow());
        assertEquals(STOCKROOM.bases().stream().filter(base -> base.name().equals("sodium ethoxide")).findFirst().orElseThrow(), step.base());
        assertEquals(1.05, step.equivalents());
        assertEquals("etoh", step.solvent().id());
        assertEquals(-78, step.temperatureCelsius());
        assertEquals(0.5, step.concentrationMolar());
        assertEquals(200, step.waterPpm());
        assertEquals("C2H5Br", step.partner().orElseThrow().formula());
    }

    @Test
    void whatTheRowLeavesOpen() throws RowException, SheetException {
        Step step = read("substrate,base,solvent", "CC(C)=O,LDA,THF");
        assertEquals("1", step.id());
        assertTrue(step.intendedSite().isEmpty());
        assertEquals(1.0, step.equivalents());
        assertEquals(25, step.temperatureCelsius());
        assertEquals(0.2, step.concentrationMolar());
        assertEquals(step.solvent().typicalWaterPpm().orElseThrow(), step.waterPpm());
        assertTrue(step.partner().isEmpty());
    }

    @ParameterizedTest
    @CsvSource({"MeI,CH3I", "benzyl bromide,C7H7Br", "CCBr,C2H5Br", "1-bromobutane,C4H9Br"})
    void electrophileByNameOrStructure(String text, String formula) throws RowException, SheetException {
        assertEquals(formula, read("substrate,base,solvent,electrophile", "CC(C)=O,LDA,THF," + text).partner().orElseThrow().formula());
    }

    @Test
    void everyColumnAtFaultIsNamed() {
        RowException refused = assertThrows(RowException.class, () -> read("substrate,site,base,base_equiv,solvent,temperature_C",
                "CC(C)=O,N9,sodium hydryde,much,,-300"));
        assertEquals(List.of("base", "solvent", "site", "base_equiv", "temperature_C"),
                refused.problems().stream().map(RowException.Problem::column).toList());
        assertTrue(refused.getMessage().contains("column site: there is no atom 'N9' in the substrate; its protons are on C1"), refused.getMessage());
        assertTrue(refused.getMessage().contains("column base: no base called 'sodium hydryde' in the tables; nearest: sodium hydride"), refused.getMessage());
        assertTrue(refused.getMessage().contains("column solvent: there is no solvent"), refused.getMessage());
        assertTrue(refused.getMessage().contains("column base_equiv: found 'much', expected a number from 0 to 100 (equivalents)"), refused.getMessage());
        assertTrue(refused.getMessage().contains("column temperature_C: found '-300', expected a number from -120 to 250 (degrees Celsius)"), refused.getMessage());
    }

    @Test
    void badStructureShowsThePlace() {
        RowException refused = assertThrows(RowException.class, () -> read("substrate,base,solvent", "CC(C,LDA,THF"));
        assertEquals("not SMILES: unclosed branch detected, SMILES may be truncated\nCC(C\n   ^", refused.problems().get(0).reason());
        assertEquals("column substrate: not SMILES: unclosed branch detected, SMILES may be truncated, at character 4 of 'CC(C'",
                refused.getMessage());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CC(=O)CC(=O)OCC.CCBr>[Na+].CC[O-].CCO>CCC(C(C)=O)C(=O)OCC|C6H10O3|sodium ethoxide|ethanol",
        "CC(C)=O>CC(C)[N-]C(C)C.[Li+].C1CCOC1>CC(=C)[O-].[Li+]|C3H6O|lithium diisopropylamide|tetrahydrofuran",
        "[CH3:1][C:2](=[O:3])[CH3:4]>[Na+].[H-].CN(C)C=O>[CH2-:1][C:2](=[O:3])[CH3:4]|C3H6O|sodium hydride|N,N-dimethylformamide",
        "Oc1ccccc1.CI.[K+].[K+].[O-]C([O-])=O>CC(C)=O>COc1ccccc1|C6H6O|potassium carbonate|acetone",
    })
    void reactionSmilesNamesSubstrateBaseAndSolvent(String reaction, String formula, String base, String solvent)
            throws RowException, SheetException {
        Step step = read("reaction", '"' + reaction + '"');
        assertEquals(formula, step.substrate().formula());
        assertEquals(base, step.base().name());
        assertEquals(solvent, step.solvent().name());
    }

    @Test
    void namedBaseGoesBeforeTheDrawnOne() throws RowException, SheetException {
        Step step = read("reaction,base,solvent", "CC(C)=O>[Na+].[H-]>C,LDA,THF");
        assertEquals("lithium diisopropylamide", step.base().name());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CC(C)=O|not a reaction SMILES: expected reactants>agents>products, found 'CC(C)=O'",
        ">[Na+].[H-]>C|the reaction has no reactant",
        "[Na+].[H-]>C1CCOC1>C|the reaction has no reactant besides base, solvent and ions",
        "[Na+].[Cl-]>>C|the reaction has no reactant besides base, solvent and ions",
        "CC(C>>C|reactant 1: not SMILES: unclosed branch detected, SMILES may be truncated",
    })
    void reactionsThatCannotBeUsed(String reaction, String reason) {
        RowException refused = assertThrows(RowException.class, () -> read("reaction,base,solvent", reaction + ",LDA,THF"));
        assertTrue(refused.getMessage().startsWith("column reaction: "), refused.getMessage());
        assertEquals(reason, refused.problems().get(0).reason().lines().findFirst().orElseThrow());
    }

    @Test
    void siteAndElectrophileOfAReaction() throws RowException, SheetException {
        Step step = read("reaction", "O=C1CCCCC1.CI>CC(C)[N-]C(C)C.[Li+].C1CCOC1>CC1CCCCC1=O");
        assertEquals("C3", step.intendedSite().orElseThrow());
        assertEquals("CH3I", step.partner().orElseThrow().formula());
        assertEquals("sure: one assignment", step.origin().orElseThrow().confidence());
    }

    @Test
    void theSiteNamedGoesBeforeTheOneDrawn() throws RowException, SheetException {
        Step step = read("reaction,site,base,solvent", "NCCO.CC(Cl)=O>>CC(=O)NCCO,O4,Et3N,DCM");
        assertEquals("O4", step.intendedSite().orElseThrow());
        assertEquals("N1", step.origin().orElseThrow().site().orElseThrow());
    }

    @Test
    void theColumnSubstrateNumbersTheAtoms() throws RowException, SheetException {
        Step step = read("substrate,reaction,base,solvent", "COC1=CC=CC=C1O,Oc1ccccc1OC.CI>>COc1ccccc1OC,K2CO3,DMF");
        assertEquals("O9", step.intendedSite().orElseThrow());
        RowException refused = assertThrows(RowException.class,
                () -> read("substrate,reaction,base,solvent", "CCO,Oc1ccccc1.CI>>COc1ccccc1,K2CO3,DMF"));
        assertEquals("column reaction: its substrate is Oc1ccccc1, the column substrate has OCC", refused.getMessage());
    }

    @Test
    void baseAndElectrophileNamedThatAreNotThoseDrawn() throws RowException, SheetException {
        Step step = read("reaction,base,electrophile,solvent", "Oc1ccccc1.CI>[Na+].[H-]>COc1ccccc1,K2CO3,BnBr,DMF");
        assertEquals(List.of("the reaction shows sodium hydride as base, the row names potassium carbonate",
                "the reaction shows IC as electrophile, the row names BrCc1ccccc1"), step.origin().orElseThrow().remarks());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "Oc1ccccc1.CI>HCl.DMF>COc1ccccc1|column base: there is no base; concentrated hydrochloric acid, which is drawn, is an acid",
        "Oc1ccccc1.CI>DMF>COc1ccccc1|column base: there is no base",
        "Oc1ccccc1.CI>NaH>COc1ccccc1|column solvent: there is no solvent",
        "CNC.Cl>>C[NH2+]C|column reaction: a proton arrives at N2 (from concentrated hydrochloric acid): this is a protonation;"
                + " 'lyate check --reaction' judges it",
    })
    void whatAReactionLacks(String reaction, String problem) {
        assertEquals(problem, assertThrows(RowException.class, () -> read("reaction", '"' + reaction + '"')).getMessage());
    }

    @ParameterizedTest
    @CsvSource({"1.05,1.05", "'1,05',1.05", "\u22123,-3", ".5,0.5", "2.,2", "+1e1,10"})
    void numbersAsPeopleWriteThem(String text, double value) {
        assertEquals(OptionalDouble.of(value), new Quantity("x", -10, 10).parse(text));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "11", "NaN", "1.0.0", "1,000,000", "0x1p1", "1e400", "Infinity", "5 mol", "1d", "\u0661"})
    void textsThatAreNoNumber(String text) {
        assertTrue(new Quantity("x", -10, 10).parse(text).isEmpty());
    }

    private Step read(String header, String row) throws RowException, SheetException {
        return reader.read(RouteSheet.parse(header + "\n" + row + "\n").rows().get(0));
    }
}
