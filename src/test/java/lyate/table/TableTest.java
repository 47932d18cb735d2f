package lyate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A table is read, or every problem in it is named so that its owner can mend it. */
class TableTest {

    private static final Schema COLOURS = Schema.of("colours.csv", Column.text("id"), Column.text("name"),
            Column.number("ph"), Column.word("kind", "azo", "lactone", "sultone"), Column.list("aliases"));

    @Test
    void rowsAreReadInOrderWithTheirLines() {
        List<Row> rows = read("sound");
        assertEquals(List.of("mo", "pp", "btb"), rows.stream().map(Row::id).toList());
        assertEquals(List.of(5, 8, 11), rows.stream().map(Row::line).toList());
        assertEquals("phenolphthalein,\nsecond line", rows.get(1).text("name"));
        assertEquals(List.of("pp", "phth"), rows.get(1).list("aliases"));
        assertEquals(9.3, rows.get(1).number("ph").orElseThrow());
        assertTrue(rows.get(0).list("aliases").isEmpty());
    }

    @Test
    void byteOrderMarkAndWindowsLineEndsAreRead() {
        Row row = read("bom-crlf").get(0);
        assertEquals("mo", row.id());
        assertEquals(3, row.line());
        assertEquals(List.of("a", "b"), row.list("aliases"));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "not-a-number|5: column ph: found 'seven', expected a number such as 10.5",
        "infinite|3: column ph: found '1e999', expected a number such as 10.5",
        "empty-cell|3: column name: found '', expected a value",
        "unknown-word|3: column kind: found 'azoo', expected one of azo, lactone, sultone",
        "unknown-column|2: column pH: found 'pH', expected one of ph, id, name",
        "column-twice|2: column name: found 'name', expected every column once",
        "missing-column|2: column ph: found 'no such column', expected a column ph",
        "too-few-cells|3: found '3 cells', expected 5 cells, as in the header",
        "duplicate-id|7: column id: found 'mo', expected an id of its own; line 3 has the same",
        "after-quoted-newlines|6: column ph: found 'acid', expected a number such as 10.5",
        "unclosed-quote|4: found 'btb,\"bromothymol blue,7.1,sultone,', expected well-formed CSV: every quoted cell closed, and nothing after its closing quote",
        "other-version|2: found '# version: 2', expected a line '# version: 1' among the leading # lines",
        "no-version|1: found '', expected a line '# version: 1' among the leading # lines",
    })
    void defectIsNamedWithItsPlace(String folder, String message) {
        TableException broken = assertThrows(TableException.class, () -> read(folder));
        assertEquals(file(folder) + ":" + message, broken.getMessage().lines().findFirst().orElseThrow());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "no-header|: found 'no header line', expected a header line with id,name,ph,kind,aliases",
        "not-utf8|: found 'bytes that are not UTF-8', expected UTF-8 text",
    })
    void defectOfTheWholeFile(String folder, String message) {
        assertEquals(file(folder) + message, assertThrows(TableException.class, () -> read(folder)).getMessage());
    }

    @Test
    void problemShowsTheNeighbouringLinesAndThePlace() {
        TableException broken = assertThrows(TableException.class, () -> read("not-a-number"));
        assertEquals(file("not-a-number") + """
                :5: column ph: found 'seven', expected a number such as 10.5
                      4 | mo,methyl orange,3.4,azo,
                >     5 | btb,bromothymol blue,seven,sultone,
                        |                      ^
                      6 | pp,phenolphthalein,9.3,lactone,""", broken.getMessage());
    }

    @Test
    void longLinesAreCutToWhatIsNear() {
        TableText text = TableText.of("wide.csv", "a".repeat(300) + ",wrong," + "b".repeat(300));
        String[] lines = text.problem(1, "c", "wrong", "right").toString().split("\n");
        assertTrue(lines[1].length() < 120, lines[1]);
        assertEquals(lines[1].indexOf("wrong"), lines[2].indexOf('^'));
    }

    @Test
    void everyProblemIsReportedNotJustTheFirst() {
        TableException broken = assertThrows(TableException.class, () -> read("two-problems"));
        assertEquals(List.of("name", "ph"), broken.problems().stream().map(TableProblem::column).toList());
    }

    @Test
    void laterFolderReplacesAndAddsRows(@TempDir Path mine) throws IOException {
        Files.writeString(mine.resolve("colours.csv"),
                "# version: 1\nid,name,ph,kind,aliases\nmo,mine,4.0,azo,\ntb,thymol blue,8.9,sultone,\n");
        List<Row> rows = Table.read(COLOURS, new TableFolders(List.of(file("sound").getParent(), mine))).rows();
        assertEquals(List.of("mo", "pp", "btb", "tb"), rows.stream().map(Row::id).toList());
        assertEquals("mine", rows.get(0).text("name"));
        assertEquals(mine.resolve("colours.csv").toString(), rows.get(0).file());
    }

    @Test
    void tableThatIsNowhere(@TempDir Path empty) {
        assertEquals("colours.csv: found 'no such file', expected a table", assertThrows(TableException.class,
                () -> Table.read(COLOURS, TableFolders.overlaidBy(empty))).getMessage());
    }

    @Test
    void problemOfARowShowsItsLine() {
        TableProblem problem = read("sound").get(2).problem("ph", "something between 0 and 7");
        assertTrue(problem.toString().startsWith(file("sound") + ":11: column ph: found '7.1', expected something between 0 and 7\n"));
        assertTrue(problem.excerpt().contains(">    11 | btb,bromothymol blue,7.1"), problem.excerpt());
    }

    private static List<Row> read(String folder) {
        return Table.read(COLOURS, TableFolders.overlaidBy(file(folder).getParent())).rows();
    }

    private static Path file(String folder) {
        try {
            return Path.of(TableTest.class.getResource("/tables/" + folder).toURI()).resolve("colours.csv");
        } catch (URISyntaxException e) {
            throw new IllegalStateException(e);
        }
    }
}
