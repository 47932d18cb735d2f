package lyate.sheet.reaction;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Collectors;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.molecule.ReactionPart;
import lyate.molecule.ReactionPart.Side;
import lyate.molecule.ReactionSmiles;
import lyate.molecule.Renumbering;
import lyate.sheet.reaction.ReactionSet.Row;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The order in which atoms and molecules of a reaction are written changes no answer. */
class RenumberedReactionTest {

    private static final int ORDERS = 3;
    private static final MoleculeReader MOLECULES = new MoleculeReader();
    private static final ReactionReader READER = new ReactionReader(MOLECULES, Stockroom.load(TableFolders.packaged()));

    /** Deuterium is a count once it is read, and two salts of equals may be told apart by what was drawn first. */
    static List<Row> rows() {
        return ReactionSet.rows().stream().filter(row -> !row.kind().equals("deuteration") && !row.kind().equals("salt")).toList();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void anotherOrderOfAtomsAndMolecules(Row row) throws MoleculeException {
        Reaction before = READER.read(row.reaction());
        for (int seed = 0; seed < ORDERS; seed++) {
            Shuffled shuffled = Shuffled.of(row.reaction(), seed);
            Reaction after = READER.read(shuffled.reaction());
            assertEquals(before.substrate().canonicalKey(), after.substrate().canonicalKey(), shuffled.reaction());
            int atom = before.substrate().atomLabelled(before.origin().site().orElseThrow()).orElseThrow();
            int then = shuffled.places().get(before.substrate().input())[atom];
            int found = after.substrate().atomLabelled(after.origin().site().orElseThrow()).orElseThrow();
            assertEquals(after.substrate().symmetryClass(then), after.substrate().symmetryClass(found), shuffled.reaction());
            assertEquals(before.origin().confidence(), after.origin().confidence());
            assertEquals(before.origin().alternatives().size(), after.origin().alternatives().size());
            assertEquals(before.base().map(base -> base.id()), after.base().map(base -> base.id()));
            assertEquals(before.partner().map(Molecule::canonicalKey), after.partner().map(Molecule::canonicalKey));
        }
    }

    /**
     * The same reaction in another order.
     *
     * @param places for every component, by its text before, where each of its atoms is now
     */
    private record Shuffled(String reaction, Map<String, int[]> places) {

        static Shuffled of(String reaction, int seed) throws MoleculeException {
            Map<Side, List<String>> sides = new HashMap<>();
            Map<String, int[]> places = new HashMap<>();
            for (ReactionPart part : ReactionSmiles.parts(reaction, MOLECULES)) {
                String text = part.text();
                if (part.side() != Side.AGENT && part.molecule().isPresent()) {
                    Renumbering other = Renumbering.of(part.molecule().get(), seed);
                    text = other.molecule().input();
                    places.put(part.text(), other.placeThen());
                }
                sides.computeIfAbsent(part.side(), side -> new ArrayList<>()).add(text);
            }
            Random random = new Random(seed);
            for (Side side : List.of(Side.REACTANT, Side.PRODUCT)) {
                Collections.shuffle(sides.getOrDefault(side, new ArrayList<>()), random);
            }
            return new Shuffled(List.of(Side.values()).stream().map(side -> String.join(".", sides.getOrDefault(side, List.of())))
                    .collect(Collectors.joining(">")), places);
        }
    }
}
