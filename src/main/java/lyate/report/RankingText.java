package lyate.report;

import java.io.IOException;
import java.util.Locale;

/** A ranking of bases or acids for reading. */
public final class RankingText implements ResultWriter<Placed> {

    private final Appendable out;

    public RankingText(Appendable out) {
        this.out = out;
    }

    @Override
    public void write(Placed placed) throws IOException {
        out.append(String.format(Locale.ROOT, "%3d  %-36s %-12s log K %6s\n     %s\n", placed.place(), placed.choice().reagent().name(),
                placed.choice().judgement().verdict().code(), Numbers.fixed(placed.choice().judgement().logK(), 1), placed.choice().why()));
    }
}
