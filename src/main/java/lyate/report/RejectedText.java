package lyate.report;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import lyate.review.BaseChoice.BetterSolvent;
import lyate.review.BaseChoice.Rejected;

/** What stands under a ranking of bases: the kinds of which none would do, and a better solvent. */
public final class RejectedText {

    private final Appendable out;

    public RejectedText(Appendable out) {
        this.out = out;
    }

    /** Writes a line for each kind, then the solvent; nothing where there is nothing to say. */
    public void write(List<Rejected> rejected, Optional<BetterSolvent> better) throws IOException {
        if (!rejected.isEmpty()) {
            out.append("\nNone of these kinds would do; of each the one that comes nearest:\n");
        }
        for (Rejected family : rejected) {
            out.append(String.format(Locale.ROOT, "  %s (%d): %s\n", family.family().name(), family.count(), family.why()));
        }
        if (better.isPresent()) {
            out.append(String.format(Locale.ROOT, "\nThe solvent is the problem: in %s %s would do (log K %s).\n",
                    better.get().solvent().name(), better.get().base().base().name(), Numbers.fixed(better.get().base().review().logK(), 1)));
        }
    }
}
