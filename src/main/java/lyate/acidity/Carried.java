package lyate.acidity;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lyate.acidity.Acidity.Basis;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.stock.Medium;

/** Writes down how a value came into another medium. */
final class Carried {

    private Carried() {}

    /**
     * The value in its new medium, with one contribution of the medium however many steps there were.
     *
     * @param path which relation was used, in words
     */
    static Acidity of(Acidity value, double pKa, double sigma, Medium to, String path, List<String> missing) {
        List<Contribution> contributions = new ArrayList<>(value.contributions());
        String text = "carried over: " + path;
        double shift = pKa - value.pKa();
        int last = contributions.size() - 1;
        if (last >= 0 && contributions.get(last).effect() == Effect.MEDIUM) {
            Contribution before = contributions.remove(last);
            text = before.text() + ", then " + path;
            shift += before.value();
        }
        contributions.add(new Contribution(text, Effect.MEDIUM, shift, List.of()));
        String spread = String.format(Locale.ROOT, "%.2f in %s (%s), then %s, in quadrature", value.sigma(), value.medium().symbol(),
                value.spread(), path);
        return new Acidity(pKa, sigma, to, Basis.TRANSFERRED, contributions, missing, value.relatives(), spread, List.of(),
                value.source() + "; carried from " + value.medium().symbol() + " by " + path);
    }
}
