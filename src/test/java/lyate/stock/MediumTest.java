package lyate.stock;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.TreeSet;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

class MediumTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());

    @Test
    void aMediumIsWrittenAsItsSolventIsUsuallyWritten() throws Exception {
        assertEquals("DMSO", Medium.DMSO.symbol());
        assertEquals("water", Medium.WATER.symbol());
        for (Solvent solvent : STOCKROOM.solvents()) {
            Medium scale = solvent.scale();
            Solvent named = STOCKROOM.solvent(scale.symbol());
            assertEquals(scale.id(), named.id());
            assertTrue(named.name().equals(scale.symbol()) || named.aliases().contains(scale.symbol()),
                    scale.symbol() + " is neither the name nor an abbreviation of " + named.name());
        }
    }

    @Test
    void soIsEveryMediumABaseHasAValueIn() throws Exception {
        Set<String> odd = new TreeSet<>();
        for (Base base : STOCKROOM.bases()) {
            for (Medium medium : base.pKas().keySet()) {
                Solvent named = STOCKROOM.solvent(medium.symbol());
                if (!named.name().equals(medium.symbol()) && !named.aliases().contains(medium.symbol())) {
                    odd.add(medium.symbol());
                }
            }
        }
        assertEquals(Set.of(), odd);
    }
}
