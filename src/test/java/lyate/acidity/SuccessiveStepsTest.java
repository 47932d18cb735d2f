package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.table.TableFolders;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;

/** The distance of two steps in water against measured pairs; two like places are log10 4 apart by statistics alone. */
class SuccessiveStepsTest {

    private static final SiteCoupling COUPLING = SiteCoupling.load(TableFolders.packaged());
    private static final SiteFinder FINDER = new SiteFinder(SiteClasses.load(TableFolders.packaged()));

    @Test
    void gapsOfMeasuredPairsAreMet() throws IOException {
        double squares = 0;
        List<String> worst = new ArrayList<>();
        List<CSVRecord> pairs = pairs();
        for (CSVRecord pair : pairs) {
            double error = gap(pair) - (Double.parseDouble(pair.get("pk2")) - Double.parseDouble(pair.get("pk1")));
            squares += error * error;
            if (Math.abs(error) > 1) {
                worst.add(String.format(Locale.ROOT, "%s %.1f", pair.get("name"), error));
            }
        }
        double rmse = Math.sqrt(squares / pairs.size());
        assertEquals(64, pairs.size());
        assertTrue(rmse < 0.7, rmse + " " + worst);
    }

    /** CRC Handbook of Chemistry and Physics (from memory). */
    @Test
    void maleicAcidIsNotFumaricAcid() {
        Molecule maleic = Sites.molecule("OC(=O)/C=C\\C(=O)O");
        Molecule fumaric = Sites.molecule("OC(=O)/C=C/C(=O)O");
        AcidityEstimator estimator = AcidityEstimator.load(TableFolders.packaged());
        assertEquals(1.92, estimator.acidity(maleic, site(maleic, "O1"), Medium.WATER).orElseThrow().pKa(), 0.05);
        assertEquals(3.02, estimator.acidity(fumaric, site(fumaric, "O1"), Medium.WATER).orElseThrow().pKa(), 0.05);
        double cis = COUPLING.between(maleic, site(maleic, "O1"), site(maleic, "O8"), Medium.WATER).pKa();
        double trans = COUPLING.between(fumaric, site(fumaric, "O1"), site(fumaric, "O8"), Medium.WATER).pKa();
        Molecule open = Sites.molecule("OC(=O)C=CC(=O)O");
        double either = COUPLING.between(open, site(open, "O1"), site(open, "O8"), Medium.WATER).pKa();
        assertTrue(trans < either && either < cis, trans + " " + either + " " + cis);
    }

    private static double gap(CSVRecord pair) {
        Molecule molecule = Sites.molecule(pair.get("smiles"));
        return COUPLING.between(molecule, site(molecule, pair.get("first")), site(molecule, pair.get("second")), Medium.WATER).pKa() + Math.log10(4);
    }

    private static ProtonSite site(Molecule molecule, String label) {
        boolean base = label.startsWith("base:");
        int atom = molecule.atomLabelled(label.replace("base:", "")).orElseThrow();
        return FINDER.sites(molecule, base ? Role.BASE : Role.ACID).stream()
                .filter(site -> site.equivalent().contains(atom)).findFirst().orElseThrow();
    }

    private static List<CSVRecord> pairs() throws IOException {
        try (Reader text = new InputStreamReader(SuccessiveStepsTest.class.getResourceAsStream("successive-steps.csv"), StandardCharsets.UTF_8)) {
            return CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).setCommentMarker('#').get().parse(text).getRecords();
        }
    }
}
