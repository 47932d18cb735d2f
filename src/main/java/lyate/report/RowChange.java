package lyate.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.review.Review;
import lyate.review.Verdict;
import lyate.sheet.ReviewedRow;

/**
 * One step before and after.
 *
 * @param step   its name
 * @param before as it was; empty for a step that is new
 * @param after  as it is; empty for a step that is gone
 * @param kind   what changed
 * @param why    what differs in sheet, values and findings, most telling first
 */
public record RowChange(String step, Optional<ReviewedRow> before, Optional<ReviewedRow> after, Kind kind, List<String> why) {

    /** What changed, most important first. */
    public enum Kind {
        VERDICT("verdict changed"), ADDED("added"), REMOVED("removed"), DETAILS("same verdict, details changed"), SAME("same");

        private final String words;

        Kind(String words) {
            this.words = words;
        }

        /** As it is written. */
        public String words() {
            return words;
        }
    }

    public RowChange {
        why = List.copyOf(why);
    }

    /**
     * Sets two reviewed sheets side by side: steps of the same name belong together, in the order of the later sheet;
     * steps that are gone come last. Of several steps with one name the first belongs to the first, and so on.
     */
    public static List<RowChange> between(List<ReviewedRow> before, List<ReviewedRow> after) {
        Map<String, List<ReviewedRow>> left = new LinkedHashMap<>();
        before.forEach(row -> left.computeIfAbsent(row.row().name(), name -> new ArrayList<>()).add(row));
        List<RowChange> changes = new ArrayList<>();
        for (ReviewedRow row : after) {
            List<ReviewedRow> same = left.getOrDefault(row.row().name(), List.of());
            changes.add(of(same.isEmpty() ? Optional.empty() : Optional.of(same.remove(0)), Optional.of(row)));
        }
        left.values().forEach(gone -> gone.forEach(row -> changes.add(of(Optional.of(row), Optional.empty()))));
        return changes;
    }

    private static RowChange of(Optional<ReviewedRow> before, Optional<ReviewedRow> after) {
        String step = after.or(() -> before).orElseThrow().row().name();
        if (before.isEmpty() || after.isEmpty()) {
            return new RowChange(step, before, after, before.isEmpty() ? Kind.ADDED : Kind.REMOVED, List.of());
        }
        List<String> why = ChangeReasons.between(before.get(), after.get());
        boolean verdict = !verdict(before.get()).equals(verdict(after.get()));
        return new RowChange(step, before, after, verdict ? Kind.VERDICT : why.isEmpty() ? Kind.SAME : Kind.DETAILS, why);
    }

    private static Optional<Verdict> verdict(ReviewedRow row) {
        return row.review().map(Review::verdict);
    }

    /** Verdict code before; {@code not-judged} for a row that could not be, empty where there was no such step. */
    public String verdictBefore() {
        return before.map(RowChange::code).orElse("");
    }

    /** Verdict code after, as {@link #verdictBefore()}. */
    public String verdictAfter() {
        return after.map(RowChange::code).orElse("");
    }

    private static String code(ReviewedRow row) {
        return verdict(row).map(Verdict::code).orElse("not-judged");
    }
}
