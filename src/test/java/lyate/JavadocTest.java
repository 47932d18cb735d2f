package lyate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every public type says what it is; the Javadoc tool checks only what is written. */
class JavadocTest {

    /** A public type at the end of lines that are neither the end of a comment nor an annotation. */
    private static final Pattern UNTOLD = Pattern.compile(
            "(?m)^(?!\\s*@)(?!.*\\*/$).*\\R(?:\\s*@.*\\R)*\\s*public (?:(?:static|final|abstract|sealed|non-sealed) )*(?:class|record|interface|enum) (\\w+)");

    @Test
    void everyPublicTypeIsDocumented() throws IOException {
        try (Stream<Path> sources = Files.walk(Path.of("src/main/java"))) {
            List<String> untold = sources.filter(file -> file.toString().endsWith(".java"))
                    .flatMap(file -> UNTOLD.matcher(read(file)).results().map(type -> file.getFileName() + ": " + type.group(1))).toList();
            assertEquals(List.of(), untold);
        }
    }

    private static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
