package lyate.report;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.acidity.Acidity;
import lyate.molecule.Molecule;
import lyate.report.Recipe.Line;
import lyate.sheet.SiteSurvey.Answer;
import lyate.sheet.SiteSurvey.SitePKa;

/**
 * One line for each part of the recipe of each proton site; {@code part} says what the line is about. A structure that is
 * refused, has no site, or a site nothing is known of, has one line that says so in {@code part}.
 */
public final class RecipeCsv implements ResultWriter<Answer> {

    private static final List<String> COLUMNS = List.of("row", "input", "role", "site", "site_class", "solvent", "part", "effect",
            "value", "sigma", "atoms", "text", "source");

    private final SafeCsv csv;
    private final String solvent;

    /** Writes the header line at once. */
    public RecipeCsv(Appendable out, String solvent) throws IOException {
        this.csv = new SafeCsv(out);
        this.solvent = solvent;
        csv.row(COLUMNS);
    }

    @Override
    public void write(Answer answer) throws IOException {
        if (answer.molecule().isEmpty()) {
            csv.row(without(answer, "", "", "", "refused", answer.problem().replace('\n', ' ')));
        } else if (answer.sites().isEmpty()) {
            csv.row(without(answer, "", "", "", "no-site", ""));
        }
        for (SitePKa site : answer.sites()) {
            write(answer, answer.molecule().get(), site);
        }
    }

    private void write(Answer answer, Molecule molecule, SitePKa found) throws IOException {
        String role = found.site().role().word();
        String label = molecule.label(found.site().atom());
        String siteClass = found.site().siteClass().id();
        Optional<Acidity> acidity = found.acidity();
        if (acidity.isEmpty()) {
            csv.row(without(answer, role, label, siteClass, "not-known", ""));
            return;
        }
        for (Line line : Recipe.of(acidity.get(), molecule::label).lines()) {
            csv.row(List.of(number(answer), input(answer), role, label, siteClass, solvent, line.part().word(), line.effect(),
                    decimal(line.value()), decimal(line.sigma()), String.join(" ", line.atoms()), line.text(), line.source()));
        }
    }

    private List<String> without(Answer answer, String role, String label, String siteClass, String part, String text) {
        return List.of(number(answer), input(answer), role, label, siteClass, solvent, part, "", "", "", "", text, "");
    }

    private static String decimal(OptionalDouble value) {
        return value.isPresent() ? Numbers.fixed(value.getAsDouble(), 2) : "";
    }

    private static String number(Answer answer) {
        return Integer.toString(answer.question().number());
    }

    private static String input(Answer answer) {
        return answer.question().text().strip();
    }
}
