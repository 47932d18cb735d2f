package lyate.report;

import java.io.IOException;
import lyate.review.AcidStep;
import lyate.review.Protonation;
import lyate.review.Protonation.Uptake;

/** A protonation for reading. */
public final class ProtonationText implements ResultWriter<Protonation> {

    private final FindingText out;

    public ProtonationText(Appendable out) {
        this.out = new FindingText(out);
    }

    @Override
    public void write(Protonation protonation) throws IOException {
        AcidStep step = protonation.step();
        out.line("%s (%s): %s", protonation.verdict().code(), protonation.probabilityInWords(), protonation.meaning());
        out.stops(protonation.findings());
        out.line("");
        out.line("  substrate      %s", ReviewText.asGiven(step.substrate()));
        for (String warning : step.substrate().warnings()) {
            out.line("                 %s", warning);
        }
        out.line("  intended site  %s takes a proton", protonation.intendedSite());
        out.line("  first to take  %s", protonation.firstSite());
        out.line("  acid           %s, %s equiv", step.acid().name(), Numbers.fixed(step.equivalents(), 2));
        out.line("  conditions     %s, %s °C, %s M", step.solvent().name(), Numbers.fixed(step.temperatureCelsius(), 0),
                Numbers.fixed(step.concentrationMolar(), 2));
        out.line("  log K          %s at the intended site (difference of the pKa in water); %s %% of it protonated, at most %s %% of any other",
                Numbers.fixed(protonation.logK(), 1), Numbers.fixed(protonation.intendedPercent(), 1), Numbers.fixed(protonation.otherPercent(), 1));
        out.line("");
        out.line("  %-10s %9s %5s  %-11s %7s %12s", "site", "pKa (BH+)", "±", "basis", "log K", "% protonated");
        for (Uptake uptake : protonation.uptakes()) {
            out.line("  %-10s %9s %5s  %-11s %7s %12s", uptake.site(), Numbers.fixed(uptake.acidity().pKa(), 1),
                    Numbers.fixed(uptake.acidity().sigma(), 1), uptake.acidity().basis().word(), Numbers.fixed(uptake.logK(), 1),
                    Numbers.fixed(uptake.percentProtonated(), 1));
        }
        out.findings(protonation.findings());
        out.list("Why", protonation.explanation());
        out.list("Assumed", protonation.assumptions());
    }
}
