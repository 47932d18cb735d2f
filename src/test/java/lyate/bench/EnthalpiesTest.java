package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import lyate.bench.Enthalpies.Donor;
import lyate.stock.UnknownNameException;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class EnthalpiesTest {

    private final Enthalpies enthalpies = Enthalpies.load(TableFolders.packaged());

    /**
     * Solid sodium hydroxide dissolves with −44.5 kJ/mol and is neutralised with −55.8 kJ/mol (CRC Handbook, 95th ed., heats of
     * solution; Goldberg, Kishore and Lennen, J. Phys. Chem. Ref. Data 31, 231 (2002), water; both from memory).
     */
    @Test
    void solidHydroxideGivesOffItsHeatOfSolutionAndOfNeutralisation() throws UnknownNameException {
        assertEquals(-44.5 - 55.8, heat("naoh", Donor.ACID), 1);
    }

    /** Ionisation enthalpy of ammonium 51.95 kJ/mol (Goldberg et al. 2002, from memory). */
    @Test
    void ammoniaTakesAProtonWithTheIonisationEnthalpyOfAmmonium() throws UnknownNameException {
        assertEquals(-51.95, heat("nh3", Donor.ACID), 1);
    }

    /** Hydrogencarbonate fizzes and cools: everyday observation. */
    @Test
    void hydrogencarbonateCoolsAsItFizzes() throws UnknownNameException {
        assertTrue(heat("nahco3", Donor.ACID) > 10);
    }

    /** Both hydrides of calcium hydride count: −985.2 + 181.5 + 2 × 285.83 = −232.04 for two protons of water. */
    @Test
    void theHeatCountsPerProton() throws UnknownNameException {
        assertEquals(-232.04 / 2, heat("cah2", Donor.WATER), 1e-9);
    }

    @Test
    void theGasIsReadOffTheEquation() throws UnknownNameException {
        assertEquals(Map.of("hydrogen", 2), enthalpies.of(Reviews.STOCK.base("cah2"), Donor.WATER).orElseThrow().gases());
        assertEquals(Map.of(), enthalpies.of(Reviews.STOCK.base("naoh"), Donor.ACID).orElseThrow().gases());
    }

    @Test
    void everyRowNamesABaseOnTheShelfAndEverySubstanceIsUsed() {
        Set<String> used = new HashSet<>();
        for (Row row : Table.read(Enthalpies.REACTIONS, TableFolders.packaged()).rows()) {
            row.list("bases").forEach(base -> assertDoesNotThrow(() -> assertEquals(base, Reviews.STOCK.base(base).id())));
            used.addAll(ReactionEquation.parse(row.text("equation")).coefficients().keySet());
        }
        for (Row row : Table.read(Enthalpies.FORMATION, TableFolders.packaged()).rows()) {
            assertTrue(used.contains(row.id()), "no reaction uses " + row.id());
        }
    }

    @Test
    void anEquationThatDoesNotBalanceIsRefusedWithWhatIsOff(@TempDir Path folder) throws IOException {
        assertRefused(folder, "NaH(s) + 2 H2O(l) -> NaOH(s) + H2(g)", "{H=-2, O=-1}");
        assertRefused(folder, "NaH(s) + H2O(l) -> NaOH(s) + D2(g)", "it has no D2(g)");
        assertRefused(folder, "2 NaH(s) + 2 H2O(l) -> 2 NaOH(s) + 2 H2(g)", "one formula unit of the base");
        assertRefused(folder, "NaH(s) + H2O(l)", "two sides with -> between them");
        assertRefused(folder, "NaH(s) + H+(aq) -> Na+(aq) + H2(g)", "the donor H2O(l) on the left side");
        assertRefused(folder, "NaH(s) + H2O(l) -> NaOH(s) + half H2(g)", "at most a whole number in front");
    }

    private static void assertRefused(Path folder, String equation, String part) throws IOException {
        Files.writeString(folder.resolve("base-heats.csv"), "# version: 1\nid,bases,donor,equation,source\n"
                + "own,nah,water," + equation + ",common practice\n");
        String message = assertThrows(TableException.class, () -> Enthalpies.load(TableFolders.overlaidBy(folder))).getMessage();
        assertTrue(message.contains(part) && message.contains("base-heats.csv"), message);
    }

    private double heat(String base, Donor donor) throws UnknownNameException {
        return enthalpies.of(Reviews.STOCK.base(base), donor).orElseThrow().kiloJoulePerProton();
    }
}
