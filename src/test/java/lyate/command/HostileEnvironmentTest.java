package lyate.command;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The program in surroundings that are not its own: other countries, a home it may not write to, a full disk. */
class HostileEnvironmentTest {

    @TempDir
    private static Path shared;
    private static Map<String, String> expected;

    @TempDir
    private Path folder;

    @BeforeAll
    static void outputs() throws Exception {
        expected = outputs(shared, List.of("-Duser.language=en", "-Duser.country=GB", "-Duser.timezone=UTC", "-Dfile.encoding=UTF-8"));
    }

    @Test
    void everyOutputIsTheSameWhereCapitalIHasADot() throws Exception {
        assertSame(outputs(folder, List.of("-Duser.language=tr", "-Duser.country=TR", "-Duser.timezone=Asia/Kathmandu", "-Dfile.encoding=ISO-8859-9")));
    }

    @Tag("slow")
    @ParameterizedTest
    @CsvSource({"tr,TR,Asia/Kathmandu,ISO-8859-9", "de,DE,America/St_Johns,US-ASCII", "ar,EG,Pacific/Apia,windows-1256", "th,TH,Asia/Bangkok,UTF-8"})
    void everyOutputIsTheSameInEveryCountry(String language, String country, String zone, String encoding) throws Exception {
        List<String> options = new ArrayList<>(List.of("-Duser.language=" + language, "-Duser.country=" + country, "-Duser.timezone=" + zone,
                "-Dfile.encoding=" + encoding));
        if (language.equals("ar") || language.equals("th")) {
            options.add("-Duser.extensions=u-nu-" + (language.equals("ar") ? "arab" : "thai"));
        }
        assertSame(outputs(folder, options));
    }

    @Test
    @Tag("slow")
    void nothingIsWrittenToTheHome() throws Exception {
        Path home = Files.writeString(folder.resolve("home"), "a file where a folder should be");
        Path temporary = Files.createDirectory(folder.resolve("temporary"));
        assertSame(outputs(Files.createDirectory(folder.resolve("work")), List.of("-Duser.home=" + home + "/none",
                "-Djava.util.prefs.userRoot=" + home + "/none", "-Djava.io.tmpdir=" + temporary, "-XX:-UsePerfData")));
        try (Stream<Path> left = Files.list(temporary)) {
            assertEquals(List.of(), left.toList());
        }
    }

    @Test
    void noCellOfAnyCsvIsAFormula() throws IOException {
        int tables = 0;
        for (Map.Entry<String, String> output : expected.entrySet()) {
            String first = output.getValue().lines().findFirst().orElse("");
            if (output.getKey().startsWith("out-") && first.matches("[a-z]\\w+(,\\w+){4,}")) {
                tables++;
                for (CSVRecord row : CSVFormat.RFC4180.parse(new StringReader(output.getValue()))) {
                    row.forEach(cell -> assertTrue(cell.matches("(?s)([^=+\\-@\t\r].*)?|[-+]?[\\d.]+(e-?\\d+)?|-?inf"), output.getKey() + ": " + cell));
                }
            }
        }
        assertEquals(6, tables);
        assertTrue(expected.get("out-9.txt").contains("'=1+1") && expected.get("out-9.txt").contains("'@SUM(A1)"), expected.get("out-9.txt"));
    }

    @Test
    void filesAreReadableAsAnyOther() throws IOException {
        assumeTrue(Files.getFileStore(shared).supportsFileAttributeView("posix"));
        String usual = PosixFilePermissions.toString(Files.getPosixFilePermissions(shared.resolve("sheet.csv")));
        for (String name : List.of("result.json", "route.html")) {
            assertEquals(usual, PosixFilePermissions.toString(Files.getPosixFilePermissions(shared.resolve(name))), name);
        }
    }

    @Test
    void aFullStandardOutputIsToldApartFromSuccess() throws Exception {
        assumeTrue(Files.exists(Path.of("/dev/full")));
        Path err = folder.resolve("err");
        Process process = CommandRun.process(List.of(), "tables").redirectOutput(Path.of("/dev/full").toFile()).redirectError(err.toFile()).start();
        assertTrue(process.waitFor(120, TimeUnit.SECONDS));
        assertEquals(1, process.exitValue());
        assertEquals("lyate: the results cannot be written to standard output: it is closed, or the disk is full\n", Files.readString(err));
    }

    /** The largest file a process may write stands for the disk; the answer of the system is an error to write either way. */
    @Test
    void aDiskThatFillsUpLosesNoFinishedRow() throws Exception {
        assumeTrue(Files.exists(Path.of("/bin/bash")));
        StringBuilder rows = new StringBuilder("step,substrate,base,solvent\n");
        for (int row = 0; row < 300; row++) {
            rows.append(row).append(",CC(C)=O,LDA,THF\n");
        }
        Path sheet = Files.writeString(folder.resolve("sheet.csv"), rows);
        Path result = folder.resolve("result.csv");
        List<String> command = new ArrayList<>(List.of("/bin/bash", "-c", "ulimit -f 8; exec \"$@\"", "bash"));
        command.addAll(CommandRun.process(List.of("-XX:-UsePerfData"), "review", sheet.toString(), "-o", result.toString()).command());
        Path err = folder.resolve("err");
        Process full = new ProcessBuilder(command).redirectError(err.toFile()).start();
        assertTrue(full.waitFor(120, TimeUnit.SECONDS));
        assertEquals(1, full.exitValue());
        assertTrue(Files.readString(err).startsWith("lyate review: the result cannot be written: "), Files.readString(err));
        assertTrue(Files.readString(err).endsWith(".part, --resume goes on from there\n"), Files.readString(err));
        assertFalse(Files.exists(result));
        assertEquals(0, CommandRun.of("", "review", sheet.toString(), "-o", result.toString(), "--resume").code());
        Path whole = folder.resolve("whole.csv");
        CommandRun.of("", "review", sheet.toString(), "-o", whole.toString());
        assertArrayEquals(Files.readAllBytes(whole), Files.readAllBytes(result));
    }

    private static void assertSame(Map<String, String> outputs) {
        assertEquals(expected.keySet(), outputs.keySet());
        expected.forEach((name, text) -> assertEquals(text, outputs.get(name), name));
    }

    /** Every file that the commands leave, by name; the folder's own name is taken out of them. */
    private static Map<String, String> outputs(Path folder, List<String> options) throws Exception {
        List<String> command = new ArrayList<>(CommandRun.process(options).command());
        command.set(command.size() - 1, AllOutputs.class.getName());
        command.add(folder.toString());
        Process process = new ProcessBuilder(command).redirectErrorStream(true).start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertTrue(process.waitFor(240, TimeUnit.SECONDS));
        assertEquals(0, process.exitValue(), said);
        Map<String, String> files = new TreeMap<>();
        try (Stream<Path> all = Files.list(folder)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                files.put(file.getFileName().toString(), Files.readString(file).replace(folder.toString(), "FOLDER"));
            }
        }
        return files;
    }
}
