package lyate.sheet.reaction;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;
import lyate.molecule.Molecule;

/** The rows of {@code reactions.csv}. */
final class ReactionSet {

    private ReactionSet() {}

    /**
     * One reaction.
     *
     * @param sites each right: place of the component on the left side, colon, label of the atom in it
     */
    record Row(String id, String part, String map, String kind, Set<String> sites, String reaction) {

        /** Whether a reading names one of the sites, or an atom equal to it by symmetry. */
        boolean accepts(Reaction read) {
            Molecule substrate = read.substrate();
            return read.origin().site().map(substrate::atomLabelled).filter(atom -> sites.stream()
                    .filter(site -> site.startsWith(read.reactant() + ":"))
                    .map(site -> substrate.atomLabelled(site.substring(site.indexOf(':') + 1)))
                    .anyMatch(right -> substrate.symmetryClass(right.orElseThrow()) == substrate.symmetryClass(atom.orElseThrow()))).isPresent();
        }

        @Override
        public String toString() {
            return id + " " + kind + " " + reaction;
        }
    }

    static List<Row> rows() {
        try (InputStream in = ReactionSet.class.getResourceAsStream("/lyate/sheet/reactions.csv");
                BufferedReader lines = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
            return lines.lines().filter(line -> !line.startsWith("#")).skip(1).map(line -> line.split("\\|"))
                    .map(cells -> new Row(cells[0], cells[1], cells[2], cells[3], Set.of(cells[4].split(" ")), cells[5])).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
