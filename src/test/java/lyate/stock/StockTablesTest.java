package lyate.stock;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The shelf tables, checked as data. */
class StockTablesTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());

    static Stream<Base> bases() {
        return STOCKROOM.bases().stream();
    }

    static Stream<Solvent> solvents() {
        return STOCKROOM.solvents().stream();
    }

    static Stream<Acid> acids() {
        return STOCKROOM.acids().stream();
    }

    static Stream<Partner> partners() {
        return STOCKROOM.partners().stream();
    }

    @Test
    void theShelfIsWellStocked() {
        assertTrue(STOCKROOM.acids().size() >= 35, STOCKROOM.acids().size() + " acids");
        assertTrue(STOCKROOM.partners().size() >= 40, STOCKROOM.partners().size() + " partners");
        assertTrue(STOCKROOM.bases().size() >= 120, STOCKROOM.bases().size() + " bases");
        assertTrue(STOCKROOM.solvents().size() >= 50, STOCKROOM.solvents().size() + " solvents");
    }

    @Test
    void everyFamilyHasABase() {
        Set<String> used = bases().map(base -> base.family().id()).collect(Collectors.toSet());
        Set<String> all = lyate.table.Table.read(BaseTable.FAMILIES, TableFolders.packaged()).rows().stream()
                .map(lyate.table.Row::id).collect(Collectors.toSet());
        assertEquals(all, used);
    }

    @ParameterizedTest
    @MethodSource("bases")
    void aBaseHasTheMolarMassOfItsStructureAndNoCharge(Base base) {
        Formula formula = Formula.of(base.smiles());
        assertEquals(formula.molarMass(), base.molarMass(), 0.02, base.id());
        assertEquals(0, formula.charge(), base.id());
    }

    @ParameterizedTest
    @MethodSource("bases")
    void takingOneProtonMakesTheConjugateAcid(Base base) {
        Map<String, Integer> acid = Formula.of(base.conjugateAcid()).atoms();
        boolean fits = Stream.of(base.smiles().split("\\.")).map(Formula::of).anyMatch(part -> {
            Map<String, Integer> protonated = new TreeMap<>(part.withOneProton());
            return protonated.equals(acid) && part.charge() + 1 == Formula.of(base.conjugateAcid()).charge();
        });
        assertTrue(fits, base.id() + ": " + base.smiles() + " + H+ is not " + base.conjugateAcid());
    }

    @ParameterizedTest
    @MethodSource("bases")
    void aBaseCanBeJudgedOnTheScaleOfItsFamily(Base base) {
        Medium scale = base.family().strong() ? Medium.DMSO : Medium.WATER;
        assertTrue(base.pKa(scale).isPresent(), base.id() + " has no pKa in " + scale.id());
    }

    @ParameterizedTest
    @MethodSource("bases")
    void pKaValuesOfABaseAreSaneAndSourced(Base base) {
        assertAll(base.pKas().entrySet().stream().map(entry -> () -> {
            KnownPKa value = entry.getValue();
            assertTrue(value.pKa() > -3 && value.pKa() < 65, base.id() + " in " + entry.getKey().id());
            assertTrue(value.sigma() > 0 && value.sigma() <= 6, base.id() + " sigma in " + entry.getKey().id());
            assertFalse(value.source().isBlank(), base.id());
        }));
        double last = base.pKa(Medium.WATER).map(KnownPKa::pKa).orElse(Double.MAX_VALUE);
        for (KnownPKa stage : base.furtherStages()) {
            assertTrue(stage.pKa() < last, base.id() + ": each further stage is weaker");
            last = stage.pKa();
        }
    }

    @ParameterizedTest
    @MethodSource("bases")
    void stockOfABaseIsSane(Base base) {
        base.density().ifPresent(density -> assertTrue(density > 0.55 && density < 2, base.id() + " density"));
        base.strength().ifPresent(strength -> assertTrue(strength.value() > 0
                && strength.value() <= (strength.unit() == Base.Strength.Unit.MASS_PERCENT ? 100 : 16), base.id()));
        assertTrue(Set.of("", "hydrogen", "methane", "ethane", "ethene", "propane", "butane", "isobutane", "ammonia",
                "carbon dioxide").contains(base.gas()), base.id() + " gas " + base.gas());
        base.highestTemperatures().forEach((solvent, celsius) -> {
            assertTrue(STOCKROOM.solvents().stream().anyMatch(known -> known.id().equals(solvent)), base.id() + ": " + solvent);
            assertTrue(celsius >= -100 && celsius <= 150, base.id() + ": " + celsius);
        });
    }

    @ParameterizedTest
    @MethodSource("solvents")
    void aSolventHasTheMolarMassOfItsStructure(Solvent solvent) {
        assertEquals(Formula.of(solvent.smiles()).molarMass(), solvent.molarMass(), 0.02, solvent.id());
    }

    @ParameterizedTest
    @MethodSource("solvents")
    void physicalDataOfASolventAreSane(Solvent solvent) {
        String id = solvent.id();
        assertTrue(solvent.boilingPoint() > -40 && solvent.boilingPoint() < 300, id + " boils");
        solvent.meltingPoint().ifPresent(celsius -> assertTrue(celsius > -150 && celsius < 30, id + " melts"));
        solvent.meltingPoint().ifPresent(celsius -> assertTrue(celsius < solvent.boilingPoint(), id + " melts below boiling"));
        assertTrue(solvent.density() > 0.6 && solvent.density() < 1.7, id + " density");
        solvent.permittivity().ifPresent(value -> assertTrue(value > 1.5 && value < 190, id + " permittivity"));
        solvent.heatCapacity().ifPresent(value -> assertTrue(value > 0.8 && value < 5, id + " heat capacity"));
        assertTrue(solvent.molarity() > 3 && solvent.molarity() < 56, id + " molarity");
        solvent.saturationPpm().ifPresent(ppm -> assertTrue(ppm >= solvent.typicalWaterPpm().orElse(0), id + " water"));
    }

    @ParameterizedTest
    @MethodSource("solvents")
    void theScaleOfASolventIsItsOwnOrAProxy(Solvent solvent) {
        assertTrue(List.of(solvent.id(), "dmso", "water").contains(solvent.scale().id()), solvent.id());
        if (solvent.kind() == Solvent.Kind.LOW_POLARITY) {
            assertEquals(Medium.DMSO, solvent.scale(), solvent.id());
        }
    }

    @ParameterizedTest
    @MethodSource("solvents")
    void aProticSolventHasADonorValueOnAScaleThatServesIt(Solvent solvent) {
        if (solvent.kind() == Solvent.Kind.PROTIC) {
            assertTrue(solvent.donorPKa(solvent.scale()).isPresent(), solvent.id());
        }
    }

    @ParameterizedTest
    @MethodSource("acids")
    void anAcidIsNeutralAndHasTheMolarMassOfItsStructure(Acid acid) {
        assertEquals(Formula.of(acid.smiles()).molarMass(), acid.molarMass(), 0.02, acid.id());
        assertEquals(0, Formula.of(acid.smiles()).charge(), acid.id());
    }

    @ParameterizedTest
    @MethodSource("acids")
    void anAcidHasAnAqueousStrengthAndItsStagesWeaken(Acid acid) {
        double last = acid.pKa(Medium.WATER).orElseThrow().pKa();
        assertTrue(last > -20 && last < 20, acid.id());
        for (KnownPKa stage : acid.furtherStages()) {
            assertTrue(stage.pKa() > last, acid.id() + ": each further proton is held tighter");
            last = stage.pKa();
        }
        acid.density().ifPresent(density -> assertTrue(density > 0.7 && density < 2, acid.id() + " density"));
        assertFalse(acid.uses().isEmpty(), acid.id() + " has a use");
    }

    @Test
    void everyUseOfAcidsIsServed() {
        Set<String> uses = acids().flatMap(acid -> acid.uses().stream()).collect(Collectors.toSet());
        assertEquals(Set.of("quench", "salt", "deprotection"), uses);
    }

    @ParameterizedTest
    @MethodSource("partners")
    void aPartnerHasTheMolarMassOfItsStructure(Partner partner) {
        assertEquals(Formula.of(partner.smiles()).molarMass(), partner.molarMass(), 0.02, partner.id());
    }

    @ParameterizedTest
    @MethodSource("partners")
    void aBaseIsEitherToleratedOrConsumed(Partner partner) {
        assertTrue(partner.toleratedBases().stream().noneMatch(partner.consumingBases()::contains), partner.id());
        partner.density().ifPresent(density -> assertTrue(density > 0.6 && density < 2.5, partner.id() + " density"));
        partner.boilingPoint().ifPresent(celsius -> assertTrue(celsius > -90 && celsius < 350, partner.id() + " boils"));
    }
}
