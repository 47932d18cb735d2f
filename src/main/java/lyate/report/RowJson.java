package lyate.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lyate.bench.Amounts;
import lyate.sheet.ReviewedRow;
import lyate.sheet.StepScale;

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
        reviewed.review().ifPresentOrElse(review -> {
            object.put("review", ReviewJson.describe(review));
            StepScale scale = StepScale.of(reviewed.row(), review.step().substrate());
            scale.batch().ifPresent(batch -> object.put("amounts", AmountsJson.describe(Amounts.of(review, batch, scale.titrated()))));
        }, () -> object.put("problem", reviewed.problem()));
        return object;
    }
}
