package lyate.report;

import java.util.LinkedHashMap;
import java.util.Map;
import lyate.review.Ranked;
import lyate.review.RankedAcid;
import lyate.review.RankedBase;

/**
 * A base or an acid and its place in a ranking.
 *
 * @param place  1 for the best
 * @param choice the base or acid, judged
 */
public record Placed(int place, Ranked choice) {

    /** The place as a JSON object. */
    public Map<String, Object> describe() {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("rank", place);
        object.put(choice instanceof RankedBase ? "base" : "acid", choice.reagent().id());
        object.put("name", choice.reagent().name());
        object.put("suits", choice.suits());
        object.put("why", choice.why());
        if (choice instanceof RankedBase base) {
            object.put("family", base.base().family().id());
            object.put("review", ReviewJson.describe(base.review()));
        } else if (choice instanceof RankedAcid acid) {
            object.put("protonation", ProtonationJson.describe(acid.protonation()));
        }
        return object;
    }
}
