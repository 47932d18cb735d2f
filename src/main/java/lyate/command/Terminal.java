package lyate.command;

import java.io.BufferedReader;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/**
 * Where a command reads and writes; always UTF-8.
 *
 * @param in          standard input
 * @param outWriter   results
 * @param errWriter   progress and errors
 * @param interactive whether a person types and reads the results
 * @param watched     whether a person reads what goes to standard error
 */
record Terminal(InputStream in, PrintWriter outWriter, PrintWriter errWriter, boolean interactive, boolean watched) {

    /** The results go past {@code System.out}, which hides that a disk is full. */
    static Terminal ofSystem() {
        boolean console = System.console() != null;
        return new Terminal(System.in, writer(new FileOutputStream(FileDescriptor.out)), writer(System.err), console,
                console || standardErrorIsATerminal());
    }

    static Terminal of(InputStream in, OutputStream out, OutputStream err, boolean interactive) {
        return new Terminal(in, writer(out), writer(err), interactive, interactive);
    }

    /** Java knows of a console only where input and output are one; Linux tells of each stream. */
    private static boolean standardErrorIsATerminal() {
        try {
            String device = Path.of("/proc/self/fd/2").toRealPath().toString();
            return device.startsWith("/dev/pts/") || device.startsWith("/dev/tty");
        } catch (IOException e) {
            return false;
        }
    }

    private static PrintWriter writer(OutputStream stream) {
        return new PrintWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8), false);
    }

    /** Standard input as text. */
    BufferedReader reader() {
        return reader(in);
    }

    /** A stream as text; what is not UTF-8 becomes U+FFFD. */
    static BufferedReader reader(InputStream stream) {
        return new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8));
    }

    /** Sees to it that the results so far are out. @throws IOException where they cannot be written */
    void flushResults() throws IOException {
        if (outWriter.checkError()) {
            throw new IOException("the results cannot be written to standard output: it is closed, or the disk is full");
        }
    }

    /** One message for the user. */
    void tell(String message) {
        outWriter.flush();
        errWriter.println(message);
        errWriter.flush();
    }

    void flush() {
        outWriter.flush();
        errWriter.flush();
    }
}
