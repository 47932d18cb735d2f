package lyate.review;

import java.util.Locale;
import java.util.Optional;
import lyate.review.VerdictRule.World;

/** Says how far the intended site's pKa may be off before the verdict changes. */
final class VerdictMargin {

    private static final double STEP = 0.1;
    private static final double FARTHEST = 6;

    private VerdictMargin() {}

    /** For example {@code 0.4 pKa units more at C3 and this becomes partial}; empty where nothing near changes it. */
    static Optional<String> sentence(World world, String label) {
        Verdict now = VerdictRule.judge(world);
        for (int i = 1; i * STEP <= FARTHEST; i++) {
            double shift = i * STEP;
            Verdict more = VerdictRule.judge(shifted(world, -shift));
            Verdict less = VerdictRule.judge(shifted(world, shift));
            if (more != now) {
                return Optional.of(say(shift, "more", label, more));
            }
            if (less != now) {
                return Optional.of(say(shift, "less", label, less));
            }
        }
        return Optional.empty();
    }

    private static World shifted(World world, double byLogK) {
        double[] logK = world.logK().clone();
        logK[world.intended()] += byLogK;
        return world.withLogK(logK);
    }

    private static String say(double shift, String direction, String label, Verdict becomes) {
        return String.format(Locale.ROOT, "%.1f pKa units %s at %s and this becomes %s", shift, direction, label, becomes.code());
    }
}
