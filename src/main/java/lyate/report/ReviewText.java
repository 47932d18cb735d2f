package lyate.report;

import java.io.IOException;
import java.util.List;
import lyate.molecule.Molecule;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Transfer;

/** A review for reading. */
public final class ReviewText implements ResultWriter<Review> {

    private final FindingText out;

    public ReviewText(Appendable out) {
        this.out = new FindingText(out);
    }

    @Override
    public void write(Review review) throws IOException {
        out.line("%s (%s): %s", review.verdict().code(), review.probabilityInWords(), review.meaning());
        out.stops(review.findings());
        out.line("");
        step(review);
        out.line("");
        transfers(review.transfers());
        out.findings(review.findings());
        out.list("Why", review.explanation());
        out.list("Assumed", review.assumptions());
    }

    private void step(Review review) throws IOException {
        Step step = review.step();
        out.line("  substrate      %s", asGiven(step.substrate()));
        for (String warning : step.substrate().warnings()) {
            out.line("                 %s", warning);
        }
        out.line("  intended site  %s%s", review.intendedSite(), step.origin().map(origin -> " (" + Words.origin(origin) + ")").orElse(""));
        out.line("  first to go    %s", review.sideReactionWins() && review.firstSite().equals("none") ? "none: a side reaction takes the base" : review.firstSite());
        out.line("  base           %s, %s equiv", step.base().name(), Numbers.fixed(step.equivalents(), 2));
        out.line("  working base   %s", review.workingBase());
        out.line("  conditions     %s, %s °C, %s M, %s ppm water", step.solvent().name(), Numbers.fixed(step.temperatureCelsius(), 0),
                Numbers.fixed(step.concentrationMolar(), 2), Numbers.fixed(step.waterPpm(), 0));
        out.line("  log K          %s at the intended site; %s%s %% of it taken, at most %s %% of any other",
                Numbers.fixed(review.logK(), 1), review.sideReactionWins() ? "the side reaction left aside, " : "", Numbers.fixed(review.intendedPercent(), 1), Numbers.fixed(review.otherPercent(), 1));
    }

    private void transfers(List<Transfer> transfers) throws IOException {
        out.line("  %-10s %6s %5s  %-11s %7s %5s %9s %8s", "donor", "pKa", "±", "basis", "log K", "±", "ΔG kJ/mol", "% taken");
        for (Transfer transfer : transfers) {
            out.line("  %-10s %6s %5s  %-11s %7s %5s %9s %8s", transfer.donor(), Numbers.fixed(transfer.acidity().pKa(), 1),
                    Numbers.fixed(transfer.acidity().sigma(), 1), transfer.acidity().basis().word(),
                    Numbers.fixed(transfer.logK(), 1), Numbers.fixed(transfer.sigmaLogK(), 1),
                    Numbers.fixed(transfer.deltaG(), 0), Numbers.fixed(transfer.percentTaken(), 1));
        }
    }

    /** The text whose order numbers the atoms; a molfile is too long for a line. */
    static String asGiven(Molecule molecule) {
        return molecule.input().contains("\n") ? molecule.smiles() : molecule.input();
    }
}
