package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lyate.flask.TransferThermodynamics.Acid;
import org.junit.jupiter.api.Test;

class TransferThermodynamicsTest {

    /** RT ln 10 at 25 degrees C is 5.708 kJ/mol (any physical chemistry text). */
    @Test
    void onePKaUnitIsWorthFivePointSevenKilojoules() {
        TransferThermodynamics transfer = TransferThermodynamics.of(Acid.of(20), Acid.of(21), 298.15);
        assertEquals(-5.708, transfer.deltaGKiloJoule(), 5e-4);
        assertEquals(1, transfer.logK(), 1e-15);
    }

    /** Without entropy change ΔG stays what it is and log K grows in the cold. */
    @Test
    void theColdSharpensAnIsocoulombicTransferAndLeavesDeltaGAlone() {
        TransferThermodynamics warm = TransferThermodynamics.of(Acid.of(25), Acid.of(35), 298.15);
        TransferThermodynamics cold = TransferThermodynamics.of(Acid.of(25), Acid.of(35), 195.15);
        assertEquals(10 * 298.15 / 195.15, cold.logK(), 1e-12);
        assertEquals(warm.deltaGKiloJoule(), cold.deltaGKiloJoule(), 1e-9);
        assertTrue(cold.assumption().contains("isocoulombic"));
    }

    /**
     * Tris: pKa 8.072 and ΔH 47.45 kJ/mol at 25 degrees C, hence 7.75 or so at 37 (Goldberg, Kishore and Lennen, J. Phys.
     * Chem. Ref. Data 31, 231 (2002); from memory). Measured at 37 degrees C: 7.74 (its own pH standard table; from memory).
     */
    @Test
    void trisFollowsItsIonisationEnthalpy() {
        assertEquals(7.745, TransferThermodynamics.pKaAt(8.072, 47.45, 310.15), 0.01);
    }

    /** Water: pKw 13.995 at 25 degrees C, ΔH 55.8 kJ/mol; 13.26 at 50 degrees C (CRC Handbook, 95th ed.; from memory). */
    @Test
    void waterDissociatesMoreWhenWarm() {
        assertEquals(13.26, TransferThermodynamics.pKaAt(13.995, 55.8, 323.15), 0.03);
    }

    /**
     * Acetic acid (ΔH −0.41) to tris (ΔH 47.45, both kJ/mol; Goldberg et al. 2002, from memory): the transfer gives off
     * 47.86 kJ/mol and weakens with heat by the difference of both pKa shifts.
     */
    @Test
    void enthalpiesAreUsedOnlyWhereBothPartnersHaveOne() {
        Acid acetic = Acid.of(4.756, -0.41);
        Acid tris = Acid.of(8.072, 47.45);
        TransferThermodynamics both = TransferThermodynamics.of(acetic, tris, 350);
        double expected = TransferThermodynamics.pKaAt(8.072, 47.45, 350) - TransferThermodynamics.pKaAt(4.756, -0.41, 350);
        assertEquals(expected, both.logK(), 1e-12);
        assertTrue(both.assumption().contains("-47.9 kJ/mol"), both.assumption());
        TransferThermodynamics one = TransferThermodynamics.of(acetic, Acid.of(8.072), 350);
        assertEquals((8.072 - 4.756) * 298.15 / 350, one.logK(), 1e-12);
        assertTrue(one.assumption().contains("isocoulombic"));
    }

    @Test
    void aColdFlaskHasEveryTransferSharpenedAlike() {
        ProtonHolder diacid = new ProtonHolder("diacid", 1, java.util.List.of(new ProtonPlace("C1", 24), new ProtonPlace("C3", 26)),
                java.util.List.of(new Coupling(0, 1, 3)), 2);
        Flask cold = TransferThermodynamics.isocoulombic(Flask.of("dmso", diacid, ProtonHolder.base("base", 1, 25)), 195.15);
        double factor = 298.15 / 195.15;
        assertEquals(195.15, cold.temperatureKelvin());
        ProtonHolder moved = cold.holders().get(0);
        assertEquals(2 * factor, moved.places().get(1).pKa() - moved.places().get(0).pKa(), 1e-12);
        assertEquals(3 * factor, moved.couplings().get(0).raise(), 1e-12);
    }

    @Test
    void temperaturesOutsideTheRangeAreRefusedAndFarOnesMarked() {
        assertThrows(IllegalArgumentException.class, () -> TransferThermodynamics.of(Acid.of(1), Acid.of(2), 120));
        assertThrows(IllegalArgumentException.class, () -> TransferThermodynamics.of(Acid.of(1), Acid.of(2), 580));
        assertTrue(TransferThermodynamics.of(Acid.of(1), Acid.of(2), 170).assumption().contains("far from"));
        assertTrue(TransferThermodynamics.of(Acid.of(1), Acid.of(2), 430).assumption().contains("far from"));
        assertFalse(TransferThermodynamics.of(Acid.of(1), Acid.of(2), 173.15).assumption().contains("far from"));
        assertFalse(TransferThermodynamics.of(Acid.of(1), Acid.of(2), 423.15).assumption().contains("far from"));
    }
}
