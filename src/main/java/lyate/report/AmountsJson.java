package lyate.report;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import lyate.bench.Amounts;
import lyate.bench.Amounts.Spent;
import lyate.bench.Portion;

/** What to weigh and measure out, as a JSON object. */
public final class AmountsJson {

    private static final int DECIMALS = 6;

    private AmountsJson() {}

    public static Map<String, Object> describe(Amounts amounts) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("substrate_mmol", rounded(amounts.batch().milliMole()));
        object.put("substrate_g", rounded(amounts.batch().grams()));
        object.put("solvent_mL", rounded(amounts.solventMilliLitre()));
        object.put("water_mmol", rounded(amounts.waterMilliMole()));
        object.put("base", portion(amounts.base()));
        object.put("base_needed", portion(amounts.baseNeeded()));
        object.put("excess_mmol", rounded(amounts.excess()));
        object.put("protons", amounts.spending().stream().map(AmountsJson::proton).toList());
        object.put("warnings", amounts.warnings());
        return object;
    }

    private static Map<String, Object> proton(Spent spent) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("what", spent.what());
        object.put("mmol", rounded(spent.milliMole()));
        return object;
    }

    static Map<String, Object> portion(Portion portion) {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("mmol", rounded(portion.milliMole()));
        object.put("g", rounded(portion.grams()));
        object.put("mL", rounded(portion.milliLitre()));
        object.put("form", portion.form());
        return object;
    }

    private static Double rounded(OptionalDouble value) {
        return value.isPresent() ? rounded(value.getAsDouble()) : null;
    }

    private static Double rounded(double value) {
        return Numbers.rounded(value, DECIMALS);
    }
}
