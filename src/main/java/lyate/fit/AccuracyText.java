package lyate.fit;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import lyate.acidity.lfer.Spread.Curve;
import lyate.fit.CrossValidation.Outcome;
import lyate.stock.Medium;

/** The report of the cross-validation, as Markdown. */
final class AccuracyText {

    private static final int WORST = 15;

    private AccuracyText() {}

    static String of(List<Outcome> outcomes, Map<Medium, Map<String, Curve>> spread, TrainingFiles files, ModelFit fit) {
        StringBuilder text = new StringBuilder("# Cross-validation of the linear free-energy relationships\n\n");
        text.append(String.format(Locale.ROOT, "Made by `lyate.fit.Fit`. %d-fold, by compound; nothing measured of a held-out compound, in any "
                + "file, is seen by the fit that estimates it. %d values with a named site, %d without (of which the final fit could place %d).%n%n",
                CrossValidation.FOLDS, files.placed.size(), files.unplaced.size(),
                fit.pools().stream().flatMap(pool -> pool.rows.stream()).filter(row -> !row.named()).count()));
        spread.forEach((medium, curves) -> addMedium(text, medium, SpreadFit.in(medium, outcomes), curves));
        return text.toString().replace(System.lineSeparator(), "\n");
    }

    private static void addMedium(StringBuilder text, Medium medium, List<Outcome> outcomes, Map<String, Curve> curves) {
        text.append("## ").append(medium.id()).append("\n\n| class | n | RMSE | median abs. error | within 1 sigma | within 2 sigma | RMSE, sound rows |\n")
                .append("| --- | ---: | ---: | ---: | ---: | ---: | ---: |\n");
        add(text, "all rows", outcomes, curves);
        List<Outcome> plausible = outcomes.stream().filter(outcome -> outcome.row().plausible()).toList();
        if (plausible.size() < outcomes.size()) {
            add(text, "all but values that contradict chemistry", plausible, curves);
        }
        Map<String, List<Outcome>> byKind = outcomes.stream()
                .collect(Collectors.groupingBy(outcome -> outcome.row().kind(), TreeMap::new, Collectors.toList()));
        byKind.entrySet().stream().sorted(Comparator.comparingInt(entry -> -entry.getValue().size()))
                .forEach(entry -> add(text, entry.getKey(), entry.getValue(), curves));
        text.append("\nWorst rows:\n\n| molecule | site | measured | estimated |\n| --- | --- | ---: | ---: |\n");
        outcomes.stream().sorted(Comparator.comparingDouble(outcome -> -Math.abs(outcome.error()))).limit(WORST)
                .forEach(outcome -> text.append(String.format(Locale.ROOT, "| `%s` | %s | %.2f | %.2f |%n", outcome.row().smiles(),
                        outcome.row().label(), outcome.row().pKa(), outcome.estimated())));
        text.append('\n');
    }

    private static void add(StringBuilder text, String name, List<Outcome> outcomes, Map<String, Curve> curves) {
        text.append(String.format(Locale.ROOT, "| %s | %d | %.2f | %.2f | %.0f %% | %.0f %% | %.2f |%n", name, outcomes.size(),
                SpreadFit.rootMeanSquare(outcomes), SpreadFit.medianError(outcomes),
                100 * SpreadFit.coverage(curves, outcomes, 1), 100 * SpreadFit.coverage(curves, outcomes, 2),
                SpreadFit.rootMeanSquare(outcomes.stream().filter(outcome -> outcome.row().plausible()).toList())));
    }
}
