package lyate.bench;

import java.util.List;
import lyate.review.Finding.Severity;

/**
 * A group that the water of a work-up would hurt.
 *
 * @param group    what it is
 * @param atoms    indices of its atoms, one for each such group
 * @param pH       pH beyond which harm begins
 * @param acid     whether harm begins below that pH; otherwise above it
 * @param severity how much it matters
 * @param sentence what happens
 * @param source   citation
 */
public record GroupHazard(String group, List<Integer> atoms, double pH, boolean acid, Severity severity, String sentence,
                          String source) {

    public GroupHazard {
        atoms = List.copyOf(atoms);
    }
}
