package lyate.review;

import java.util.OptionalDouble;

/**
 * What a base and a solvent do to each other.
 *
 * @param ruleId          row of {@code base-solvent.csv} that says so
 * @param finding         what the user is told
 * @param destroysBase    whether the base is gone before it can do its work: the step is levelled
 * @param halfLifeMinutes published half-life of the base there, minutes, where known
 */
public record SolventEffect(String ruleId, Finding finding, boolean destroysBase, OptionalDouble halfLifeMinutes) {}
