package lyate.window;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import lyate.report.Words;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Named;
import lyate.stock.Solvent;
import lyate.window.Suggestions.Hit;

/** How things on the shelf are described where they are chosen. */
final class StockWords {

    private static final List<Medium> ORDER = List.of(Medium.WATER, Medium.DMSO, Medium.ACETONITRILE, Medium.THF);

    private static final int FIELD_LETTERS = 26;

    private StockWords() {}

    static Hit hit(Base base) {
        return hit(base, pKas(base));
    }

    static Hit hit(Solvent solvent) {
        return hit(solvent, boiling(solvent));
    }

    /** Under the name that is handy to read in a field, with all others after it. */
    private static Hit hit(Named thing, String value) {
        List<String> names = new ArrayList<>(thing.aliases());
        names.add(0, thing.name());
        String handy = names.stream().filter(name -> name.length() <= FIELD_LETTERS).findFirst().orElse(thing.name());
        names.remove(handy);
        return new Hit(handy, String.join(", ", names), value);
    }

    /** For example {@code pKaH 35.3 DMSO}: the strongest claim first would be a choice, so every known scale is named. */
    static String pKas(Base base) {
        String values = base.pKas().entrySet().stream()
                .sorted(Comparator.comparingInt((Map.Entry<Medium, KnownPKa> entry) -> ORDER.indexOf(entry.getKey()) < 0 ? ORDER.size() : ORDER.indexOf(entry.getKey())))
                .map(entry -> Words.oneDecimal(entry.getValue().pKa()) + " " + Words.medium(entry.getKey())).collect(Collectors.joining(", "));
        return values.isEmpty() ? "pKaH not known" : "pKaH " + values;
    }

    private static String boiling(Solvent solvent) {
        return String.format(Locale.ROOT, "bp %.0f \u00b0C", solvent.boilingPoint()).replace("-", "\u2212");
    }

    /** The line below the solvent field. */
    static String line(Solvent solvent) {
        return solvent.name() + ", " + boiling(solvent);
    }
}
