package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import lyate.site.BroadMolecules;
import lyate.site.SiteClass;
import lyate.site.SiteClasses;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.openscience.cdk.isomorphism.DfPattern;
import org.openscience.cdk.isomorphism.matchers.QueryAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smarts.Smarts;

/** What is passed over without being tried would not have fitted. */
class SurroundingsTest {

    private static final List<String> PATTERNS = SiteClasses.load(TableFolders.packaged()).rows().stream()
            .map(SiteClass::pattern).map(AtomPattern::smarts).toList();

    @Test
    void everyPackagedPatternAnswersAsTheToolkitDoes() throws MoleculeException {
        List<Molecule> molecules = new ArrayList<>();
        int number = 0;
        for (String smiles : BroadMolecules.smiles().toList()) {
            if (number++ % 3 == 0) {
                molecules.add(new MoleculeReader().read(smiles));
            }
        }
        List<String> differences = new ArrayList<>();
        for (String smarts : PATTERNS) {
            DfPattern toolkit = DfPattern.findSubstructure(parsed(smarts));
            AtomPattern ours = AtomPattern.compile(smarts);
            for (Molecule molecule : molecules) {
                for (int atom = 0; atom < molecule.atomCount(); atom++) {
                    if (toolkit.matchesRoot(molecule.container().getAtom(atom)) != ours.matches(molecule, atom)) {
                        differences.add(smarts + " at atom 1 of " + NumberedSmiles.of(molecule, atom));
                    }
                }
            }
        }
        assertEquals(List.of(), differences);
    }

    private static QueryAtomContainer parsed(String smarts) {
        QueryAtomContainer query = new QueryAtomContainer(SilentChemObjectBuilder.getInstance());
        assertTrue(Smarts.parse(query, smarts), smarts);
        return query;
    }
}
