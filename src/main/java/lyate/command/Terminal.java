package lyate.command;

import java.io.BufferedReader;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;

/**
 * Where a command reads and writes; always UTF-8.
 *
 * @param in          standard input
 * @param outWriter   results
 * @param errWriter   progress and errors
 * @param interactive whether a person watches
 */
record Terminal(InputStream in, PrintWriter outWriter, PrintWriter errWriter, boolean interactive) {

    static Terminal ofSystem() {
        return of(System.in, System.out, System.err, System.console() != null);
    }

    static Terminal of(InputStream in, OutputStream out, OutputStream err, boolean interactive) {
        return new Terminal(in, writer(out), writer(err), interactive);
    }

    private static PrintWriter writer(OutputStream stream) {
        return new PrintWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8), false);
    }

    /** Standard input as text. */
    BufferedReader reader() {
        return new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
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
