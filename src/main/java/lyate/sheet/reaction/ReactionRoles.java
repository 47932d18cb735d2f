package lyate.sheet.reaction;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import lyate.molecule.Molecule;
import lyate.molecule.ReactionPart;
import lyate.review.SiteOrigin;
import lyate.sheet.reaction.DrawnReaction.Found;
import lyate.sheet.reaction.Inferred.Place;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.Solvent;

/** Who is who in a reaction once it is known where the proton goes: substrate, base, solvent, electrophile. */
final class ReactionRoles {

    private final DrawnReaction reaction;
    private final DrawnShelf shelf;
    private final Found found;
    private final boolean arrives;
    private final Optional<Place> place;

    ReactionRoles(DrawnReaction reaction, DrawnShelf shelf) {
        this.reaction = reaction;
        this.shelf = shelf;
        this.found = reaction.infer(shelf);
        this.arrives = arrives();
        List<Place> places = places();
        this.place = places.isEmpty() ? Optional.empty() : Optional.of(places.get(0));
    }

    private List<Place> places() {
        return arrives ? found.inferred().arriving() : found.inferred().leaving();
    }

    /** Whether the step is about taking a proton up: of acid and base on the shelf, the other is the substrate. */
    private boolean arrives() {
        List<Place> leaving = found.inferred().leaving();
        List<Place> arriving = found.inferred().arriving();
        if (leaving.isEmpty() || arriving.isEmpty()) {
            return leaving.isEmpty() && !arriving.isEmpty();
        }
        ReactionPart donor = found.part(leaving.get(0));
        ReactionPart acceptor = found.part(arriving.get(0));
        if (leaving.get(0).partner().isPresent() || reaction.ionic().contains(acceptor) || donor == acceptor) {
            return false;
        }
        boolean shelfAcid = shelf.acid(donor).isPresent();
        boolean shelfBase = shelf.isBase(acceptor);
        return shelfAcid == shelfBase ? found.pool().indexOf(acceptor) < found.pool().indexOf(donor) : shelfAcid;
    }

    /** The molecule that loses the proton or takes it up; where that is not known, the first that is no reagent. */
    Optional<ReactionPart> substrate() {
        return place.map(found::part).or(this::firstReactant);
    }

    private Optional<ReactionPart> firstReactant() {
        Set<ReactionPart> reagents = new HashSet<>(reaction.ionic());
        reaction.left().stream().filter(part -> shelf.isBase(part) || shelf.solvent(part).isPresent()).forEach(reagents::add);
        return reaction.firstReactant(reagents).or(() -> reaction.firstReactant(reaction.ionic()));
    }

    /** Bases drawn, the substrate not counted, those that leave no atom in the product first. */
    List<Base> bases() {
        List<ReactionPart> reagents = new ArrayList<>(reaction.reagents());
        place.map(found::part).ifPresent(reagents::remove);
        List<ReactionPart> spectators = new ArrayList<>(reagents);
        spectators.removeAll(found.used());
        List<Base> bases = shelf.bases(spectators);
        return bases.isEmpty() ? shelf.bases(reagents) : bases;
    }

    /** Solvents drawn: over the arrow, else among the reactants that leave no atom in the product. */
    List<Solvent> solvents() {
        List<Solvent> agents = solvents(reaction.agents());
        return agents.isEmpty() ? solvents(reaction.left().stream().filter(part -> !found.used().contains(part)
                && part.molecule().filter(ReactionRoles::hasDeuterium).isEmpty() && substrate().filter(part::equals).isEmpty()).toList()) : agents;
    }

    /** A base that is a liquid counts as solvent only where there is no other. */
    private List<Solvent> solvents(List<ReactionPart> parts) {
        List<Solvent> plain = parts.stream().filter(part -> !shelf.isBase(part)).flatMap(part -> shelf.solvent(part).stream()).toList();
        return plain.isEmpty() ? parts.stream().flatMap(part -> shelf.solvent(part).stream()).toList() : plain;
    }

    Optional<Acid> acid() {
        return reaction.reagents().stream().filter(part -> substrate().filter(part::equals).isEmpty())
                .flatMap(part -> shelf.acid(part).stream()).filter(acid -> !acid.id().equals("water")).findFirst();
    }

    Optional<Molecule> partner() {
        return place.map(Place::partner).orElse(OptionalInt.empty()).stream().mapToObj(index -> found.pool().get(index))
                .filter(part -> !reaction.ionic().contains(part) && place.map(found::part).filter(part::equals).isEmpty())
                .flatMap(part -> part.molecule().stream()).findFirst();
    }

    SiteOrigin origin() {
        return new SiteOrigin(place.map(this::label), arrives, found.inferred().basis(), doubts(), alternatives(), remarks());
    }

    private List<String> doubts() {
        List<String> doubts = new ArrayList<>(found.inferred().doubts());
        if (arrives && found.inferred().changes() > 0) {
            doubts.add("bonds are made or broken as well, which is more than a protonation");
        }
        return doubts;
    }

    private String label(Place at) {
        return found.part(at).molecule().orElseThrow().label(at.atom());
    }

    private List<String> alternatives() {
        List<Place> places = places();
        return places.isEmpty() ? List.of() : places.subList(1, places.size()).stream().map(this::labelWithReactant).toList();
    }

    private String labelWithReactant(Place at) {
        ReactionPart part = found.part(at);
        return place.map(found::part).filter(part::equals).isPresent() ? label(at) : label(at) + " of " + part.place();
    }

    private List<String> remarks() {
        List<String> remarks = new ArrayList<>();
        if (found.unexplained() > 0 && place.isPresent()) {
            remarks.add(found.unexplained() + (found.unexplained() == 1 ? " atom of the products comes" : " atoms of the products come") + " from nothing that is drawn");
        }
        if (place.isPresent()) {
            reaction.reagents().stream().filter(part -> !found.used().contains(part) && shelf.solvent(part).isEmpty() && !shelf.isBase(part))
                    .flatMap(part -> shelf.partner(part).stream()).filter(partner -> !partner.kind().equals("proton-source"))
                    .forEach(partner -> remarks.add(partner.name() + " is drawn, but none of its atoms are in the products"));
        }
        List<Base> bases = bases();
        if (bases.size() > 1) {
            remarks.add("several bases are drawn (" + String.join(", ", bases.stream().map(Base::name).toList()) + "); the strongest was taken");
        }
        List<Solvent> solvents = solvents().stream().distinct().toList();
        if (solvents.size() > 1) {
            remarks.add("several solvents are drawn (" + String.join(", ", solvents.stream().map(Solvent::name).toList()) + "); the first was taken");
        }
        return remarks;
    }

    private static boolean hasDeuterium(Molecule molecule) {
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            if (molecule.isotopicHydrogens(atom) > 0) {
                return true;
            }
        }
        return false;
    }
}
