package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lyate.flask.ProtonHolder;
import org.junit.jupiter.api.Test;

/**
 * One group of pKa a is 99 % on one side at a ± log10 99 = a ± 1.9956. pKa values: benzoic acid 4.20, ibuprofen 4.9,
 * triethylammonium 10.75, pyridinium 5.23, phenol 9.99 (CRC Handbook, 95th ed., section 5; from memory).
 */
class WorkUpTest {

    private static final double TWO_NINES = Math.log10(99);
    private static final AqueousForm IBUPROFEN = AqueousForm.acid("ibuprofen", 4.9);
    private static final AqueousForm PHENOL = AqueousForm.acid("phenol", 9.99);
    private static final AqueousForm BENZOIC = AqueousForm.acid("benzoic acid", 4.20);
    private static final AqueousForm TRIETHYLAMINE = AqueousForm.base("triethylamine", 10.75);
    private static final AqueousForm PYRIDINE = AqueousForm.base("pyridine", 5.23);
    private static final AqueousForm NAPHTHALENE = new AqueousForm("naphthalene",
            new ProtonHolder("naphthalene", 1, List.of(), List.of(), 0), 0, true, List.of());

    /** The classic separation: benzoic acid leaves naphthalene with bicarbonate, phenol only with hydroxide. */
    @Test
    void anAcidLeavesANeutralCompoundTwoUnitsAboveItsPKa() {
        ExtractionWindow benzoate = ExtractionWindow.between(NAPHTHALENE, BENZOIC).get(0);
        assertEquals(4.20 + TWO_NINES, benzoate.fromPH(), 1e-6);
        assertEquals(14, benzoate.toPH());
        assertEquals("benzoic acid", benzoate.water());
        assertEquals(9.99 + TWO_NINES, ExtractionWindow.between(NAPHTHALENE, PHENOL).get(0).fromPH(), 1e-6);
        ExtractionWindow apart = ExtractionWindow.between(PHENOL, BENZOIC).get(0);
        assertEquals(4.20 + TWO_NINES, apart.fromPH(), 1e-6);
        assertEquals(9.99 - TWO_NINES, apart.toPH(), 1e-6);
    }

    @Test
    void anAcidAndAnAminePartInAcidOrTheOtherWayInBase() {
        List<ExtractionWindow> windows = ExtractionWindow.between(IBUPROFEN, TRIETHYLAMINE);
        assertEquals(2, windows.size());
        assertEquals(new ExtractionWindow(0, windows.get(0).toPH(), "ibuprofen", "triethylamine"), windows.get(0));
        assertEquals(4.9 - TWO_NINES, windows.get(0).toPH(), 1e-6);
        assertEquals("triethylamine", windows.get(1).organicLayer());
        assertEquals(10.75 + TWO_NINES, windows.get(1).fromPH(), 1e-6);
    }

    @Test
    void twoAminesPartBetweenTheirPKaValues() {
        ExtractionWindow window = ExtractionWindow.between(PYRIDINE, TRIETHYLAMINE).get(0);
        assertEquals(5.23 + TWO_NINES, window.fromPH(), 1e-6);
        assertEquals(10.75 - TWO_NINES, window.toPH(), 1e-6);
    }

    /** Two acids 0.7 apart cannot be parted by charge; best where both curves differ most, half way between. */
    @Test
    void whatCannotBePartedIsSaidSo() {
        WorkUp workUp = WorkUp.of(IBUPROFEN, List.of(BENZOIC));
        WorkUp.Parting parting = workUp.partings().get(0);
        assertTrue(parting.windows().isEmpty());
        assertEquals((4.9 + 4.20) / 2, parting.best().pH(), 0.05);
        assertTrue(parting.sentence().startsWith("No pH between 0 and 14 parts the product from benzoic acid"), parting.sentence());
    }

    /** Henderson–Hasselbalch, point for point. */
    @Test
    void anAcidAloneGoesIntoTheOrganicLayerTwoUnitsBelowItsPKa() {
        // Henderson and Hasselbalch: 99 % uncharged at pKa - 2.0, 99 % charged at pKa + 2.0.
        assertEquals("The product goes into the organic layer from pH 0.0 to 2.2; it stays in the water from pH 6.2 to 14.0.",
                WorkUp.of(BENZOIC, List.of()).productSentence());
        assertEquals("The product goes into the organic layer from pH 0.0 to 14.0.", WorkUp.of(NAPHTHALENE, List.of()).productSentence());
    }

    @Test
    void anAmineAloneGoesIntoTheOrganicLayerTwoUnitsAboveItsPKa() {
        assertEquals("The product goes into the organic layer from pH 12.8 to 14.0; it stays in the water from pH 0.0 to 8.7.",
                WorkUp.of(TRIETHYLAMINE, List.of()).productSentence());
    }

    @Test
    void aProductChargedToSomeDegreeAtEveryPHIsExtractedWhereItIsLeastSo() {
        // Henderson and Hasselbalch: 0.1 above its pKa, at pH 14, 56 % of the base are free.
        AqueousForm strong = AqueousForm.base("strong base", 13.9);
        assertTrue(WorkUp.of(strong, List.of()).productSentence().startsWith("At no pH is the product uncharged to 99 %; most of it, 56 %, at pH 14.0"));
    }

    @Test
    void theCurveIsThatOfHendersonAndHasselbalch() {
        WorkUp workUp = WorkUp.of(IBUPROFEN, List.of(TRIETHYLAMINE));
        assertEquals(141, workUp.curve().size());
        for (WorkUp.CurvePoint point : workUp.curve()) {
            assertEquals(1 / (1 + Math.pow(10, point.pH() - 4.9)), point.uncharged(), 1e-12);
        }
        assertEquals("Between pH 0.0 and 2.9 ibuprofen goes into the organic layer and triethylamine stays in the water.",
                workUp.partings().get(0).sentence());
    }
}
