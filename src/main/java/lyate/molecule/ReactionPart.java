package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * One component of a reaction: a molecule, or something that takes part without being one, such as a bare ion.
 *
 * @param side     where it stands
 * @param number   1-based place on its side
 * @param text     as given
 * @param molecule present where it is a molecule
 * @param problem  in words why it is no structure at all; empty for a molecule, a bare ion and a metal complex
 */
public record ReactionPart(Side side, int number, String text, Optional<Molecule> molecule, String problem) {

    /** The three fields of a reaction. */
    public enum Side {
        REACTANT, AGENT, PRODUCT;

        /** The word used in messages. */
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /**
     * What things on the shelf are recognised by: canonical SMILES of the molecule, then the counter-ions that were drawn
     * bound to it; the text itself for a bare ion, which is written in one way only.
     */
    public List<String> keys() {
        return molecule.map(ReactionPart::keys).orElse(List.of(text));
    }

    /** The same for a structure read by itself. */
    public static List<String> keys(Molecule molecule) {
        List<String> keys = new ArrayList<>(List.of(molecule.canonicalKey()));
        keys.addAll(molecule.counterIons());
        return keys;
    }

    /** The place for messages, for example {@code reactant 2}. */
    public String place() {
        return side.word() + " " + number;
    }
}
