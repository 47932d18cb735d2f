package lyate.review;

import java.util.List;
import java.util.Locale;

/**
 * One thing the user should know about a step.
 *
 * @param severity how much it matters
 * @param kind     stable code
 * @param sentence one sentence for the user
 * @param evidence numbers and facts behind it
 * @param atoms    substrate atoms it is about (indices); may be empty
 * @param source   citation, or the rule it follows from
 */
public record Finding(Severity severity, FindingKind kind, String sentence, List<String> evidence,
                      List<Integer> atoms, String source) {

    /** How much a finding matters, most severe first. */
    public enum Severity {
        STOP, CAUTION, NOTE;

        /** The word used in output. */
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    public Finding {
        evidence = List.copyOf(evidence);
        atoms = List.copyOf(atoms);
    }
}
