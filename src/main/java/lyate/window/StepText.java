package lyate.window;

import java.util.EnumMap;
import java.util.Map;

/**
 * A step as it is typed: the text of every field, and the intended site.
 *
 * @param fields text by field, all fields present
 * @param site   label of the intended site; empty: the most acidic one
 */
record StepText(Map<StepField, String> fields, String site) {

    StepText {
        Map<StepField, String> all = new EnumMap<>(StepField.class);
        for (StepField field : StepField.values()) {
            all.put(field, trimmed(fields.getOrDefault(field, "")));
        }
        fields = Map.copyOf(all);
    }

    /** An invented step that shows a conflict: the phenol takes the hydride that is meant for the anilide. */
    static StepText demo() {
        return new StepText(Map.of(
                StepField.SUBSTRATE, "O=C(C1CCC1)Nc1ccc(C)c(O)c1",
                StepField.BASE, "NaH",
                StepField.EQUIVALENTS, "1.05",
                StepField.SOLVENT, "DMF",
                StepField.TEMPERATURE, "0"), "N7");
    }

    /** Blanks at the ends say nothing, except in a molfile, whose first lines may be empty. */
    private static String trimmed(String text) {
        return text.contains("\n") ? text : text.strip();
    }

    String get(StepField field) {
        return fields.get(field);
    }

    StepText with(StepField field, String text) {
        Map<StepField, String> changed = new EnumMap<>(fields);
        changed.put(field, text);
        return new StepText(changed, site);
    }

    StepText withSite(String label) {
        return new StepText(fields, label);
    }
}
