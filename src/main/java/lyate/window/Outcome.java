package lyate.window;

import java.util.Map;
import java.util.Optional;

/**
 * What became of a typed step.
 *
 * @param text     the step it belongs to
 * @param shown    what to show, where the step could be judged
 * @param problems what is wrong, by field
 */
record Outcome(StepText text, Optional<Shown> shown, Map<StepField, String> problems) {

    Outcome {
        problems = Map.copyOf(problems);
    }
}
