package lyate.acidity.lfer;

import java.util.List;
import lyate.acidity.Acidity.Effect;

/**
 * One descriptor of a site with the size it has there.
 *
 * @param name   the descriptor, for example {@code ring.para.resonance}
 * @param effect which effect on acidity it stands for
 * @param value  its size, dimensionless
 * @param atoms  atoms it comes from
 * @param note   what was found there, for example {@code nitro}; empty where the name says it all
 */
public record Term(String name, Effect effect, double value, List<Integer> atoms, String note) {

    /** The size in steps that are typical of the descriptor ({@link Scales}). */
    double scaled() {
        return value / Scales.of(name);
    }
}
