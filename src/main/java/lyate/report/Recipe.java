package lyate.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.function.IntFunction;
import lyate.acidity.Acidity;
import lyate.acidity.Acidity.Alternative;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Relative;

/**
 * A pKa taken apart, line by line: what it adds up from, the other ways to it, what was missing, the nearest measured
 * relatives, and where the uncertainty comes from. The command line and the window show the same lines.
 *
 * @param lines in reading order
 */
public record Recipe(List<Line> lines) {

    /** What a line is about. */
    public enum Part {
        CONTRIBUTION, PKA, OTHER_WAY, MISSING, RELATIVE, UNCERTAINTY;

        /** The word used in output. */
        public String word() {
            return name().toLowerCase(Locale.ROOT).replace('_', '-');
        }
    }

    /**
     * One line.
     *
     * @param part   what it is about
     * @param effect kind of effect of a contribution; for the pKa how it was obtained; else empty
     * @param value  pKa units; empty where the line is words alone
     * @param sigma  standard uncertainty, pKa units; empty where none is stated
     * @param atoms  labels of the atoms it comes from; for a relative the label of its own site
     * @param text   what it is
     * @param source citation or method; empty where the text says it all
     */
    public record Line(Part part, String effect, OptionalDouble value, OptionalDouble sigma, List<String> atoms, String text,
                       String source) {

        public Line {
            atoms = List.copyOf(atoms);
        }
    }

    public Recipe {
        lines = List.copyOf(lines);
    }

    /** The recipe of a value; {@code label} names the atoms of its molecule. */
    public static Recipe of(Acidity acidity, IntFunction<String> label) {
        List<Line> lines = new ArrayList<>();
        for (Contribution term : acidity.contributions()) {
            lines.add(new Line(Part.CONTRIBUTION, effect(term), OptionalDouble.of(term.value()), OptionalDouble.empty(),
                    term.atoms().stream().map(label::apply).toList(), term.text(), ""));
        }
        lines.add(new Line(Part.PKA, acidity.basis().word(), OptionalDouble.of(acidity.pKa()), OptionalDouble.of(acidity.sigma()),
                List.of(), "in " + acidity.medium().symbol(), acidity.source()));
        for (Alternative way : acidity.alternatives()) {
            lines.add(new Line(Part.OTHER_WAY, "", OptionalDouble.of(way.pKa()), OptionalDouble.of(way.sigma()), List.of(), way.text(), ""));
        }
        for (String words : acidity.missing()) {
            lines.add(new Line(Part.MISSING, "", OptionalDouble.empty(), OptionalDouble.empty(), List.of(), words, ""));
        }
        for (Relative relative : acidity.relatives()) {
            lines.add(new Line(Part.RELATIVE, "", OptionalDouble.of(relative.pKa()), OptionalDouble.empty(), List.of(relative.site()),
                    relative.smiles() + ", " + Math.round(100 * relative.similarity()) + " % alike", relative.source()));
        }
        lines.add(new Line(Part.UNCERTAINTY, "", OptionalDouble.empty(), OptionalDouble.of(acidity.sigma()), List.of(), acidity.spread(), ""));
        return new Recipe(lines);
    }

    /** For example {@code hydrogen bond}. */
    private static String effect(Contribution term) {
        return term.effect().name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
