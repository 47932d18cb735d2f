package lyate.fit;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.MeasuredAcidities.Value;

/** Finds the row of {@code measured-acidities.csv} that states a training value, so that an estimate can quote it. */
final class MeasuredRows {

    private static final double SAME = 0.3;

    private final Map<String, List<Value>> byCompound = new HashMap<>();

    private MeasuredRows() {}

    /** Looks rows up in a table. */
    static MeasuredRows of(MeasuredAcidities table) {
        MeasuredRows rows = new MeasuredRows();
        table.values().forEach(value -> rows.byCompound
                .computeIfAbsent(value.molecule().canonicalKey(), key -> new ArrayList<>()).add(value));
        return rows;
    }

    /** Quotes nothing. */
    static MeasuredRows none() {
        return new MeasuredRows();
    }

    /** Id of the row for the same compound, medium, role and value; empty where there is none. */
    String idOf(TrainingRow row) {
        return byCompound.getOrDefault(row.compound(), List.of()).stream()
                .filter(value -> value.acidity().medium().equals(row.medium()) && value.role() == row.site().series().role()
                        && Math.abs(value.acidity().pKa() - row.pKa()) <= SAME)
                .map(value -> value.row().id()).findFirst().orElse("");
    }
}
