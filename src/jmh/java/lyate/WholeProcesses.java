package lyate;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.stream.Stream;
import lyate.sheet.RouteSheet;

/**
 * Whole programs against one another, from starting the process to its end: a check and a bare reading of the same molecule,
 * the window and a bare frame, a sheet on one core and on two. Each pair runs in turns, so that a busy machine slows both.
 * Needs {@code target/lyate.jar}; argument: how many turns.
 */
public final class WholeProcesses {

    private static final Path JAR = Path.of("target", "lyate.jar").toAbsolutePath();
    private static final String JAVA = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    private static final List<String> SHORT_RUN = List.of("-Xlog:disable", "-XX:TieredStopAtLevel=1", "-XX:+UseSerialGC");
    private static final List<String> CHECK = List.of("check", "--substrate", FlaskBenchmark.SUBSTRATE, "--base", "LDA", "--solvent", "THF");
    private static final int SHEET_REPEATS = 500;

    private final Path folder;
    private final int turns;

    private WholeProcesses(Path folder, int turns) {
        this.folder = folder;
        this.turns = turns;
    }

    public static void main(String[] arguments) throws IOException, InterruptedException {
        if (!Files.exists(JAR)) {
            throw new IllegalStateException("there is no " + JAR + "; 'mvn -DskipTests package' makes it");
        }
        Path folder = Files.createTempDirectory("lyate-bench");
        WholeProcesses processes = new WholeProcesses(folder, arguments.length == 0 ? 15 : Integer.parseInt(arguments[0]));
        processes.check();
        processes.window();
        processes.sheet();
        try (Stream<Path> files = Files.walk(folder)) {
            files.sorted(Comparator.reverseOrder()).map(Path::toFile).forEach(File::delete);
        }
    }

    private void check() throws IOException, InterruptedException {
        List<String> bare = List.of("-cp", jarOf("lyate.BareReading") + File.pathSeparator + JAR, "lyate.BareReading", FlaskBenchmark.SUBSTRATE);
        List<String> check = with(List.of("-jar", JAR.toString()), CHECK);
        Map<String, List<String>> programs = new LinkedHashMap<>();
        programs.put("bare reading", bare);
        programs.put("java -jar lyate.jar check", check);
        compare("cold check, plain java", programs);
        programs.clear();
        programs.put("bare reading", with(archived("bare.jsa", bare), bare));
        programs.put("check", with(archived("check.jsa", check), check));
        compare("cold check, both with archive and short-run options as in src/launcher/lyate", programs);
    }

    private void window() throws IOException, InterruptedException {
        if (System.getenv("DISPLAY") == null) {
            System.out.println("no display: the window is not measured; start under xvfb-run");
            return;
        }
        List<String> start = List.of("-Duser.home=" + folder, "-cp", JAR + File.pathSeparator + jarOf("lyate.window.WindowStart"),
                "lyate.window.WindowStart");
        List<String> bare = with(start, List.of("bare"));
        List<String> window = with(start, List.of("window"));
        List<String> reviewed = with(start, List.of("reviewed"));
        Map<String, List<String>> programs = new LinkedHashMap<>();
        programs.put("bare frame", bare);
        programs.put("window stands and takes input", window);
        programs.put("first review on screen", reviewed);
        compare("window, plain java", programs);
        programs.clear();
        List<String> archive = archived("window.jsa", with(reviewed, List.of("archive")));
        programs.put("bare frame", with(archived("frame.jsa", with(bare, List.of("archive"))), bare));
        programs.put("window stands and takes input", with(archive, window));
        programs.put("first review on screen", with(archive, reviewed));
        compare("window, both with archive and short-run options as in src/launcher/lyate", programs);
    }

    private void sheet() throws IOException, InterruptedException {
        Path sheet = folder.resolve("sheet.csv");
        RouteSheet route = BatchBenchmark.demoRoute();
        StringBuilder text = new StringBuilder(String.join(",", route.header().names())).append('\n');
        for (int i = 0; i < SHEET_REPEATS; i++) {
            route.rows().forEach(row -> text.append(String.join(",", row.cells().stream().map(WholeProcesses::quoted).toList())).append('\n'));
        }
        Files.writeString(sheet, text, StandardCharsets.UTF_8);
        List<String> review = List.of("-Xmx512m", "-jar", JAR.toString(), "review", sheet.toString(), "-o", folder.resolve("out.csv").toString());
        Map<String, List<String>> programs = new LinkedHashMap<>();
        programs.put("two cores", with(review, List.of("--threads", "2")));
        programs.put("one core", with(review, List.of("--threads", "1")));
        // Each takes many seconds; three turns tell.
        compare(SHEET_REPEATS * route.rows().size() + " steps, start-up included", programs, Math.min(turns, 3));
    }

    /** Runs the programs in turns and reports each against the first. */
    private void compare(String what, Map<String, List<String>> programs) throws IOException, InterruptedException {
        compare(what, programs, turns);
    }

    private static void compare(String what, Map<String, List<String>> programs, int turns) throws IOException, InterruptedException {
        Map<String, double[]> seconds = new LinkedHashMap<>();
        programs.keySet().forEach(name -> seconds.put(name, new double[turns]));
        for (int turn = 0; turn < turns; turn++) {
            for (Map.Entry<String, List<String>> program : programs.entrySet()) {
                seconds.get(program.getKey())[turn] = seconds(program.getValue());
            }
        }
        System.out.printf(Locale.ROOT, "%n%s, %d turns%n", what, turns);
        double first = median(seconds.values().iterator().next());
        seconds.forEach((name, measured) -> System.out.printf(Locale.ROOT, "  %-46s median %6.0f ms, fastest %6.0f ms, ratio of medians %.2f%n",
                name, 1000 * median(measured), 1000 * Arrays.stream(measured).min().orElseThrow(), median(measured) / first));
    }

    private static double seconds(List<String> program) throws IOException, InterruptedException {
        List<String> command = with(List.of(JAVA), program);
        long start = System.nanoTime();
        Process process = new ProcessBuilder(command).redirectErrorStream(true).redirectOutput(ProcessBuilder.Redirect.DISCARD).start();
        int code = process.waitFor();
        if (code != 0) {
            throw new IllegalStateException("ended with " + code + ": " + String.join(" ", command));
        }
        return (System.nanoTime() - start) / 1e9;
    }

    private static double median(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        return sorted[sorted.length / 2];
    }

    /** Runs a program once to archive its classes; the options that use the archive. */
    private List<String> archived(String name, List<String> program) throws IOException, InterruptedException {
        Path archive = folder.resolve(name);
        seconds(with(SHORT_RUN, with(List.of("-XX:ArchiveClassesAtExit=" + archive), program)));
        return with(SHORT_RUN, List.of("-XX:SharedArchiveFile=" + archive));
    }

    /** A class of the benchmarks in a jar of its own: only classes from jars go into an archive. */
    private Path jarOf(String className) throws IOException {
        Path jar = folder.resolve(className + ".jar");
        String entry = className.replace('.', '/') + ".class";
        try (JarOutputStream out = new JarOutputStream(Files.newOutputStream(jar));
                InputStream code = WholeProcesses.class.getResourceAsStream("/" + entry)) {
            out.putNextEntry(new JarEntry(entry));
            code.transferTo(out);
        }
        return jar;
    }

    private static String quoted(String cell) {
        return '"' + cell.replace("\"", "\"\"") + '"';
    }

    private static List<String> with(List<String> first, List<String> second) {
        List<String> all = new ArrayList<>(first);
        all.addAll(second);
        return all;
    }
}
