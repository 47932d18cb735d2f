package lyate.report;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import lyate.molecule.Molecule;
import lyate.review.Finding;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Transfer;

/** A review for reading. */
public final class ReviewText implements ResultWriter<Review> {

    private final Appendable out;

    public ReviewText(Appendable out) {
        this.out = out;
    }

    @Override
    public void write(Review review) throws IOException {
        List<String> stops = review.findings().stream().filter(finding -> finding.severity() == Finding.Severity.STOP)
                .map(finding -> finding.kind().code()).distinct().toList();
        line("%s (%s %%): %s", review.verdict().code(), Numbers.percent(review.probability()), review.verdict().meaning());
        if (!stops.isEmpty()) {
            line("stop: %s (see below)", String.join(", ", stops));
        }
        line("");
        step(review);
        line("");
        transfers(review.transfers());
        findings(review.findings());
        list("Why", review.explanation());
        list("Assumed", review.assumptions());
    }

    private void step(Review review) throws IOException {
        Step step = review.step();
        line("  substrate      %s", asGiven(step.substrate()));
        for (String warning : step.substrate().warnings()) {
            line("                 %s", warning);
        }
        line("  intended site  %s", review.intendedSite());
        line("  first to go    %s", review.sideReactionWins() && review.firstSite().equals("none") ? "none: a side reaction takes the base" : review.firstSite());
        line("  base           %s, %s equiv", step.base().name(), Numbers.fixed(step.equivalents(), 2));
        line("  working base   %s", review.workingBase());
        line("  conditions     %s, %s °C, %s M, %s ppm water", step.solvent().name(), Numbers.fixed(step.temperatureCelsius(), 0),
                Numbers.fixed(step.concentrationMolar(), 2), Numbers.fixed(step.waterPpm(), 0));
        line("  log K          %s at the intended site; %s%s %% of it taken, at most %s %% of any other",
                Numbers.fixed(review.logK(), 1), review.sideReactionWins() ? "the side reaction left aside, " : "", Numbers.fixed(review.intendedPercent(), 1), Numbers.fixed(review.otherPercent(), 1));
    }

    private void transfers(List<Transfer> transfers) throws IOException {
        line("  %-10s %6s %5s  %-11s %7s %5s %9s %8s", "donor", "pKa", "±", "basis", "log K", "±", "ΔG kJ/mol", "% taken");
        for (Transfer transfer : transfers) {
            line("  %-10s %6s %5s  %-11s %7s %5s %9s %8s", transfer.donor(), Numbers.fixed(transfer.acidity().pKa(), 1),
                    Numbers.fixed(transfer.acidity().sigma(), 1), transfer.acidity().basis().word(),
                    Numbers.fixed(transfer.logK(), 1), Numbers.fixed(transfer.sigmaLogK(), 1),
                    Numbers.fixed(transfer.deltaG(), 0), Numbers.fixed(transfer.percentTaken(), 1));
        }
    }

    private void findings(List<Finding> findings) throws IOException {
        for (Finding finding : findings) {
            line("");
            line("  %s  %s: %s", finding.severity().word(), finding.kind().code(), finding.sentence());
            for (String evidence : finding.evidence()) {
                line("      %s", evidence);
            }
            line("      source: %s", finding.source());
        }
    }

    private void list(String heading, List<String> lines) throws IOException {
        if (!lines.isEmpty()) {
            line("");
            line("  %s", heading);
            for (String text : lines) {
                line("    %s", text);
            }
        }
    }

    private void line(String format, Object... values) throws IOException {
        out.append(String.format(Locale.ROOT, format, values).stripTrailing()).append('\n');
    }

    /** The text whose order numbers the atoms; a molfile is too long for a line. */
    private static String asGiven(Molecule molecule) {
        return molecule.input().contains("\n") ? molecule.smiles() : molecule.input();
    }
}
