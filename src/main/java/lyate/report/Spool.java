package lyate.report;

import java.io.BufferedReader;
import java.io.BufferedWriter;
import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/** Keeps text that comes later in a document than it is made, on the disk, so that a long report needs little memory. */
final class Spool implements AutoCloseable {

    private final FileChannel channel;
    private final Writer writer;

    Spool() throws IOException {
        Path file = Files.createTempFile("lyate-report", ".part");
        channel = FileChannel.open(file, StandardOpenOption.READ, StandardOpenOption.WRITE, StandardOpenOption.DELETE_ON_CLOSE);
        writer = new BufferedWriter(Channels.newWriter(channel, StandardCharsets.UTF_8));
    }

    void append(String text) throws IOException {
        writer.write(text);
    }

    /** Hands everything on, in the order it came. */
    void copyTo(Appendable out) throws IOException {
        writer.flush();
        channel.position(0);
        Reader reader = new BufferedReader(Channels.newReader(channel, StandardCharsets.UTF_8));
        char[] some = new char[8192];
        for (int count = reader.read(some); count >= 0; count = reader.read(some)) {
            out.append(new String(some, 0, count));
        }
    }

    @Override
    public void close() throws IOException {
        channel.close();
    }
}
