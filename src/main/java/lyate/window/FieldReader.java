package lyate.window;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import lyate.sheet.RowException;
import lyate.sheet.RowException.Problem;
import lyate.sheet.StepReader;

/**
 * Turns typed text into the step that a row of a sheet with the same text means, or says by field what stands in the way.
 * Pure; safe to share between threads.
 */
final class FieldReader {

    /** What an empty field that must not be empty asks for. */
    private static final Map<StepField, String> WANTED = Map.of(StepField.SUBSTRATE, "type or paste a structure",
            StepField.BASE, "choose a base", StepField.SOLVENT, "choose a solvent");

    private final Supplier<StepReader> rows;

    /** @param rows asked when the first step is read */
    FieldReader(Supplier<StepReader> rows) {
        this.rows = rows;
    }

    StepReading read(StepText text) {
        try {
            return new StepReading(Optional.of(rows.get().read(StepCells.sheetOf(text).rows().get(0))), Map.of());
        } catch (RowException e) {
            Map<StepField, String> problems = new EnumMap<>(StepField.class);
            for (Problem problem : e.problems()) {
                StepField field = StepCells.field(problem.column());
                boolean blank = text.get(field).isEmpty() && WANTED.containsKey(field);
                problems.putIfAbsent(field, blank ? WANTED.get(field) : problem.reason());
            }
            return new StepReading(Optional.empty(), problems);
        }
    }
}
