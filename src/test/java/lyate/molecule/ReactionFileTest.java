package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** RXN and RD files become reaction SMILES, or say where they are broken. */
class ReactionFileTest {

    private static final String MAPPED = "[OH:1][C:2]1=[CH:3][CH:4]=[CH:5][CH:6]=[CH:7]1.[CH3:8]I>[K+].[K+].[O-]C([O-])=O.CC(=O)C>"
            + "[CH3:8][O:1][C:2]1=[CH:3][CH:4]=[CH:5][CH:6]=[CH:7]1";

    @ParameterizedTest
    @ValueSource(strings = {"methylation-v2000.rxn", "methylation-v3000.rxn"})
    void bothVersionsSayTheSame(String file) {
        ReactionRecord read = records(file).get(0);
        assertEquals(MAPPED, read.smiles(), read.problem());
        assertEquals("methylation of phenol", read.name());
    }

    @Test
    void withoutAMap() {
        assertFalse(records("methylation-no-map.rxn").get(0).smiles().contains(":"));
    }

    @Test
    void everyLineEndAndAByteOrderMark() {
        String unix = text("methylation-v2000.rxn");
        assertEquals(MAPPED, records(new StringReader("\uFEFF" + unix.replace("\n", "\r\n"))).get(0).smiles());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "bad-counts.rxn|line 5: found 'two one', expected the numbers of reactants and products, three places each",
        "one-more-announced.rxn|line 100: the file breaks off, expected '$MOL' before agent 4 of 4",
        "one-fewer-announced.rxn|line 87: found '$MOL', expected the end of the reaction: it announces no more than these components",
        "bad-atom.rxn|reactant 1 (from line 7): line 5 of the molfile: found",
        "breaks-off.rxn|product 1 (from line 36): line 6 of the molfile: the molfile breaks off, expected atom 2 of 8",
        "no-mol-line.rxn|line 6: found '$MOLL', expected '$MOL' before reactant 1 of 2",
        "placeholder.rxn|reactant 2 (from line 27): atom 2 is a placeholder",
        "no-end-v3000.rxn|the reaction breaks off: there is no line 'M  END'",
        "wrong-count-v3000.rxn|line 5: 3 reactants are announced, 2 are there",
        "no-side-v3000.rxn|line 6: found 'M  V30 BEGIN CTAB', expected 'M  V30 BEGIN REACTANT' or PRODUCT before a structure",
        "no-end-ctab-v3000.rxn|line 7: the structure that begins here has no 'M  V30 END CTAB'",
        "datum-first.rdf|line 103: '$DATUM' without '$DTYPE' before it",
    })
    void aBrokenFileSaysWhere(String file, String problem) {
        ReactionRecord read = records(file).get(0);
        assertTrue(read.problem().startsWith(problem), read.problem());
        assertEquals("", read.smiles());
    }

    @Test
    void aNegativeMapNumberIsRefused() {
        ReactionRecord read = records(new StringReader(text("methylation-v2000.rxn").replaceFirst("  0  1  0  0\n", "  0 -1  0  0\n"))).get(0);
        assertEquals("reactant 1 (from line 7): the molfile numbers O1 -1 in its atom map; expected 1 or more, or 0 for none", read.problem());
    }

    @Test
    void anRdFileIsReadRecordByRecord() {
        List<ReactionRecord> read = records("four-records.rdf");
        assertEquals(4, read.size());
        assertEquals(List.of("sound", "methylation of phenol", "", "named"), read.stream().map(ReactionRecord::name).toList());
        assertEquals(MAPPED, read.get(0).smiles());
        assertEquals(Map.of("STEP:base_equiv", "1.5", "STEP:temperature_C", "40", "yield", "91 %", "remark", "kept over\nnight"), read.get(0).data());
        assertTrue(read.get(1).problem().startsWith("reactant 1 (from line "), read.get(1).problem());
        assertEquals(Map.of("base_equiv", "2"), read.get(1).data());
        assertTrue(read.get(2).problem().endsWith("the record holds no reaction: there is no line '$RXN'"), read.get(2).problem());
        assertEquals("NaH", read.get(3).data().get("base"));
    }

    @Test
    void theLineNamedIsTheLineAtFault() {
        List<String> lines = text("four-records.rdf").lines().toList();
        ReactionRecord broken = records("four-records.rdf").get(1);
        int from = Integer.parseInt(broken.problem().replaceFirst("^.*from line (\\d+).*(?s:.*)$", "$1"));
        assertEquals("$MOL", lines.get(from - 2));
        assertTrue(lines.get(from - 1 + 4).contains("0.x000"), lines.get(from - 1 + 4));
        assertEquals("$RFMT $RIREG 2", lines.get(broken.line() - 1));
    }

    @Test
    void aFileWithoutReactionsHasNone() {
        assertTrue(records("no-reaction.rdf").isEmpty());
        assertTrue(records(new StringReader("")).isEmpty());
    }

    private static List<ReactionRecord> records(String file) {
        return records(new StringReader(text(file)));
    }

    private static List<ReactionRecord> records(StringReader text) {
        return ReactionFile.records(text).toList();
    }

    private static String text(String file) {
        try (InputStream stream = ReactionFileTest.class.getResourceAsStream("/lyate/sheet/reactions/" + file)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
