package lyate.window;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import lyate.acidity.Acidity.Basis;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.acidity.Acidity;
import lyate.molecule.Molecule;
import lyate.report.Words;
import lyate.review.Finding.Severity;
import lyate.review.Finding;
import lyate.review.FindingKind;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.Reviewer;
import lyate.review.Step;
import lyate.review.Transfer;
import lyate.review.Verdict;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/**
 * A reviewer for tests of the window: every number is made up from the element alone, so that a test knows what must
 * appear on screen. It says nothing about chemistry.
 */
final class InventedReviewer implements Reviewer {

    @Override
    public Review review(Step step) throws ReviewException {
        Molecule substrate = step.substrate();
        double basePKa = step.base().pKa(Medium.DMSO).map(KnownPKa::pKa).orElse(20.0);
        List<Transfer> transfers = new ArrayList<>();
        for (int atom = 0; atom < substrate.atomCount(); atom++) {
            if (substrate.hydrogens(atom) > 0) {
                transfers.add(transfer(substrate.label(atom), List.of(atom), pKa(substrate, atom), basePKa, step.equivalents()));
            }
        }
        transfers.add(transfer("solvent", List.of(), 33.4, basePKa, 0));
        transfers.add(transfer("water", List.of(), 31.4, basePKa, 1));
        transfers.sort(Comparator.comparingDouble(transfer -> transfer.acidity().pKa()));
        String first = transfers.get(0).donor();
        String intended = step.intendedSite().orElse(first);
        Transfer meant = transfers.stream().filter(transfer -> transfer.donor().equals(intended)).findFirst()
                .orElseThrow(() -> new ReviewException(intended + " carries no hydrogen"));
        boolean right = intended.equals(first);
        return new Review(step, right ? Verdict.SELECTIVE : Verdict.WRONG_SITE, 0.93,
                Map.of(Verdict.WRONG_SITE, right ? 0.0 : 0.93, Verdict.SELECTIVE, right ? 0.93 : 0.0, Verdict.UNDECIDED, 0.07),
                intended, first, step.base().name(), meant.logK(), meant.percentTaken(), right ? 2 : 100, transfers, findings(),
                List.of("A second equivalent would take both protons.", "The scale in DMSO decides because the base is strong."),
                List.of("The solvent is as dry as stated."));
    }

    private static double pKa(Molecule substrate, int atom) {
        return switch (substrate.symbol(atom)) {
            case "O" -> 17.4;
            case "N" -> 21.1;
            default -> substrate.aromatic(atom) ? 39.5 : 30 + atom % 7;
        };
    }

    private static Transfer transfer(String donor, List<Integer> atoms, double pKa, double basePKa, double equivalents) {
        double logK = basePKa - pKa;
        Acidity acidity = new Acidity(pKa, 0.8, Medium.DMSO, Basis.ESTIMATED, List.of(new Contribution("class value", Effect.ATOM, pKa + 1, atoms),
                new Contribution("ortho methyl", Effect.STERICS, -1, atoms)), List.of(), List.of(), "invented spread",
                List.of(), "invented for a test");
        double taken = logK < 0 || donor.equals("solvent") ? 0 : donor.startsWith("O") || equivalents > 1.9 ? 99.95 : 5;
        return new Transfer(donor, atoms, acidity, logK, 1.2, -5.708 * logK, taken, "DMSO scale: strong base");
    }

    private static List<Finding> findings() {
        return List.of(
                new Finding(Severity.STOP, FindingKind.UNINTENDED_DEPROTONATION, "The base is used up by a proton that was not meant.",
                        List.of("pKa 17.4 against 21.1 in DMSO", "1.05 eq. of base"), List.of(0), "follows from the pKa values"),
                new Finding(Severity.CAUTION, FindingKind.SECOND_EQUIVALENT_NEEDED, "A second equivalent takes the intended proton too; the more basic anion then reacts first with one equivalent of electrophile.",
                        List.of("log K " + Words.signed(14.2)), List.of(), "common practice"),
                new Finding(Severity.NOTE, FindingKind.MOISTURE, "Water in the solvent takes 1.9 % of the base.", List.of("100 ppm"), List.of(), "follows from the amounts"),
                new Finding(Severity.CAUTION, FindingKind.GAS_EVOLVED, "Hydrogen is given off: 25 mL per mmol of base at 25 \u00b0C. Vent, keep away from flames.",
                        List.of("1 mol per mol"), List.of(), "stoichiometry"));
    }
}
