package lyate.review;

/** Judges steps. Pure: same step, same review, on any thread. */
public interface Reviewer {

    /**
     * Judges one step.
     *
     * @throws ReviewException in words where the step cannot be judged, for example an intended site that carries no hydrogen
     */
    Review review(Step step) throws ReviewException;
}
