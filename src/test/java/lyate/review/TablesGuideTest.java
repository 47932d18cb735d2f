package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The examples of docs/tables.md work as printed. */
class TablesGuideTest {

    private static final Path GUIDE = Path.of("docs", "tables.md");
    private static final Pattern BLOCK = Pattern.compile("```csv (\\S+)\\n(.*?)```", Pattern.DOTALL);

    @Test
    void theTablesPrintedInTheGuideCanBeUsed(@TempDir Path folder) throws Exception {
        Matcher blocks = BLOCK.matcher(Files.readString(GUIDE));
        Set<String> written = new TreeSet<>();
        while (blocks.find()) {
            Files.writeString(folder.resolve(blocks.group(1)), blocks.group(2));
            written.add(blocks.group(1));
        }
        assertEquals(Set.of("bases.csv", "measured-acidities.csv", "side-reactions.csv"), written);

        TableFolders folders = TableFolders.overlaidBy(folder);
        StepReviewer.load(folders);
        assertEquals(List.of(), RuleExamples.load(folders).problemsOfOwnRows());
        assertEquals("na-methoxyethoxide", Stockroom.load(folders).base("NaOCH2CH2OMe").id());
    }

    @Test
    void theGuideExplainsEveryColumnOfTheRules() throws IOException {
        String guide = Files.readString(GUIDE);
        SideReactionTable.SCHEMA.columns().forEach(column ->
                assertTrue(guide.contains("`" + column.name() + "`"), "the guide does not explain " + column.name()));
    }

    @Test
    void everyTableNamedInTheGuideIsThere() throws IOException {
        Matcher names = Pattern.compile("`([a-z-]+\\.csv)`").matcher(Files.readString(GUIDE));
        Set<String> named = new TreeSet<>();
        while (names.find()) {
            named.add(names.group(1));
        }
        assertTrue(named.size() > 10, named.toString());
        named.forEach(name -> assertTrue(Files.exists(Path.of("reagent-tables", name)), "there is no " + name));
    }
}
