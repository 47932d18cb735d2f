package lyate.review;

/**
 * Something else than the wanted proton transfer that a step does.
 *
 * @param ruleId  row of {@code side-reactions.csv} that says so
 * @param finding what the user is told
 * @param wins    whether it beats the proton transfer, so that the step cannot work as written
 */
public record SideReaction(String ruleId, Finding finding, boolean wins) {}
