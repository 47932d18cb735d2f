package lyate.site;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.Renumbering;
import lyate.site.SiteClass.ClassValue;
import lyate.table.Column;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** The rows of the packaged site-classes.csv, each held to its own examples. */
class SiteClassTableTest {

    private static final List<SiteClass> ROWS = Found.CLASSES.rows();

    @Test
    void everyHitEndsInItsRow() {
        List<String> failures = failures(row -> {
            Found found = Found.in(row.hit(), row.role());
            return found.has(row.id()) ? "" : row.id() + ": hit " + row.hit() + " has " + found.inWords();
        });
        assertEquals(List.of(), failures);
    }

    @Test
    void noMissEndsInItsRow() {
        List<String> failures = failures(row -> {
            Found found = Found.in(row.miss(), row.role());
            return found.has(row.id()) ? row.id() + ": miss " + row.miss() + " has " + found.inWords() : "";
        });
        assertEquals(List.of(), failures);
    }

    @Test
    void hitsDrawnInKekuleFormAndAnotherOrderEndInTheSameRow() {
        List<String> failures = failures(row -> {
            Molecule kekule = renumbered(Found.read(row.hit()));
            Found found = new Found(kekule, Found.FINDER.sites(kekule, row.role()));
            return found.has(row.id()) ? "" : row.id() + ": " + kekule.input() + " has " + found.inWords();
        });
        assertEquals(List.of(), failures);
    }

    private static Molecule renumbered(Molecule molecule) {
        try {
            return Renumbering.of(molecule, 7).molecule();
        } catch (MoleculeException e) {
            throw new IllegalStateException(molecule.input(), e);
        }
    }

    @Test
    void noTwoRowsOfARoleShareAPattern() {
        Map<String, String> rowOfPattern = new HashMap<>();
        List<String> failures = failures(row -> {
            String other = rowOfPattern.putIfAbsent(row.role() + row.pattern().smarts(), row.id());
            return other == null ? "" : row.id() + " has the pattern of " + other;
        });
        assertEquals(List.of(), failures);
    }

    @Test
    void idsAndNamesAreUnique() {
        assertEquals(ROWS.size(), ROWS.stream().map(SiteClass::id).distinct().count());
        Set<String> seen = new HashSet<>();
        assertEquals(List.of(), failures(row -> seen.add(row.role() + row.name()) ? "" : row.id() + ": name " + row.name() + " is taken"));
    }

    @Test
    void valuesLieWhereAcidsLie() {
        List<String> failures = failures(row -> Stream.of(row.water(), row.dmso()).flatMap(Optional::stream)
                .filter(value -> !plausible(value)).map(value -> row.id() + ": " + value).collect(Collectors.joining()));
        assertEquals(List.of(), failures);
    }

    private static boolean plausible(ClassValue value) {
        return value.pKa() >= -15 && value.pKa() <= 60 && value.sigma() > 0 && value.sigma() <= 8;
    }

    /** DMSO gives no hydrogen bond to an anion; only the strongest acids, with their charge spread out, come near. */
    @Test
    void neutralOxygenAndNitrogenAcidsAreWeakerInDmsoThanInWater() {
        Predicate<SiteClass> neutral = row -> Set.of("alcohol", "phenol", "carboxylic-acid", "nh-acid").contains(row.family());
        List<String> failures = failures(row -> !neutral.test(row) || row.water().isEmpty() || row.dmso().isEmpty()
                || row.dmso().get().pKa() > row.water().get().pKa() - 2 ? "" : row.id());
        assertEquals(List.of(), failures);
    }

    @Test
    void everyFamilyHasALineBetweenMediaOrIsAMineralAcid() {
        Schema columns = new Schema("media-transfer.csv", 1, Stream.of("id", "from", "to", "family", "slope", "intercept",
                "standard_error", "n", "valid_from", "valid_to", "source").map(name -> Column.text(name).optional()).toList());
        Set<String> known = Table.read(columns, TableFolders.packaged()).rows().stream().map(row -> row.text("family"))
                .collect(Collectors.toCollection(HashSet::new));
        known.add("mineral-acid");
        assertEquals(List.of(), failures(row -> known.contains(row.family()) ? "" : row.id() + ": " + row.family()));
    }

    @Test
    void theTableCoversUsualOrganicChemistry() {
        long carbon = ROWS.stream().filter(row -> row.role() == Role.ACID && row.id().endsWith("-ch")).count();
        long acids = ROWS.stream().filter(row -> row.role() == Role.ACID).count();
        long bases = ROWS.stream().filter(row -> row.role() == Role.BASE).count();
        assertTrue(carbon >= 100 && acids - carbon >= 300 && bases >= 200, carbon + " " + (acids - carbon) + " " + bases);
    }

    private static List<String> failures(Function<SiteClass, String> check) {
        List<String> failures = new ArrayList<>();
        for (SiteClass row : ROWS) {
            String failure = check.apply(row);
            if (!failure.isEmpty()) {
                failures.add(failure);
            }
        }
        return failures;
    }
}
