package lyate.report;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import lyate.review.DoseResponse;

/** A dose curve for reading: a few doses, and the two that matter. */
public final class DoseText {

    private static final List<Double> SHOWN = List.of(0.5, 1.0, 1.5, 2.0, 3.0, 4.0);
    /** Sites that never lose more than this are left out. */
    private static final double WORTH_A_LINE_PERCENT = 0.5;

    private final Appendable out;

    public DoseText(Appendable out) {
        this.out = out;
    }

    /** Writes what becomes of each site as more base goes in. */
    public void write(DoseResponse dose, String intended) throws IOException {
        out.append("  Equivalents\n");
        for (String line : reached(dose, intended)) {
            out.append("    ").append(line).append('\n');
        }
        line("% gone at", SHOWN.stream().map(value -> String.format(Locale.ROOT, "%.1f", value)).toList());
        for (Map.Entry<String, List<Double>> site : dose.percentTaken().entrySet()) {
            if (site.getValue().stream().anyMatch(percent -> percent > WORTH_A_LINE_PERCENT)) {
                line(site.getKey(), SHOWN.stream().map(value -> String.format(Locale.ROOT, "%.0f", dose.percentAt(site.getKey(), value))).toList());
            }
        }
    }

    /** The two doses that matter, in one sentence. */
    static String milestones(DoseResponse dose, String intended) {
        return String.join("; ", reached(dose, intended)) + ".";
    }

    private static List<String> reached(DoseResponse dose, String intended) {
        String meant = reaches(intended + " is 95 % gone", dose.intendedReaches95(), dose);
        return dose.nextSite().map(next -> List.of(meant, reaches(next + ", the next to go, passes 5 %", dose.nextPasses5(), dose))).orElse(List.of(meant));
    }

    private void line(String name, List<String> cells) throws IOException {
        StringBuilder line = new StringBuilder(String.format(Locale.ROOT, "    %-10s", name));
        cells.forEach(cell -> line.append(String.format(Locale.ROOT, "%6s", cell)));
        out.append(line).append('\n');
    }

    private static String reaches(String what, OptionalDouble equivalents, DoseResponse dose) {
        return equivalents.isPresent() ? String.format(Locale.ROOT, "%s from %.2f equivalents", what, equivalents.getAsDouble())
                : String.format(Locale.ROOT, "%s at no dose up to %.0f equivalents", what, dose.highest());
    }
}
