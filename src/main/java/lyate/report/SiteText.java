package lyate.report;

import java.io.IOException;
import java.util.Locale;
import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.molecule.Molecule;
import lyate.sheet.SiteSurvey.Answer;
import lyate.sheet.SiteSurvey.SitePKa;
import lyate.site.ProtonSite;
import lyate.site.SiteClass;

/** Proton sites for reading: what each is, which row of {@code site-classes.csv} says so, its pKa and where it is from. */
public final class SiteText implements ResultWriter<Answer> {

    private final Appendable out;
    private final String solvent;
    private final boolean explained;

    /** @param explained whether each pKa is taken apart */
    public SiteText(Appendable out, String solvent, boolean explained) {
        this.out = out;
        this.solvent = solvent;
        this.explained = explained;
    }

    @Override
    public void write(Answer answer) throws IOException {
        out.append(answer.question().text().strip());
        if (answer.molecule().isEmpty()) {
            out.append("\n  refused: ").append(answer.problem().replace("\n", "\n  ")).append("\n\n");
            return;
        }
        Molecule molecule = answer.molecule().get();
        out.append("  ").append(molecule.formula()).append(", in ").append(solvent).append('\n');
        for (String warning : molecule.warnings()) {
            out.append("  note: ").append(warning).append('\n');
        }
        if (!molecule.counterIons().isEmpty()) {
            out.append("  set aside: ").append(String.join(", ", molecule.counterIons())).append('\n');
        }
        if (answer.sites().isEmpty()) {
            out.append("  no proton site\n");
        }
        for (SitePKa site : answer.sites()) {
            write(molecule, site);
        }
        out.append('\n');
    }

    private void write(Molecule molecule, SitePKa found) throws IOException {
        ProtonSite site = found.site();
        SiteClass row = site.siteClass();
        out.append(String.format(Locale.ROOT, "  %-4s  %-5s %s  %s\n", site.role().word(), molecule.label(site.atom()),
                value(found.acidity()), row.name()));
        out.append(String.format(Locale.ROOT, "%14s%d H on %s; class %s, %s\n", "", site.hydrogens(), atoms(molecule, site),
                row.id(), row.pattern().smarts()));
        if (found.acidity().isPresent()) {
            out.append(" ".repeat(14)).append(found.acidity().get().source()).append('\n');
            if (explained) {
                RecipeText.write(Recipe.of(found.acidity().get(), molecule::label), " ".repeat(14), out);
            }
        }
    }

    private static String value(Optional<Acidity> acidity) {
        return acidity.map(value -> String.format(Locale.ROOT, "pKa %6s ± %-4s %-11s", Numbers.fixed(value.pKa(), 2),
                Numbers.fixed(value.sigma(), 2), value.basis().word())).orElse("pKa not known            ");
    }

    private static String atoms(Molecule molecule, ProtonSite site) {
        return String.join(" ", site.equivalent().stream().map(molecule::label).toList());
    }
}
