package lyate.report;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.molecule.Molecule;
import lyate.sheet.SiteSurvey.Answer;
import lyate.sheet.SiteSurvey.SitePKa;
import lyate.site.ProtonSite;

/**
 * One line per proton site. A structure that is refused, or has no site, has one line that says so in {@code basis}
 * ({@code refused} with the reason as {@code source}, or {@code no-site}), so that no row is lost.
 */
public final class SiteCsv implements ResultWriter<Answer> {

    private static final List<String> COLUMNS = List.of("row", "input", "role", "site", "element", "hydrogens", "site_class",
            "solvent", "pka", "sigma", "basis", "source");

    private final SafeCsv csv;
    private final String solvent;

    /** Writes the header line at once. */
    public SiteCsv(Appendable out, String solvent) throws IOException {
        this.csv = new SafeCsv(out);
        this.solvent = solvent;
        csv.row(COLUMNS);
    }

    @Override
    public void write(Answer answer) throws IOException {
        if (answer.molecule().isEmpty()) {
            csv.row(withoutSite(answer, "refused", answer.problem().replace('\n', ' ')));
        } else if (answer.sites().isEmpty()) {
            csv.row(withoutSite(answer, "no-site", ""));
        }
        for (SitePKa site : answer.sites()) {
            csv.row(line(answer, answer.molecule().get(), site));
        }
    }

    private List<String> withoutSite(Answer answer, String basis, String source) {
        return List.of(number(answer), input(answer), "", "", "", "", "", solvent, "", "", basis, source);
    }

    private List<String> line(Answer answer, Molecule molecule, SitePKa found) {
        ProtonSite site = found.site();
        Optional<Acidity> acidity = found.acidity();
        return List.of(number(answer), input(answer), site.role().word(), molecule.label(site.atom()),
                molecule.symbol(site.atom()), Integer.toString(site.hydrogens()), site.siteClass().id(), solvent,
                acidity.map(value -> Numbers.fixed(value.pKa(), 2)).orElse(""),
                acidity.map(value -> Numbers.fixed(value.sigma(), 2)).orElse(""),
                acidity.map(value -> value.basis().word()).orElse(""), acidity.map(Acidity::source).orElse(""));
    }

    private static String number(Answer answer) {
        return Integer.toString(answer.question().number());
    }

    private static String input(Answer answer) {
        return answer.question().text().strip();
    }
}
