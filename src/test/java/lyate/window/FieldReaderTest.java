package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import lyate.molecule.MoleculeReader;
import lyate.review.Step;
import lyate.sheet.StepReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FieldReaderTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private final FieldReader reader = new FieldReader(() -> new StepReader(new MoleculeReader(), STOCKROOM));

    @Test
    void theDemoStepCanBeRead() {
        Step step = reader.read(StepText.demo()).step().orElseThrow();
        assertEquals("nah", step.base().id());
        assertEquals("dmf", step.solvent().id());
        assertEquals("N7", step.intendedSite().orElseThrow());
        assertEquals(0.2, step.concentrationMolar());
        assertEquals(step.solvent().typicalWaterPpm().orElseThrow(), step.waterPpm());
    }

    @ParameterizedTest
    @CsvSource({"SUBSTRATE,CC(", "SUBSTRATE,''", "BASE,unobtainium amide", "BASE,''", "SOLVENT,mud", "EQUIVALENTS,-1", "EQUIVALENTS,many",
        "TEMPERATURE,900", "CONCENTRATION,0", "WATER,NaN", "SUBSTRATE,>>CCO", "PARTNER,CC("})
    void whatCannotBeReadIsSaidAtItsField(StepField field, String text) {
        StepReading reading = reader.read(StepText.demo().with(field, text));
        assertTrue(reading.step().isEmpty());
        assertEquals(Set.of(field), reading.problems().keySet());
    }

    @Test
    void aPartnerIsFoundByItsNameAsInASheet() {
        Step step = reader.read(StepText.demo().with(StepField.PARTNER, "methyl iodide")).step().orElseThrow();
        assertEquals("CI", step.partner().orElseThrow().input());
    }

    @Test
    void aSiteTheSubstrateLacksIsSaidBelowTheSubstrate() {
        StepReading reading = reader.read(StepText.demo().withSite("N99"));
        assertTrue(reading.problems().get(StepField.SUBSTRATE).contains("N99"));
    }

    @Test
    void aDecimalCommaAndATrueMinusSignAreUnderstood() {
        StepText text = StepText.demo().with(StepField.EQUIVALENTS, "1,1").with(StepField.TEMPERATURE, "\u221278");
        Step step = reader.read(text).step().orElseThrow();
        assertEquals(1.1, step.equivalents());
        assertEquals(-78, step.temperatureCelsius());
    }

    @Test
    void anUnknownBaseIsAnsweredWithNamesThatAreKnown() {
        String problem = reader.read(StepText.demo().with(StepField.BASE, "LiHDMS")).problems().get(StepField.BASE);
        assertTrue(problem.contains("LiHMDS"), problem);
    }
}
