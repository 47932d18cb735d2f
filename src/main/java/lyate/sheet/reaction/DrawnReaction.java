package lyate.sheet.reaction;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.molecule.ReactionPart;
import lyate.molecule.ReactionPart.Side;
import lyate.molecule.ReactionSmiles;

/**
 * A reaction as drawn, agents given by name replaced by their structures.
 *
 * @param left   reactants, in the order drawn
 * @param agents what stands over the arrow
 * @param right  products
 * @param ionic  parts of salts that are bases on the shelf
 */
record DrawnReaction(List<ReactionPart> left, List<ReactionPart> agents, List<ReactionPart> right, Set<ReactionPart> ionic) {

    /** Assignments that cost more are tried again with more atoms to take from. */
    private static final int DEAR = 50;
    /** What it costs to leave a product atom unexplained, to need a second molecule of the reactants, and to use up reagents. */
    private static final int UNEXPLAINED = 8;
    private static final int SECOND_MOLECULE = 6;
    private static final int REAGENTS = 12;
    private static final int CARBON = 6;

    /** @throws MoleculeException as {@link ReactionSmiles#parts} */
    static DrawnReaction of(String text, MoleculeReader molecules, DrawnShelf shelf) throws MoleculeException {
        List<ReactionPart> left = new ArrayList<>();
        List<ReactionPart> agents = new ArrayList<>();
        List<ReactionPart> right = new ArrayList<>();
        for (ReactionPart part : ReactionSmiles.parts(text, molecules)) {
            if (part.side() == Side.AGENT) {
                agents.addAll(shelf.named(part));
            } else {
                (part.side() == Side.REACTANT ? left : right).add(part);
            }
        }
        List<ReactionPart> drawn = new ArrayList<>(left);
        drawn.addAll(agents);
        return new DrawnReaction(List.copyOf(left), List.copyOf(agents), List.copyOf(right), shelf.ionicBaseParts(drawn));
    }

    /** Everything left of the products, agents first, as bases and solvents are looked for. */
    List<ReactionPart> reagents() {
        List<ReactionPart> reagents = new ArrayList<>(agents);
        reagents.addAll(left);
        return reagents;
    }

    /**
     * What an inference found, with the parts it counts in.
     *
     * @param pool     the parts atoms could come from
     * @param inferred what was found
     * @param unexplained product atoms that come from nothing drawn
     */
    record Found(List<ReactionPart> pool, Inferred inferred, int unexplained) {

        ReactionPart part(Inferred.Place place) {
            return pool.get(place.molecule());
        }

        /** The parts whose atoms are in the products. */
        Set<ReactionPart> used() {
            Set<ReactionPart> used = new HashSet<>();
            inferred.sources().forEach(index -> used.add(pool.get(index)));
            return used;
        }
    }

    /** Takes the atoms of the products from the reactants proper, else from two of each of them, or from all that is drawn. */
    Found infer(DrawnShelf shelf) {
        List<Molecule> products = products();
        List<ReactionPart> proper = new ArrayList<>(left.stream().filter(this::mayGiveAtoms).toList());
        agents.stream().filter(this::mayGiveAtoms).filter(part -> shelf.partner(part).isPresent() || !shelf.isKnown(part)).forEach(proper::add);
        if (products.isEmpty() || proper.isEmpty()) {
            return new Found(proper, Inferred.none(products.isEmpty() ? "no product is drawn" : "no reactant is drawn besides base and ions"), 0);
        }
        Attempt first = new Attempt(proper, inference(proper, proper.size(), products), 0);
        if (first.inference().unexplained() == 0 && first.inference().cost() <= DEAR) {
            return first.found(ionic);
        }
        List<ReactionPart> twice = new ArrayList<>(proper);
        twice.addAll(left.stream().filter(this::mayGiveAtoms).toList());
        List<ReactionPart> all = reagents().stream().filter(part -> part.molecule().isPresent()).toList();
        return first.orCheaper(new Attempt(twice, inference(twice, proper.size(), products), SECOND_MOLECULE))
                .orCheaper(new Attempt(all, inference(all, all.size(), products), REAGENTS)).found(ionic);
    }

    private record Attempt(List<ReactionPart> pool, SiteInference inference, int extra) {

        Attempt orCheaper(Attempt other) {
            return other.price() < price() ? other : this;
        }

        private long price() {
            return (long) inference.cost() + UNEXPLAINED * (long) inference.unexplained() + extra;
        }

        Found found(Set<ReactionPart> reagents) {
            return new Found(pool, inference.infer(index -> !reagents.contains(pool.get(index))), inference.unexplained());
        }
    }

    private static SiteInference inference(List<ReactionPart> pool, int mapped, List<Molecule> products) {
        return new SiteInference(pool.stream().map(part -> part.molecule().orElseThrow()).toList(), mapped, products);
    }

    private boolean mayGiveAtoms(ReactionPart part) {
        return part.molecule().isPresent() && !ionic.contains(part);
    }

    /** The products that matter: those with carbon, or all there are. */
    private List<Molecule> products() {
        List<Molecule> all = right.stream().flatMap(part -> part.molecule().stream()).toList();
        List<Molecule> organic = all.stream().filter(DrawnReaction::hasCarbon).toList();
        return organic.isEmpty() ? all : organic;
    }

    static boolean hasCarbon(Molecule molecule) {
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            if (molecule.atomicNumber(atom) == CARBON) {
                return true;
            }
        }
        return false;
    }

    Optional<ReactionPart> firstReactant(Set<ReactionPart> reagents) {
        return left.stream().filter(part -> part.molecule().isPresent() && !reagents.contains(part)).findFirst();
    }
}
