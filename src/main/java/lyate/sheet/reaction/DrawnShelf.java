package lyate.sheet.reaction;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.molecule.ReactionPart;
import lyate.molecule.ReactionSmiles;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Partner;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;

/** The shelf by structure, for recognising what is drawn. Immutable; safe to share between threads. */
public final class DrawnShelf {

    private final MoleculeReader molecules;
    private final Stockroom stockroom;
    private final List<DrawnBase> bases;
    /** Keys of everything that bases are made of. */
    private final Set<String> basePieces = new HashSet<>();
    private final Map<String, Solvent> solvents = new HashMap<>();
    private final Map<String, Acid> acids = new HashMap<>();
    private final Map<String, Partner> partners = new HashMap<>();

    /**
     * A base by its parts.
     *
     * @param base  what it is
     * @param parts their keys
     */
    private record DrawnBase(Base base, List<String> parts) {

        boolean ionic() {
            return parts.size() > 1;
        }

        double strength() {
            return base.pKa(Medium.DMSO).or(() -> base.pKa(Medium.WATER)).map(KnownPKa::pKa).orElse(0.0);
        }
    }

    public DrawnShelf(MoleculeReader molecules, Stockroom stockroom) {
        this.molecules = molecules;
        this.stockroom = stockroom;
        this.bases = stockroom.bases().stream().map(base -> new DrawnBase(base, keys(base.smiles()))).toList();
        bases.forEach(base -> basePieces.addAll(base.parts()));
        stockroom.solvents().forEach(solvent -> solvents.putIfAbsent(key(solvent.smiles()), solvent));
        stockroom.acids().forEach(acid -> acids.putIfAbsent(key(acid.smiles()), acid));
        stockroom.partners().forEach(partner -> partners.putIfAbsent(key(partner.smiles()), partner));
    }

    private String key(String smiles) {
        List<String> keys = keys(smiles);
        return keys.size() == 1 ? keys.get(0) : String.join(".", keys);
    }

    private List<String> keys(String smiles) {
        try {
            return ReactionSmiles.parts(">" + smiles + ">", molecules).stream().flatMap(part -> part.keys().stream()).toList();
        } catch (MoleculeException e) {
            throw new IllegalStateException("the stockroom's structures were read before: " + smiles, e);
        }
    }

    Optional<Solvent> solvent(ReactionPart part) {
        return single(part, solvents);
    }

    Optional<Acid> acid(ReactionPart part) {
        return single(part, acids);
    }

    Optional<Partner> partner(ReactionPart part) {
        return single(part, partners);
    }

    private static <T> Optional<T> single(ReactionPart part, Map<String, T> shelf) {
        List<String> keys = part.keys();
        return keys.size() == 1 ? Optional.ofNullable(shelf.get(keys.get(0))) : Optional.empty();
    }

    /** Whether a part alone is a neutral base on the shelf. */
    boolean isBase(ReactionPart part) {
        return bases.stream().anyMatch(base -> base.parts().equals(part.keys()));
    }

    boolean isKnown(ReactionPart part) {
        return basePieces.containsAll(part.keys()) || solvent(part).isPresent() || acid(part).isPresent() || partner(part).isPresent();
    }

    /** Every base all of whose parts are there, the strongest first; what is only a part of another is not named. */
    List<Base> bases(List<ReactionPart> parts) {
        return present(parts).stream().map(DrawnBase::base).toList();
    }

    /** Each part belongs to one base: those drawn in one piece are told apart first, of others the strongest. */
    private List<DrawnBase> present(List<ReactionPart> parts) {
        List<String> left = new ArrayList<>(parts.stream().flatMap(part -> part.keys().stream()).toList());
        List<DrawnBase> inOnePiece = bases.stream().filter(base -> inOnePiece(left, base.parts())).toList();
        List<DrawnBase> candidates = bases.stream().filter(base -> holds(left, base.parts()))
                .sorted(Comparator.comparing((DrawnBase base) -> -base.parts().size()).thenComparing(base -> !inOnePiece.contains(base))
                        .thenComparing(base -> -base.strength())).toList();
        List<DrawnBase> found = new ArrayList<>();
        for (DrawnBase base : candidates) {
            if (holds(left, base.parts())) {
                base.parts().forEach(left::remove);
                found.add(base);
            }
        }
        found.sort(Comparator.comparingDouble(DrawnBase::strength).reversed());
        return found;
    }

    private static boolean inOnePiece(List<String> present, List<String> wanted) {
        List<String> sorted = wanted.stream().sorted().toList();
        for (int at = 0; at + wanted.size() <= present.size(); at++) {
            if (present.subList(at, at + wanted.size()).stream().sorted().toList().equals(sorted)) {
                return true;
            }
        }
        return false;
    }

    /** The parts that salts among the bases are made of: reagents, not what the step is about. */
    Set<ReactionPart> ionicBaseParts(List<ReactionPart> parts) {
        Set<String> keys = new HashSet<>();
        present(parts).stream().filter(DrawnBase::ionic).forEach(base -> keys.addAll(base.parts()));
        Set<ReactionPart> ionic = new HashSet<>();
        parts.stream().filter(part -> keys.containsAll(part.keys())).forEach(ionic::add);
        return ionic;
    }

    private static boolean holds(List<String> present, List<String> wanted) {
        List<String> left = new ArrayList<>(present);
        return !wanted.isEmpty() && wanted.stream().allMatch(left::remove);
    }

    /**
     * An agent given by name becomes the parts of its structure; any other part stays. A name may read as SMILES of something odd:
     * THF as tritium, hydrogen and fluorine.
     *
     * @throws MoleculeException for a text that is neither a structure nor a name on the shelf
     */
    List<ReactionPart> named(ReactionPart part) throws MoleculeException {
        boolean structure = part.problem().isEmpty();
        if (part.side() != ReactionPart.Side.AGENT || structure && part.molecule().isPresent() && isKnown(part)) {
            return List.of(part);
        }
        Optional<String> smiles = structureOf(part.text());
        if (smiles.isPresent()) {
            return ReactionSmiles.parts(">" + smiles.get() + ">", molecules);
        }
        if (!structure) {
            throw new MoleculeException(part.place() + ": '" + part.text() + "' is neither SMILES nor the name of a base, solvent, acid or"
                    + " electrophile in the tables");
        }
        return List.of(part);
    }

    private Optional<String> structureOf(String name) {
        for (Lookup lookup : List.<Lookup>of(text -> stockroom.base(text).smiles(), text -> stockroom.solvent(text).smiles(),
                text -> stockroom.acid(text).smiles(), text -> stockroom.partner(text).smiles())) {
            try {
                return Optional.of(lookup.smiles(name));
            } catch (UnknownNameException notThatShelf) {
                // the next shelf may have it
            }
        }
        return Optional.empty();
    }

    /** Looks a name up on one shelf. */
    private interface Lookup {
        String smiles(String name) throws UnknownNameException;
    }
}
