package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import lyate.acidity.MeasuredAcidities.Value;
import lyate.molecule.Molecule;
import lyate.site.Role;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

class MeasuredTableTest {

    private static final List<Value> VALUES = MeasuredAcidities.load(TableFolders.packaged()).values();

    @Test
    void holdsAtLeastNineHundredValues() {
        assertTrue(VALUES.size() >= 900, () -> "only " + VALUES.size());
    }

    @Test
    void everyMediumIsASolventOfTheStockroom() {
        Set<String> solvents = Stockroom.load(TableFolders.packaged()).solvents().stream().map(Solvent::id).collect(Collectors.toSet());
        Set<String> media = VALUES.stream().map(value -> value.acidity().medium().id()).collect(Collectors.toSet());
        assertTrue(solvents.containsAll(media), () -> media + " are not all in " + solvents);
    }

    /** But for cis and trans isomers, which are two acids. */
    @Test
    void noProtonHasTwoValuesInOneMedium() {
        List<String> twice = new ArrayList<>();
        Map<Long, List<Value>> seen = new HashMap<>();
        for (Value value : VALUES) {
            List<Value> alike = seen.computeIfAbsent(value.place().hash(), key -> new ArrayList<>());
            alike.stream().filter(other -> other.acidity().medium().equals(value.acidity().medium()))
                    .filter(other -> other.place().sameAs(value.place()))
                    .filter(other -> other.molecule().doubleBondConfigurations().equals(value.molecule().doubleBondConfigurations()))
                    .forEach(other -> twice.add(other.row().id() + " and " + value.row().id()));
            alike.add(value);
        }
        assertEquals(List.of(), twice);
    }

    @Test
    void everyValueIsWithinTheRangeOfItsMedium() {
        List<String> odd = VALUES.stream()
                .filter(value -> value.acidity().pKa() < -15 || value.acidity().pKa() > 57 || value.acidity().sigma() > 3)
                .map(value -> value.row().id()).toList();
        assertEquals(List.of(), odd);
    }

    @Test
    void roomTemperatureUnlessSaidOtherwise() {
        List<String> odd = VALUES.stream().filter(value -> value.row().has("temperature_C"))
                .filter(value -> Math.abs(value.row().number("temperature_C").getAsDouble() - 23.5) > 7)
                .map(value -> value.row().id()).toList();
        assertEquals(List.of(), odd);
    }

    @Test
    void everySourceNamesItsYearOrACompilation() {
        List<String> unsourced = VALUES.stream().filter(value -> !value.acidity().source()
                        .matches(".*(\\b(18|19|20)\\d\\d\\b|Handbook|Advanced Organic Chemistry|Evans & Ripin).*"))
                .map(value -> value.row().id()).toList();
        assertEquals(List.of(), unsourced);
    }

    @Test
    void everyMeasuredProtonIsASiteTheFinderKnows() {
        SiteFinder finder = new SiteFinder(SiteClasses.load(TableFolders.packaged()));
        List<String> unknown = VALUES.stream()
                .filter(value -> finder.sites(value.molecule(), value.role()).stream()
                        .noneMatch(site -> site.equivalent().contains(value.atom())))
                .map(value -> value.row().id() + " " + value.row().text("smiles")).toList();
        assertEquals(List.of(), unknown);
    }

    /** Both tables were put together apart from each other, so that a slip in one shows against the other. */
    @Test
    void basesOfTheStockroomAgreeWithTheTable() {
        SiteFinder finder = new SiteFinder(SiteClasses.load(TableFolders.packaged()));
        MeasuredAcidities measured = MeasuredAcidities.load(TableFolders.packaged());
        List<String> contradictions = new ArrayList<>();
        int compared = 0;
        for (Base base : Stockroom.load(TableFolders.packaged()).bases()) {
            if (base.conjugateAcid().equals("[H][H]")) {
                continue;
            }
            Molecule acid = Sites.molecule(base.conjugateAcid());
            for (Map.Entry<Medium, KnownPKa> stated : base.pKas().entrySet()) {
                OptionalDouble nearest = finder.sites(acid, Role.ACID).stream()
                        .flatMap(site -> measured.measured(acid, site, stated.getKey()).stream())
                        .mapToDouble(value -> Math.abs(value.pKa() - stated.getValue().pKa())
                                / Math.max(0.15, Math.hypot(value.sigma(), stated.getValue().sigma()))).min();
                compared += nearest.isPresent() ? 1 : 0;
                if (nearest.orElse(0) > 2) {
                    contradictions.add(base.id() + " in " + stated.getKey().id());
                }
            }
        }
        assertEquals(List.of(), contradictions);
        assertTrue(compared > 150, compared + " compared");
    }
}
