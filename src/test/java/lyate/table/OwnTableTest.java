package lyate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class OwnTableTest {

    @Test
    void columnsThatMayBeEmptyMayBeLeftOut(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("colours.csv"), "# version: 1\nid,source\na,none\n");
        Schema schema = Schema.of("colours.csv", Column.text("id"), Column.number("ph").optional(), Column.list("aliases"),
                Column.text("source"));
        Row row = Table.read(schema, new TableFolders(List.of(folder))).rows().get(0);
        assertTrue(row.number("ph").isEmpty());
        assertEquals(List.of(), row.list("aliases"));
    }

    @Test
    void aBadCellLongerThanTheExcerptIsStillShown(@TempDir Path folder) throws IOException {
        String cell = "x".repeat(300);
        Files.writeString(folder.resolve("colours.csv"), "# version: 1\nid,colour,source\na," + cell + ",none\n");
        Schema schema = Schema.of("colours.csv", Column.text("id"), Column.word("colour", "red"), Column.text("source"));
        TableException e = assertThrows(TableException.class, () -> Table.read(schema, new TableFolders(List.of(folder))));
        assertEquals(1, e.problems().size());
        assertTrue(e.getMessage().contains("colours.csv:3") && e.getMessage().contains("^"), e.getMessage());
    }
}
