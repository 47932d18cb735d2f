package lyate.sheet.reaction;

import java.util.List;
import java.util.OptionalInt;

/**
 * What a reaction says of the proton meant.
 *
 * @param leaving  atoms that lost one, what most likely is meant first, of equivalent atoms one
 * @param arriving atoms that gained one with positive charge
 * @param basis    how it was found, in a few words
 * @param doubts   why it may be something else; empty where it is sure
 * @param sources  molecules whose atoms are in the products, ascending
 * @param changes  bonds between heavy atoms that are made or broken
 */
record Inferred(List<Place> leaving, List<Place> arriving, String basis, List<String> doubts, List<Integer> sources,
                int changes) {

    /**
     * An atom of a reactant.
     *
     * @param molecule index in the list of reactants
     * @param atom     index in the molecule
     * @param mapped   whether the atom map says what became of it
     * @param partner  index of the molecule it was joined to, if any
     */
    record Place(int molecule, int atom, boolean mapped, OptionalInt partner) {}

    static Inferred none(String reason) {
        return new Inferred(List.of(), List.of(), reason, List.of(reason), List.of(), 0);
    }

    Inferred with(List<Integer> otherSources) {
        return new Inferred(leaving, arriving, basis, doubts, otherSources, changes);
    }
}
