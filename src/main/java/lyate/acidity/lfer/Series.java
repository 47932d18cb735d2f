package lyate.acidity.lfer;

import lyate.molecule.AtomPattern;
import lyate.site.Role;

/**
 * A row of {@code estimate-series.csv}: sites that follow one linear free-energy relationship.
 *
 * @param id      stable name
 * @param name    what a chemist calls it
 * @param role    whether the site loses or gains the proton
 * @param line    the set of coefficients it uses; several series may share one
 * @param group   lines of one group lean on common coefficients
 * @param pattern SMARTS whose first atom is the site
 * @param lowest  lowest pKa in water that makes sense for it
 * @param highest highest pKa in water that makes sense for it
 */
public record Series(String id, String name, Role role, String line, String group, AtomPattern pattern,
                     double lowest, double highest) {}
