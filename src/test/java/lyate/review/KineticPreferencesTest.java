package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeReader;
import lyate.review.KineticPreference.Control;
import lyate.stock.Stockroom;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class KineticPreferencesTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final KineticPreferences PREFERENCES = KineticPreferences.load(TableFolders.packaged(), STOCKROOM);

    static Stream<KineticPreference> rules() {
        return PREFERENCES.rules().stream();
    }

    @ParameterizedTest
    @MethodSource("rules")
    void everyRuleDecidesItsHitAndNotItsMiss(KineticPreference rule) throws Exception {
        assertEquals(Optional.of(rule.id()), deciding(rule.hit()));
        assertNotEquals(Optional.of(rule.id()), deciding(rule.miss()));
    }

    @ParameterizedTest
    @MethodSource("rules")
    void noPreferenceRunsBothWays(KineticPreference rule) throws Exception {
        String[] cells = rule.hit().split("\\|");
        String turned = String.join("|", cells[0], cells[1], cells[2], cells[3], cells[5], cells[4]);
        assertEquals(Optional.empty(), deciding(turned));
    }

    /** House, Modern Synthetic Reactions, 2nd ed., chapter 9: lithium diisopropylamide in the cold. */
    @ParameterizedTest
    @CsvSource({"CC1CCCC1=O, C5, C2", "CC(C)C(=O)C, C6, C2", "CC(C)C(=O)CC, C6, C2", "CCCCCC(C)=O, C7, C5"})
    void theColdHinderedBaseTakesTheLessSubstitutedSideOfAKetone(String smiles, String preferred, String other) throws Exception {
        assertEquals(Optional.of(Control.RATE), control(smiles + "|LDA|THF|-78|" + preferred + "|" + other));
        assertEquals(Optional.empty(), control(smiles + "|KOtBu|tBuOH|25|" + preferred + "|" + other));
    }

    /** House, Modern Synthetic Reactions, 2nd ed., chapter 9: enolates that exchange protons with the alcohol. */
    @ParameterizedTest
    @CsvSource({"CC1CCCC1=O, C2, C5", "CC(C)C(=O)CC, C2, C6", "CCCCCC(C)=O, C5, C7"})
    void theAlkoxideInItsAlcoholSettlesForTheMoreSubstitutedEnolate(String smiles, String preferred, String other) throws Exception {
        assertEquals(Optional.of(Control.EQUILIBRIUM), control(smiles + "|KOtBu|tBuOH|25|" + preferred + "|" + other));
        assertEquals(Optional.empty(), control(smiles + "|LDA|THF|-78|" + preferred + "|" + other));
    }

    @Test
    void twoEquallySubstitutedSidesAreLeftToTheAcidities() throws Exception {
        assertEquals(Optional.empty(), control("CC1(C)CC(=O)CC1|LDA|THF|-78|C4|C7"));
    }

    @Test
    void anAmideBaseIsNotAskedToChooseInAnAlcohol() throws Exception {
        assertEquals(Optional.empty(), control("CC1CCCCC1=O|LDA|EtOH|-78|C6|C2"));
    }

    @Test
    void theArylKetoneSideIsLeftToTheAcidities() throws Exception {
        assertEquals(Optional.empty(), control("CC(=O)Cc1ccccc1|LDA|THF|-78|C1|C4"));
    }

    @Test
    void thereIsNothingToChooseBetweenEquivalentAtoms() throws Exception {
        assertEquals(Optional.empty(), control("COc1cccc(OC)c1|n-BuLi|THF|0|C4|C6"));
    }

    @Test
    void anUnknownBaseWordIsReportedWithItsPlaceAndTheNearestNames(@TempDir Path folder) throws Exception {
        Files.writeString(folder.resolve("kinetic-preferences.csv"), """
                # version: 1
                id,control,bases,solvents,temperature_from,temperature_to,prefers,over,sentence,source,hit,miss
                mine,rate,hindered-amid,,,,[CX4],c,a sentence,common practice,CC|LDA|THF|0|C1|C2,CC|LDA|THF|0|C1|C2
                """);
        String message = assertThrows(TableException.class,
                () -> KineticPreferences.load(TableFolders.overlaidBy(folder), STOCKROOM)).getMessage();
        assertTrue(message.contains("kinetic-preferences.csv:3") && message.contains("hindered-amide"), message);
    }

    private static Optional<Control> control(String example) throws Exception {
        return preference(example).map(KineticPreference::control);
    }

    private static Optional<String> deciding(String example) throws Exception {
        return preference(example).map(KineticPreference::id);
    }

    /** {@code substrate|base|solvent|temperature|preferred atom|other atom}. */
    private static Optional<KineticPreference> preference(String example) throws Exception {
        List<String> cells = List.of(example.split("\\|"));
        Molecule molecule = new MoleculeReader().read(cells.get(0));
        return PREFERENCES.preference(molecule, atom(molecule, cells.get(4)), atom(molecule, cells.get(5)),
                STOCKROOM.base(cells.get(1)), Double.parseDouble(cells.get(3)), STOCKROOM.solvent(cells.get(2)));
    }

    private static int atom(Molecule molecule, String label) {
        return molecule.atomLabelled(label).orElseThrow(() -> new IllegalArgumentException(label + " in " + molecule.input()));
    }

    /** House, Modern Synthetic Reactions, 2nd ed. (from memory): rates decide where the proton does not come back. */
    @Test
    void aBaseTooWeakToTakeTheProtonForGoodLeavesTheOrderToTheEquilibrium() throws Exception {
        Review weak = review("zinc bis(hexamethyldisilazide)");
        assertTrue(weak.logK() < VerdictRule.COMPLETE && weak.intendedPercent() < 50, "taken " + weak.intendedPercent() + " %");
        assertNotEquals(Verdict.SELECTIVE, weak.verdict());
        assertEquals(Verdict.SELECTIVE, review("LDA").verdict());
    }

    private static Review review(String base) throws Exception {
        return StepReviewer.load(TableFolders.packaged()).review(new Step("1", new MoleculeReader().read("CC1CCCCC1=O"), Optional.of("C6"),
                STOCKROOM.base(base), 1.0, STOCKROOM.solvent("THF"), -78, 0.2, 20, Optional.empty()));
    }
}
