package lyate.window;

import java.util.Map;
import java.util.Optional;
import lyate.review.Step;

/**
 * What a typed step turned out to be.
 *
 * @param step     the step, where every field could be read
 * @param problems what is wrong, by field
 */
record StepReading(Optional<Step> step, Map<StepField, String> problems) {

    StepReading {
        problems = Map.copyOf(problems);
    }
}
