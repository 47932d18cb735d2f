package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the README shows is what the program does. */
class ReadmeTest {

    private static final Path README = Path.of("README.md");
    private static final String PROGRAM = "    java -jar target/lyate.jar ";

    @TempDir
    private Path folder;

    @Test
    void theFirstCheckPrintsWhatTheReadmeShows() throws IOException {
        String readme = Files.readString(README);
        Matcher fence = Pattern.compile("```\n(.*?)```", Pattern.DOTALL).matcher(readme);
        assertTrue(fence.find(), "the README shows an output");
        String output = run(commands(readme, "check").get(0));
        assertTrue(output.startsWith(fence.group(1).stripTrailing()), output);
    }

    @Test
    void theFirstSheetRuns() throws IOException {
        for (String command : commands(Files.readString(README), "review")) {
            run(command.replace("result.csv", folder.resolve("result.csv").toString()));
        }
        assertEquals(13, Files.readAllLines(folder.resolve("result.csv")).stream().filter(line -> !line.startsWith("#")).count());
    }

    private static List<String> commands(String readme, String subcommand) {
        return readme.lines().filter(line -> line.startsWith(PROGRAM + subcommand)).map(line -> line.substring(PROGRAM.length())).toList();
    }

    private static String run(String command) {
        List<String> arguments = new ArrayList<>();
        Matcher words = Pattern.compile("\"([^\"]*)\"|(\\S+)").matcher(command);
        while (words.find()) {
            arguments.add(words.group(1) != null ? words.group(1) : words.group(2));
        }
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Terminal terminal = Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false);
        assertEquals(0, Lyate.run(terminal, arguments.toArray(String[]::new)), err.toString(StandardCharsets.UTF_8));
        return out.toString(StandardCharsets.UTF_8);
    }
}
