package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import lyate.molecule.ReactionPart.Side;

/** Reaction SMILES, {@code reactants>agents>products}, taken apart into components; what follows a blank is its title. */
public final class ReactionSmiles {

    /** Components a reaction may have; nobody draws more. */
    private static final int MOST_PARTS = 60;
    /** A bare ion, or hydrogen. */
    private static final Pattern LONE_ATOM = Pattern.compile("\\[[^\\]]*\\]|(\\[\\d*H\\]){2}");

    private ReactionSmiles() {}

    /** Whether a text is reaction SMILES: one line whose first word has exactly two {@code >}. */
    public static boolean looksLike(String text) {
        String line = text.strip();
        return !line.contains("\n") && firstWord(line).chars().filter(letter -> letter == '>').count() == 2;
    }

    /**
     * Takes a reaction apart.
     *
     * <p>An agent need not be SMILES: it may be a name, which this package does not know; its problem says why it is no SMILES.
     *
     * @throws MoleculeException where it is not a reaction, or a reactant or product cannot be read: names the component, with
     *     a caret under the place where its text stops making sense
     */
    public static List<ReactionPart> parts(String text, MoleculeReader molecules) throws MoleculeException {
        String[] fields = firstWord(text.strip()).split(">", -1);
        if (fields.length != 3 || text.strip().contains("\n")) {
            throw new MoleculeException("not a reaction SMILES: expected reactants>agents>products, found '" + shortened(text) + "'");
        }
        List<ReactionPart> parts = new ArrayList<>();
        for (Side side : Side.values()) {
            String[] components = fields[side.ordinal()].split("\\.", -1);
            if (fields[side.ordinal()].isEmpty()) {
                continue;
            }
            if (components.length > MOST_PARTS) {
                throw new MoleculeException("the reaction has " + components.length + " " + side.word() + "s; at most " + MOST_PARTS + " are read");
            }
            for (int i = 0; i < components.length; i++) {
                parts.add(part(side, i + 1, components[i], molecules));
            }
        }
        return List.copyOf(parts);
    }

    private static ReactionPart part(Side side, int number, String text, MoleculeReader molecules) throws MoleculeException {
        String place = side.word() + " " + number + ": ";
        if (text.isEmpty()) {
            throw new MoleculeException(place + "there is nothing between two dots");
        }
        try {
            return new ReactionPart(side, number, text, Optional.of(molecules.readSmiles(text)), "");
        } catch (MoleculeException e) {
            if (LONE_ATOM.matcher(text).matches() || side == Side.AGENT && isSmiles(text)) {
                return new ReactionPart(side, number, text, Optional.empty(), "");
            }
            if (side == Side.AGENT) {
                return new ReactionPart(side, number, text, Optional.empty(), e.getMessage());
            }
            throw new MoleculeException(place + e.getMessage());
        }
    }

    /** A catalyst may be something no substrate can be. */
    private static boolean isSmiles(String text) {
        try {
            return text.length() < Refusals.MOST_ATOMS && !new SmilesText(text).parse().isEmpty();
        } catch (MoleculeException e) {
            return false;
        }
    }

    private static String firstWord(String line) {
        return line.split("\\s", 2)[0];
    }

    private static String shortened(String text) {
        String line = text.strip().lines().findFirst().orElse("");
        return line.length() > 80 ? line.substring(0, 80) + "..." : line;
    }
}
