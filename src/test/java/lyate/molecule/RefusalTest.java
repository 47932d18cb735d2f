package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What cannot be used is refused in words that say where and why. */
class RefusalTest {

    private final MoleculeReader reader = new MoleculeReader();

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "*C|atom 1 is a placeholder (*), not an element: draw the whole structure",
        "[R1]C|atom 1 is a placeholder (R1), not an element: draw the whole structure",
        "[CH3]|C1 has 3 bonds, hydrogens counted, where 4 belong: radicals cannot be judged",
        "C[O]|O2 has 1 bond, hydrogens counted, where 2 belong: radicals cannot be judged",
        "C[CH]|C2 has 2 bonds, hydrogens counted, where 4 belong: an open valence cannot be judged",
        "C(C)(C)[N@+][2H]|N4 (charge +1) has 2 bonds, hydrogens counted, where 4 belong: an open valence cannot be judged",
        "CC(C)(C)(C)C|C2 has 5 bonds, hydrogens counted, but at most 4 are possible",
        "CN(C)(C)C|N2 has 5 bonds, hydrogens counted, but at most 3 are possible",
        "C[O+](C)(C)C|O2 (charge +1) has 4 bonds, hydrogens counted, but at most 3 are possible",
        "CF(C)C|F2 has 3 bonds, hydrogens counted, but at most 1 are possible",
        "[Na+].CC(C)(C)(C)C|C3 has 5 bonds, hydrogens counted, but at most 4 are possible",
        "[Na+].[Cl-]|there are only counter-ions in it ([Na+], [Cl-]), no substrate",
        "I:[Mg]Br|there are only counter-ions in it ([I-], [Mg+2], [Br-]), no substrate",
        "[H][H]|there is no atom other than hydrogen in it",
        "C[Zn]C|Zn2 is a metal with covalent bonds, which cannot be judged; give the organic part alone, or draw the metal as an ion",
        "C[Pd]Cl|Pd2 is a metal with covalent bonds, which cannot be judged; give the organic part alone, or draw the metal as an ion",
        "[BH2]1[H][BH2][H]1|H2 has 2 bonds; bridging hydrogens cannot be judged",
        "InChI=1S/nonsense|not an InChI that is understood",
        "xyzzy|neither SMILES nor a systematic name that is understood: xyzzy is unparsable due to the following being uninterpretable: xyzzy The following was not parseable: xyzzy",
    })
    void structuresThatCannotBeJudged(String text, String reason) {
        assertEquals(reason, refusal(text).lines().findFirst().orElseThrow());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "CCxC|not SMILES: unexpected character|2",
        "CC)C|not SMILES: closing of an unopened branch, SMILES may be truncated|2",
        "C1CC|not SMILES: unclosed ring detected, SMILES may be truncated|3",
        "CC(|not SMILES: unclosed branch detected, SMILES may be truncated|2",
        "CC[N|not SMILES: unparsable label in bracket atom|4",
        "CC[N+|not SMILES: unparsable label in bracket atom|5",
        "Cn1cccc1c1cccc1|the aromatic atoms cannot be given alternating single and double bonds; is a hydrogen missing, as in [nH]?|1",
        "ClCC(C)(C)(C)C|C3 has 5 bonds, hydrogens counted, but at most 4 are possible|3",
    })
    void smilesErrorsPointAtThePlace(String text, String reason, int column) {
        assertEquals(reason + "\n" + text + "\n" + " ".repeat(column) + "^", refusal(text));
    }

    @Test
    void caretOfLongTextShowsWhatIsNear() {
        String[] lines = refusal("C".repeat(500) + "x" + "C".repeat(500)).split("\n");
        assertEquals(3, lines.length);
        assertEquals(100, lines[1].length());
        assertEquals('x', lines[1].charAt(lines[2].indexOf('^')));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "\n\t "})
    void emptyInput(String text) {
        assertEquals("there is no structure: the text is empty", refusal(text));
    }

    @Test
    void severalLinesThatAreNoMolfile() {
        assertEquals("there are several lines, but no molfile: line 4 states neither V2000 nor V3000", refusal("CCO\nCCN"));
    }

    @Test
    void tooManyAtoms() throws MoleculeException {
        assertEquals(250, reader.read("C".repeat(250)).atomCount());
        assertEquals("there are 251 atoms in it; at most 250 heavy atoms are handled", refusal("C".repeat(251)));
        assertEquals("there are 19999 atoms in it; at most 250 heavy atoms are handled", refusal("C".repeat(19_999)));
        assertEquals("the text has 20001 characters; at most 20000 are read", refusal("C".repeat(20_001)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "bad-counts.mol|line 4 of the molfile: found 'x 11  0  0  0  0            999 V2000', expected the numbers of atoms and bonds, three places each",
        "bad-atom.mol|line 6 of the molfile: found '    here      1.0000    0.0000 C   0  0', expected atom 2 of 3: three coordinates and an element",
        "bad-bond.mol|line 9 of the molfile: found '  2  7  1  0', expected bond 2 of 2: two atom numbers from 1 to 3 and a bond type",
        "truncated.mol|line 7 of the molfile: the molfile breaks off, expected atom 3 of 3: three coordinates and an element",
        "no-end.mol|the molfile breaks off: there is no line 'M  END'",
        "bond-twice.mol|the molfile has two bonds between atoms 2 and 1",
        "self-bond-v3000.mol|the molfile has a bond from atom 2 to itself",
        "run-together.mol|line 8 of the molfile: found ' 12 2 1  0', expected bond 1 of 2: two atom numbers from 1 to 3 and a bond type",
        "radical.mol|C2 is a radical; radicals cannot be judged",
        "query-bond.mol|the bond between C1 and C2 is not single, double, triple or aromatic",
        "atom-list.mol|atom 2 is a query, not an element: draw one definite structure",
        "atom-list-aromatic.mol|atom 2 is a query, not an element: draw one definite structure",
        "r-group.mol|atom 2 is a placeholder (R1), not an element: draw the whole structure",
        "pyrrole-aromatic.mol|the aromatic bonds cannot be given alternating single and double orders; draw the ring with single and double bonds",
    })
    void molfilesThatCannotBeUsed(String file, String reason) {
        assertEquals(reason, refusal(MoleculeReaderTest.resource(file)));
    }

    @Test
    void nothingButTheRefusalIsSaid() {
        PrintStream before = System.err;
        ByteArrayOutputStream said = new ByteArrayOutputStream();
        System.setErr(new PrintStream(said, true, StandardCharsets.UTF_8));
        try {
            refusal(MoleculeReaderTest.resource("cut-line.mol"));
            refusal("xyzzy");
        } finally {
            System.setErr(before);
        }
        assertEquals("", said.toString(StandardCharsets.UTF_8));
    }

    @Test
    void controlCharactersAreNotPassedOn() {
        String refusal = refusal("[C\t\u001B[31m]C");
        assertTrue(refusal.contains("\uFFFD[31m"), refusal);
        assertTrue(refusal.chars().noneMatch(letter -> Character.isISOControl(letter) && letter != '\n'), refusal);
    }

    @Test
    void longTextsAndOddConnectionTables() {
        assertEquals("the name has 1002 characters; at most 1000 are read", refusal("quxyzzy ".repeat(125) + "zz"));
        assertEquals("the molfile has no line 'M  V30 COUNTS'", refusal(MoleculeReaderTest.resource("nitrophenol-v3000.mol").replace("COUNTS", "KOUNTS")));
        assertEquals("the molfile numbers C1 -3 in its atom map; expected 1 or more, or 0 for none", refusal("\n\n\n  1  0  0     0  0            999 V2000\n"
                + "    0.0000    0.0000    0.0000 C   0  0  0  0  0  0  0  0  0 -3  0  0\nM  END\n"));
        assertEquals("there is no atom in it", refusal("\n\n\n  0  0  0     0  0            999 V2000\nM  END\n"));
        assertEquals("not an InChI that is understood", refusal("InChI=1S/C2H6O/c1-2-9/h3H,2H2,1H3").split(":")[0]);
    }

    @Test
    void refusalNamesTheAtomByNumber() {
        MoleculeException refused = assertThrows(MoleculeException.class, () -> reader.read("ClC(C)(C)(C)C"));
        assertEquals(2, refused.inputNumber().orElseThrow());
        assertTrue(assertThrows(MoleculeException.class, () -> reader.read("")).inputNumber().isEmpty());
    }

    private String refusal(String text) {
        return assertThrows(MoleculeException.class, () -> reader.read(text)).getMessage();
    }
}
