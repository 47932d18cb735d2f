package lyate.command;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** What a run of the command line left behind. */
record CommandRun(int code, String out, String err) {

    /** In this program. */
    static CommandRun of(String in, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Lyate.run(Terminal.of(new ByteArrayInputStream(in.getBytes(StandardCharsets.UTF_8)), out, err, false), arguments);
        return new CommandRun(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    /** As a process of its own, which can be killed and has its own disk, locale and home. */
    static ProcessBuilder process(List<String> javaOptions, String... arguments) {
        List<String> command = new ArrayList<>(List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-XX:TieredStopAtLevel=1"));
        command.addAll(javaOptions);
        command.addAll(List.of("-cp", System.getProperty("java.class.path"), Lyate.class.getName()));
        command.addAll(List.of(arguments));
        return new ProcessBuilder(command);
    }
}
