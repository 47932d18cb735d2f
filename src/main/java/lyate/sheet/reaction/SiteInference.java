package lyate.sheet.reaction;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import lyate.molecule.Molecule;

/**
 * Works out from reactants and products which atom lost its proton, or gained one: from the atom map where there is one, for
 * the other atoms from the assignment that changes least.
 */
final class SiteInference {

    /** Steps that make and break more bonds are several steps, and their assignment is a guess. */
    private static final int MANY_CHANGES = 8;

    private final AtomGraph before;
    private final AtomGraph after;
    private final boolean[] tied;
    private final Assignments assignments;

    /**
     * @param reactants what the atoms of the products may come from
     * @param mapped    how many of them, from the first, keep their atom map
     * @param products  not empty
     */
    SiteInference(List<Molecule> reactants, int mapped, List<Molecule> products) {
        this.before = AtomGraph.of(reactants, mapped);
        this.after = AtomGraph.of(products, products.size());
        this.tied = new boolean[before.size()];
        int[] anchors = anchors();
        Assignments all = new AssignmentSearch(before, after, anchors).run();
        this.assignments = all.complete() ? all : new AssignmentSearch(before, after, new Landmarks(before, after).added(anchors)).run();
    }

    /** Reactant atom of every product atom whose map number stands once on each side, of one element. */
    private int[] anchors() {
        Map<Integer, Integer> left = once(before);
        Map<Integer, Integer> right = once(after);
        int[] anchors = new int[after.size()];
        Arrays.fill(anchors, AssignmentSearch.NOWHERE);
        right.forEach((number, p) -> {
            Integer r = left.get(number);
            if (r != null && p >= 0 && r >= 0 && before.element[r] == after.element[p]) {
                anchors[p] = r;
                tied[r] = true;
            }
        });
        return anchors;
    }

    private static Map<Integer, Integer> once(AtomGraph graph) {
        Map<Integer, Integer> atoms = new HashMap<>();
        for (int i = 0; i < graph.size(); i++) {
            if (graph.map[i] > 0) {
                atoms.merge(graph.map[i], i, (one, other) -> -1);
            }
        }
        return atoms;
    }

    /** Product atoms that come from nowhere; the most there can be where no assignment was found. */
    int unexplained() {
        return assignments.sources().isEmpty() ? after.size() : assignments.unexplained();
    }

    int cost() {
        return assignments.sources().isEmpty() ? Integer.MAX_VALUE : assignments.cost();
    }

    /**
     * What the assignments say.
     *
     * @param mayLoseProton which molecules are asked about: not the parts of a base
     */
    Inferred infer(IntPredicate mayLoseProton) {
        if (!assignments.complete()) {
            return Inferred.none("too many ways to assign the atoms");
        }
        if (assignments.sources().isEmpty()) {
            return Inferred.none("the products do not follow from the reactants");
        }
        Map<List<Integer>, ProtonMoves> different = new LinkedHashMap<>();
        for (int[] source : assignments.sources()) {
            ProtonMoves moves = ProtonMoves.of(before, after, source);
            different.putIfAbsent(colours(moves), moves);
        }
        return new Verdict(different.values().stream().toList(), mayLoseProton).inferred();
    }

    private List<Integer> colours(ProtonMoves moves) {
        IntStream atoms = moves.donors().isEmpty() ? moves.acceptors().stream().mapToInt(Integer::intValue)
                : moves.donors().stream().mapToInt(ProtonMoves.Donor::atom);
        return atoms.map(atom -> before.colour[atom]).sorted().distinct().boxed().toList();
    }

    /** The assignments that differ in what they say of protons. */
    private final class Verdict {

        private final List<ProtonMoves> moves;
        private final IntPredicate mayLoseProton;

        Verdict(List<ProtonMoves> moves, IntPredicate mayLoseProton) {
            this.moves = moves;
            this.mayLoseProton = mayLoseProton;
        }

        Inferred inferred() {
            List<Inferred.Place> leaving = places(true);
            List<Inferred.Place> arriving = places(false);
            if (leaving.isEmpty() && arriving.isEmpty()) {
                return Inferred.none(moves.get(0).oxidised() ? "hydrogen leaves two neighbours at once, which is an oxidation" : "no proton leaves or arrives")
                        .with(sources());
            }
            List<String> doubts = new ArrayList<>();
            if (moves.size() > 1) {
                doubts.add(moves.size() + " assignments tie");
            } else if (leaving.size() > 1) {
                doubts.add(leaving.size() + " sites lose a proton");
            } else if (leaving.isEmpty() && arriving.size() > 1) {
                doubts.add(arriving.size() + " sites gain a proton");
            }
            if (moves.get(0).coupled()) {
                doubts.add("both ends of a new bond lose hydrogen, which is an oxidation");
            }
            if (moves.get(0).changes() > MANY_CHANGES) {
                doubts.add(moves.get(0).changes() + " bonds are made or broken, more than in one step");
            }
            Inferred.Place first = leaving.isEmpty() ? arriving.get(0) : leaving.get(0);
            String basis = first.mapped() ? "mapped" : moves.size() > 1 ? moves.size() + " assignments tie" : "one assignment";
            return new Inferred(leaving, arriving, basis, doubts, sources(), moves.get(0).changes());
        }

        private List<Inferred.Place> places(boolean leaving) {
            List<Inferred.Place> places = new ArrayList<>();
            List<Integer> seen = new ArrayList<>();
            for (ProtonMoves each : moves) {
                List<Integer> atoms = leaving ? each.donors().stream().map(ProtonMoves.Donor::atom).toList() : each.acceptors();
                for (int atom : atoms) {
                    boolean asked = !leaving || mayLoseProton.test(before.part[atom]);
                    if (asked && !seen.contains(before.colour[atom])) {
                        seen.add(before.colour[atom]);
                        places.add(new Inferred.Place(before.part[atom], before.atom[atom], tied[atom], partner(atom)));
                    }
                }
            }
            return places;
        }

        /** The molecule that a donor was joined to, itself or through its neighbours. */
        private OptionalInt partner(int donor) {
            int[] source = assignments.sources().get(0);
            int[] atoms = IntStream.range(0, source.length).filter(p -> source[p] >= 0 && before.part[source[p]] == before.part[donor]).toArray();
            return IntStream.of(atoms).boxed().sorted(Comparator.comparing(p -> source[p] != donor))
                    .flatMap(p -> IntStream.of(after.neighbours[p]).boxed()).filter(q -> source[q] >= 0 && before.part[source[q]] != before.part[donor])
                    .mapToInt(q -> before.part[source[q]]).findFirst();
        }

        private List<Integer> sources() {
            return IntStream.of(assignments.sources().get(0)).filter(r -> r >= 0).map(r -> before.part[r]).distinct().sorted().boxed().toList();
        }
    }

    /** Atom of {@code known} that corresponds to an atom of {@code other}, where both have one constitution. */
    static Optional<Integer> counterpart(Molecule other, int atom, Molecule known) {
        if (!other.sameConstitution(known)) {
            return Optional.empty();
        }
        AtomGraph both = AtomGraph.of(List.of(other, known), 0);
        int colour = IntStream.range(0, both.size()).filter(i -> both.part[i] == 0 && both.atom[i] == atom).map(i -> both.colour[i]).findFirst().orElseThrow();
        return IntStream.range(0, both.size()).filter(i -> both.part[i] == 1 && both.colour[i] == colour).mapToObj(i -> both.atom[i]).findFirst();
    }
}
