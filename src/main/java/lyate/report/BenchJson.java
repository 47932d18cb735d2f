package lyate.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import lyate.bench.GasAndHeat;
import lyate.bench.GivenOffGas;
import lyate.bench.GroupHazard;
import lyate.bench.HeatShare;
import lyate.bench.Quench;
import lyate.bench.WorkUp.Parting;
import lyate.bench.WorkUpKit;
import lyate.molecule.Molecule;

/** Gas and heat, and the work-up as JSON objects. */
public final class BenchJson {

    private BenchJson() {}

    /** What is given off. */
    public static Map<String, Object> describe(GasAndHeat gasAndHeat) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("gas", gasAndHeat.gas().map(BenchJson::gas).orElse(null));
        object.put("heat", gasAndHeat.heat().stream().map(BenchJson::heat).toList());
        object.put("without_heat", gasAndHeat.withoutHeat());
        object.put("heat_kJ", number(gasAndHeat.kiloJoule()));
        object.put("temperature_rise_K", number(gasAndHeat.temperatureRise()));
        object.put("highest_temperature_C", number(gasAndHeat.highestTemperature()));
        object.put("remarks", gasAndHeat.cautions());
        return object;
    }

    /** How to quench and extract. */
    public static Map<String, Object> describe(Molecule product, WorkUpKit.Answer answer) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("quench", answer.quench().map(BenchJson::quench).orElse(null));
        object.put("no_quench", answer.refusal());
        object.put("uncharged", answer.workUp().curve().stream().filter(point -> point.pH() == Math.rint(point.pH()))
                .map(point -> List.of(point.pH(), Numbers.rounded(point.uncharged(), 6))).toList());
        object.put("product_goes", answer.workUp().productSentence());
        object.put("partings", answer.workUp().partings().stream().map(BenchJson::parting).toList());
        object.put("harmed_groups", answer.hazards().stream().map(hazard -> harmed(product, hazard)).toList());
        object.put("without_pka", answer.workUp().product().withoutPKa());
        object.put("assumed", answer.workUp().assumption());
        return object;
    }

    private static Map<String, Object> gas(GivenOffGas gas) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("name", gas.name());
        object.put("litres_in_step", Numbers.rounded(gas.litresInStep(), 6));
        object.put("litres_at_quench", Numbers.rounded(gas.litresAtQuench(), 6));
        object.put("temperature_C", Numbers.rounded(gas.celsius(), 2));
        object.put("pressure_kPa", Numbers.rounded(gas.kiloPascal(), 3));
        return object;
    }

    private static Map<String, Object> heat(HeatShare share) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("donor", share.donor());
        object.put("mmol", Numbers.rounded(share.milliMole(), 6));
        object.put("heat_kJ", Numbers.rounded(share.kiloJoule(), 5));
        object.put("tabulated", share.tabulated());
        object.put("how", share.how());
        object.put("source", share.source());
        return object;
    }

    private static Map<String, Object> quench(Quench quench) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("acid", quench.acidName());
        object.put("pH", Numbers.rounded(quench.pH(), 2));
        object.put("amount", AmountsJson.portion(quench.acid()));
        object.put("heat_kJ", quench.heat().map(share -> Numbers.rounded(share.kiloJoule(), 5)).orElse(null));
        object.put("remarks", quench.sentences());
        return object;
    }

    private static Map<String, Object> parting(Parting parting) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("from", parting.other());
        object.put("windows", parting.windows().stream().map(window -> {
            Map<String, Object> range = new LinkedHashMap<>();
            range.put("from_pH", Numbers.rounded(window.fromPH(), 2));
            range.put("to_pH", Numbers.rounded(window.toPH(), 2));
            range.put("organic_layer", window.organicLayer());
            range.put("water_layer", window.water());
            return range;
        }).toList());
        object.put("best_pH", Numbers.rounded(parting.best().pH(), 2));
        object.put("sentence", parting.sentence());
        return object;
    }

    private static Map<String, Object> harmed(Molecule product, GroupHazard hazard) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("severity", hazard.severity().word());
        object.put("sentence", hazard.sentence());
        object.put("atoms", hazard.atoms().stream().map(product::label).toList());
        object.put("source", hazard.source());
        return object;
    }

    private static Double number(OptionalDouble value) {
        return value.isPresent() ? Numbers.rounded(value.getAsDouble(), 6) : null;
    }
}
