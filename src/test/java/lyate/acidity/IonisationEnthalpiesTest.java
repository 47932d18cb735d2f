package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.stream.Collectors;
import lyate.site.SiteClass;
import lyate.site.SiteClasses;
import lyate.stock.Base;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

class IonisationEnthalpiesTest {

    private static final SiteClasses CLASSES = SiteClasses.load(TableFolders.packaged());
    private static final Stockroom STOCK = Stockroom.load(TableFolders.packaged());
    private final IonisationEnthalpies enthalpies = IonisationEnthalpies.load(TableFolders.packaged());

    /** Heats of neutralisation: acetic acid −55 to −56, phenol −33 to −34 kJ/mol with hydroxide (any school text; from memory). */
    @Test
    void neutralisationHeatsComeOutAsTaught() throws UnknownNameException {
        double hydroxide = ofBase("NaOH");
        assertEquals(-55.5, ofSite("carboxylic-acid") - hydroxide, 1);
        assertEquals(-33, ofSite("phenol") - hydroxide, 2);
    }

    /** Acetic acid and ammonia: −52.4 kJ/mol; ammonia and a strong acid −52.2 (Atkins, Physical Chemistry; from memory). */
    @Test
    void ammoniaTakesUpAProtonWithFiftyTwoKilojoules() throws UnknownNameException {
        assertEquals(-52.3, ofSite("carboxylic-acid") - ofBase("ammonia"), 1);
    }

    @Test
    void everyRowNamesFamiliesThatExist() {
        Set<String> sites = CLASSES.rows().stream().map(SiteClass::family).collect(Collectors.toSet());
        Set<String> bases = STOCK.bases().stream().map(base -> base.family().id()).collect(Collectors.toSet());
        for (Row row : Table.read(IonisationEnthalpies.SCHEMA, TableFolders.packaged()).rows()) {
            Set<String> known = row.text("of").equals("site") ? sites : bases;
            assertTrue(known.containsAll(row.list("families")), row.id() + " names " + row.list("families"));
        }
    }

    @Test
    void whatIsNotTabulatedStaysUnknown() throws UnknownNameException {
        Base lda = STOCK.base("LDA");
        assertTrue(enthalpies.of(lda.family()).isEmpty());
    }

    private double ofSite(String family) {
        SiteClass row = CLASSES.rows().stream().filter(site -> site.family().equals(family)).findFirst().orElseThrow();
        return enthalpies.of(row).orElseThrow().kiloJoulePerMole();
    }

    private double ofBase(String name) throws UnknownNameException {
        return enthalpies.of(STOCK.base(name).family()).orElseThrow().kiloJoulePerMole();
    }
}
