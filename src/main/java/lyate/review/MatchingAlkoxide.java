package lyate.review;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;

/** Whether an alkoxide is the one an ester already carries, so that their exchange changes nothing. */
final class MatchingAlkoxide {

    private static final int CARBON = 6;
    private static final int OXYGEN = 8;

    private MatchingAlkoxide() {}

    /**
     * Whether every ester oxygen at an acyl atom carries the group of an alcohol.
     *
     * @param alcoholSmiles conjugate acid of the alkoxide, or the solvent
     */
    static boolean at(Molecule molecule, int acyl, String alcoholSmiles) {
        List<String> alcohol = groupOfAlcohol(alcoholSmiles);
        List<List<String>> groups = new ArrayList<>();
        for (int oxygen : molecule.neighbours(acyl)) {
            if (molecule.atomicNumber(oxygen) == OXYGEN && molecule.bondOrder(acyl, oxygen) == 1) {
                groupBehind(molecule, oxygen, acyl).ifPresent(groups::add);
            }
        }
        return !groups.isEmpty() && groups.stream().allMatch(alcohol::equals);
    }

    private static List<String> groupOfAlcohol(String smiles) {
        try {
            Molecule alcohol = new MoleculeReader().read(smiles);
            for (int atom = 0; atom < alcohol.atomCount(); atom++) {
                if (alcohol.atomicNumber(atom) == OXYGEN && alcohol.hydrogens(atom) == 1) {
                    return groupBehind(alcohol, atom, -1).orElse(List.of());
                }
            }
            return List.of();
        } catch (MoleculeException e) {
            return List.of();
        }
    }

    /** What hangs on an oxygen apart from {@code from}: every atom with its hydrogens, sorted; enough to tell alkyl groups apart. */
    private static Optional<List<String>> groupBehind(Molecule molecule, int oxygen, int from) {
        for (int atom : molecule.neighbours(oxygen)) {
            if (atom != from && molecule.atomicNumber(atom) == CARBON) {
                Set<Integer> seen = new HashSet<>(Set.of(oxygen));
                List<String> group = new ArrayList<>();
                collect(molecule, atom, seen, group);
                return Optional.of(group.stream().sorted().toList());
            }
        }
        return Optional.empty();
    }

    private static void collect(Molecule molecule, int atom, Set<Integer> seen, List<String> group) {
        if (seen.add(atom)) {
            group.add(molecule.symbol(atom) + molecule.hydrogens(atom));
            for (int next : molecule.neighbours(atom)) {
                collect(molecule, next, seen, group);
            }
        }
    }
}
