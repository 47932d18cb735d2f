package lyate.molecule;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;

/** A general cheminformatics toolkit (RDKit, Debian package python3-rdkit) that shares no code with this program. */
final class ReferenceToolkit {

    /** Of each heavy atom in input order; the size of the smallest ring is 0 where there is none. */
    record Facts(int[] hydrogens, int[] smallestRing, int[] aromatic, int[] symmetryClass, int[] configured) {

        private static Facts of(String line) {
            int[][] kinds = Arrays.stream(line.split("\t", -1))
                    .map(kind -> Arrays.stream(kind.split(" ")).mapToInt(Integer::parseInt).toArray()).toArray(int[][]::new);
            return new Facts(kinds[0], kinds[1], kinds[2], kinds[3], kinds[4]);
        }
    }

    private static final Path PYTHON = Path.of("/usr/bin/python3");

    private ReferenceToolkit() {}

    static boolean isInstalled() {
        try {
            return Files.isExecutable(PYTHON) && new ProcessBuilder(PYTHON.toString(), "-c", "from rdkit import Chem")
                    .redirectErrorStream(true).redirectOutput(ProcessBuilder.Redirect.DISCARD).start().waitFor() == 0;
        } catch (IOException e) {
            return false;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        }
    }

    /** Facts of each SMILES, empty where the toolkit does not read it. */
    static List<Optional<Facts>> ask(List<String> smiles, Path folder) {
        Path script = folder.resolve("reference.py");
        Path questions = folder.resolve("questions.smi");
        Path answers = folder.resolve("answers.tsv");
        try (var text = ReferenceToolkit.class.getResourceAsStream("reference.py")) {
            Files.copy(text, script);
            Files.write(questions, smiles, StandardCharsets.UTF_8);
            Process process = new ProcessBuilder(PYTHON.toString(), script.toString()).redirectInput(questions.toFile())
                    .redirectOutput(answers.toFile()).redirectError(ProcessBuilder.Redirect.INHERIT).start();
            if (!process.waitFor(5, TimeUnit.MINUTES) || process.exitValue() != 0) {
                process.destroyForcibly();
                throw new IllegalStateException("the reference toolkit did not finish");
            }
            return Files.readAllLines(answers, StandardCharsets.UTF_8).stream()
                    .map(line -> line.equals("-") ? Optional.<Facts>empty() : Optional.of(Facts.of(line))).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }
}
