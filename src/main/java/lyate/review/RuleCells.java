package lyate.review;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.Column;
import lyate.table.NearestNames;
import lyate.table.Row;
import lyate.table.TableProblem;

/** The cells that every table of rules has, and the checks that go beyond the schema. */
final class RuleCells {

    /** The severity word of a row that keeps an earlier, more general row quiet. */
    static final String SILENT = "silent";

    /** Locants and prefixes that stay as they are, then the letter that takes the capital. */
    private static final Pattern FRONT = Pattern.compile("((?:(?:n|sec|tert|o|m|p)-|(?:N,)*N-|[^A-Za-z])*)([a-z])");

    private final Set<String> baseWords;
    private final Set<String> solventWords;
    private final Set<String> acidWords;
    private final List<TableProblem> problems;

    RuleCells(Stockroom stockroom, List<TableProblem> problems) {
        this.baseWords = stockroom.bases().stream().flatMap(base -> List.of(base.id(), base.family().id()).stream())
                .collect(Collectors.toSet());
        this.solventWords = stockroom.solvents().stream().map(Solvent::id).collect(Collectors.toSet());
        Arrays.stream(Solvent.Kind.values()).map(Surroundings::word).forEach(solventWords::add);
        this.acidWords = stockroom.acids().stream().map(Acid::id).collect(Collectors.toSet());
        this.problems = problems;
    }

    static Column kind() {
        return Column.word("kind", Arrays.stream(FindingKind.values()).map(FindingKind::code).toArray(String[]::new));
    }

    static Column severity() {
        return Column.word("severity", "stop", "caution", "note", SILENT);
    }

    static FindingKind kind(Row row) {
        return FindingKind.valueOf(row.text("kind").toUpperCase(Locale.ROOT).replace('-', '_'));
    }

    /** Severity of the row, or empty for a silent one. */
    static Optional<Finding.Severity> severity(Row row) {
        String word = row.text("severity");
        return word.equals(SILENT) ? Optional.empty() : Optional.of(Finding.Severity.valueOf(word.toUpperCase(Locale.ROOT)));
    }

    /** Ids of the acids a row names. */
    List<String> acids(Row row) {
        return known(row, "acids", acidWords);
    }

    /** Solvents a row names, at any temperature. */
    Surroundings solvents(Row row) {
        return new Surroundings(known(row, "solvents", solventWords), OptionalDouble.empty(), OptionalDouble.empty());
    }

    Surroundings surroundings(Row row) {
        return new Surroundings(known(row, "solvents", solventWords), row.number("temperature_from"), row.number("temperature_to"));
    }

    BaseCondition families(Row row) {
        return new BaseCondition(known(row, "bases", baseWords), "", Optional.empty(),
                OptionalDouble.empty(), OptionalDouble.empty());
    }

    BaseCondition base(Row row) {
        boolean limited = row.has("pka_at_least") || row.has("pka_at_most");
        if (limited != row.has("pka_scale")) {
            problems.add(row.problem("pka_scale", limited ? "water or dmso beside a strength limit" : "a strength limit beside the scale"));
        }
        return new BaseCondition(known(row, "bases", baseWords), row.text("nucleophilicity"),
                row.has("pka_scale") ? Optional.of(new Medium(row.text("pka_scale"))) : Optional.empty(),
                row.number("pka_at_least"), row.number("pka_at_most"));
    }

    private List<String> known(Row row, String column, Set<String> words) {
        List<String> found = new ArrayList<>(row.list(column));
        for (String entry : found) {
            String word = entry.startsWith("!") ? entry.substring(1) : entry;
            if (!words.contains(word)) {
                problems.add(row.problem(column, "known ids instead of " + word + ", nearest: "
                        + String.join(", ", NearestNames.of(word, words, 3))));
            }
        }
        return found;
    }

    /** A sentence of a table with the names of the step put in; a name at its front gets its capital: n-Butyllithium. */
    static String fill(String sentence, Base base, Solvent solvent) {
        return fill(sentence, "{base}", base.name(), solvent);
    }

    /** The same for a sentence about an acid. */
    static String fill(String sentence, Acid acid, Solvent solvent) {
        return fill(sentence, "{acid}", acid.name(), solvent);
    }

    private static String fill(String sentence, String placeholder, String name, Solvent solvent) {
        String filled = sentence.replace(placeholder, name).replace("{solvent}", solvent.name());
        return sentence.startsWith("{") ? capital(filled) : filled;
    }

    /** The text with a capital where its first word begins: n-Butyllithium. */
    static String capital(String text) {
        Matcher front = FRONT.matcher(text);
        return front.lookingAt() ? front.group(1) + front.group(2).toUpperCase(Locale.ROOT) + text.substring(front.end()) : text;
    }
}
