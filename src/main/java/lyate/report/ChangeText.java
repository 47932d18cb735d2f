package lyate.report;

import java.io.IOException;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import lyate.report.RowChange.Kind;

/** Changes between two reviews of a route for reading: how many, then every step that is not the same. */
public final class ChangeText {

    private final Appendable out;

    public ChangeText(Appendable out) {
        this.out = out;
    }

    /** Writes them all. */
    public void write(List<RowChange> changes) throws IOException {
        Map<Kind, Integer> counts = new EnumMap<>(Kind.class);
        changes.forEach(change -> counts.merge(change.kind(), 1, Integer::sum));
        List<String> words = counts.entrySet().stream().map(entry -> entry.getValue() + " " + entry.getKey().words()).toList();
        out.append(changes.size() + (changes.size() == 1 ? " step" : " steps") + (words.isEmpty() ? "" : ": ") + String.join("; ", words)).append('\n');
        for (RowChange change : changes) {
            if (change.kind() != Kind.SAME) {
                step(change);
            }
        }
    }

    private void step(RowChange change) throws IOException {
        out.append('\n').append(change.step()).append("  ").append(switch (change.kind()) {
            case ADDED -> "added: " + change.verdictAfter();
            case REMOVED -> "removed: " + change.verdictBefore();
            case VERDICT -> change.verdictBefore() + " \u2192 " + change.verdictAfter();
            case DETAILS, SAME -> change.verdictAfter() + ", " + change.kind().words();
        }).append('\n');
        for (String reason : change.why()) {
            out.append("    ").append(reason.replace('\u00a0', ' ')).append('\n');
        }
    }
}
