package lyate.report;

import java.util.LinkedHashMap;
import java.util.Map;
import lyate.review.RankedBase;

/**
 * A base and its place in a ranking.
 *
 * @param place 1 for the best
 * @param base  the base, judged
 */
public record Placed(int place, RankedBase base) {

    /** The place as a JSON object. */
    public Map<String, Object> describe() {
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("rank", place);
        object.put("base", base.base().id());
        object.put("name", base.base().name());
        object.put("why", base.why());
        object.put("review", ReviewJson.describe(base.review()));
        return object;
    }
}
