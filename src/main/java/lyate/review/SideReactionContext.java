package lyate.review;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import lyate.stock.Base;
import lyate.stock.Medium;

/**
 * What is known about a step when its side reactions are asked for.
 *
 * @param workingBase  base that is really in the flask: the one of the step, or the solvent's lyate ion where that took over
 * @param transfers    every donor against the working base; those of the substrate carry its atoms
 * @param intendedAtom substrate atom that is meant to lose the proton, where known
 */
public record SideReactionContext(Base workingBase, List<Transfer> transfers, OptionalInt intendedAtom) {

    /** log10 K from which a proton counts as taken for good. */
    private static final double TAKEN = 2;

    /** log10 K from which so little free base stays beside the anion that it cannot be drained by something irreversible. */
    private static final double LASTING = 4;

    /** Highest pKa of a doubly activated C-H acid, which loses its proton as fast as O-H and N-H do. */
    private static final double FAST_CARBON_IN_WATER = 14;
    private static final double FAST_CARBON_IN_DMSO = 20;

    private static final int CARBON = 6;

    public SideReactionContext {
        transfers = List.copyOf(transfers);
    }

    /** Equivalents of base left after every proton it can take for good; one proton an atom. */
    double leftAfterAllProtons(Step step) {
        return leftAfterProtons(step, TAKEN);
    }

    /** Equivalents of base left for what cannot be undone, after every proton whose equilibrium hides the base from it. */
    double leftAfterLastingProtons(Step step) {
        return leftAfterProtons(step, LASTING);
    }

    /** Equivalents of base left after the protons that go before anything else can happen. */
    double leftAfterFastProtons(Step step) {
        return protonEquivalents(step) - transfers.stream()
                .filter(transfer -> transfer.logK() >= TAKEN && fast(step, transfer))
                .mapToInt(transfer -> transfer.atoms().size()).sum();
    }

    /** The transfer from an atom, if it is a donor. */
    Optional<Transfer> from(int atom) {
        return transfers.stream().filter(transfer -> transfer.atoms().contains(atom)).findFirst();
    }

    private double leftAfterProtons(Step step, double least) {
        return protonEquivalents(step) - transfers.stream()
                .filter(transfer -> transfer.logK() >= least).mapToInt(transfer -> transfer.atoms().size()).sum();
    }

    private static double protonEquivalents(Step step) {
        return step.equivalents() * step.base().protonsPerFormula();
    }

    private static boolean fast(Step step, Transfer transfer) {
        if (transfer.atoms().isEmpty()) {
            return false;
        }
        if (step.substrate().atomicNumber(transfer.atoms().get(0)) != CARBON) {
            return true;
        }
        boolean aqueous = transfer.acidity().medium().equals(Medium.WATER);
        return transfer.acidity().pKa() <= (aqueous ? FAST_CARBON_IN_WATER : FAST_CARBON_IN_DMSO);
    }
}
