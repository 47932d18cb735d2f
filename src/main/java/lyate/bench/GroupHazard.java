package lyate.bench;

import java.util.List;
import lyate.review.Finding.Severity;

/**
 * A group that the water of a work-up would hurt.
 *
 * @param atoms    indices of its atoms, one for each such group
 * @param acid     whether acid does it; otherwise base, or water as such
 * @param severity how much it matters
 * @param sentence what happens
 * @param source   citation
 */
public record GroupHazard(List<Integer> atoms, boolean acid, Severity severity, String sentence, String source) {

    public GroupHazard {
        atoms = List.copyOf(atoms);
    }
}
