package lyate.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lyate.sheet.ReviewedRow;

/** A reviewed row as a JSON object: its cells as given, then the review or the reason there is none. */
public final class RowJson {

    private RowJson() {}

    /** The object of one row. */
    public static Map<String, Object> describe(ReviewedRow reviewed) {
        Map<String, Object> given = new LinkedHashMap<>();
        List<String> names = reviewed.row().header().names();
        for (int i = 0; i < names.size(); i++) {
            given.putIfAbsent(names.get(i), reviewed.row().cells().get(i));
        }
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("row", reviewed.row().number());
        object.put("given", given);
        reviewed.review().ifPresentOrElse(review -> object.put("review", ReviewJson.describe(review)),
                () -> object.put("problem", reviewed.problem()));
        return object;
    }
}
