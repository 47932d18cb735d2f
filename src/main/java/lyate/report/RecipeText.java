package lyate.report;

import java.io.IOException;
import java.util.Locale;
import lyate.report.Recipe.Line;

/** A recipe as indented lines of text. */
final class RecipeText {

    private RecipeText() {}

    static void write(Recipe recipe, String indent, Appendable out) throws IOException {
        boolean first = true;
        for (Line line : recipe.lines()) {
            out.append(indent).append(words(line, first)).append('\n');
            first = false;
        }
    }

    private static String words(Line line, boolean first) {
        String source = line.source().isEmpty() ? "" : " (" + line.source() + ")";
        return switch (line.part()) {
            case CONTRIBUTION -> String.format(Locale.ROOT, first ? "%7.2f" : "%+7.2f", line.value().getAsDouble())
                    + "  " + String.format(Locale.ROOT, "%-14s", line.effect()) + line.text() + atoms(line);
            case PKA -> String.format(Locale.ROOT, "%7.2f  ", line.value().getAsDouble()) + "pKa " + line.text() + ", " + line.effect();
            case OTHER_WAY -> "another way: " + value(line) + ", " + line.text();
            case MISSING -> "missing: " + line.text();
            case RELATIVE -> "measured relative: " + Numbers.fixed(line.value().getAsDouble(), 2) + " at " + String.join(" ", line.atoms())
                    + " of " + line.text() + source;
            case UNCERTAINTY -> "uncertainty: " + Numbers.fixed(line.sigma().getAsDouble(), 2) + ", " + line.text();
        };
    }

    private static String value(Line line) {
        return Numbers.fixed(line.value().getAsDouble(), 2) + " ± " + Numbers.fixed(line.sigma().getAsDouble(), 2);
    }

    private static String atoms(Line line) {
        return line.atoms().isEmpty() ? "" : "  [" + String.join(" ", line.atoms()) + "]";
    }
}
