package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.site.Role;
import lyate.stock.Medium;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

class PublishedAcidityTest {

    private static final MeasuredAcidities MEASURED = MeasuredAcidities.load(TableFolders.packaged());

    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "/lyate/acidity/published-pka.csv", useHeadersInDisplayName = true)
    void measuredTableAgreesWithThePublishedValue(String name, String smiles, String site, String role, String medium,
                                                  double pKa, double tolerance, String source) {
        Molecule molecule = Sites.molecule(smiles);
        Role wanted = role.equals("acid") ? Role.ACID : Role.BASE;
        Optional<Acidity> found = MEASURED.measured(molecule, Sites.site(molecule, site, wanted), new Medium(medium));
        assertTrue(found.isPresent(), () -> name + " " + smiles + " " + site + " is not in the table");
        assertEquals(pKa, found.get().pKa(), tolerance, () -> name + ", " + source);
    }
}
