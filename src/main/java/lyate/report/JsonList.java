package lyate.report;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.ObjectWriter;
import java.io.IOException;
import java.util.Map;
import java.util.function.Function;

/**
 * A JSON array written element by element.
 *
 * @param <T> what an element is made of
 */
public final class JsonList<T> implements ResultWriter<T> {

    private final Appendable out;
    private final Function<T, Map<String, Object>> describe;
    private final ObjectWriter writer = new ObjectMapper().writerWithDefaultPrettyPrinter();
    private boolean any;

    /** Opens the array at once. */
    public JsonList(Appendable out, Function<T, Map<String, Object>> describe) throws IOException {
        this.out = out;
        this.describe = describe;
        out.append('[');
    }

    @Override
    public void write(T result) throws IOException {
        out.append(any ? ",\n" : "\n").append(writer.writeValueAsString(describe.apply(result)).replace("\r\n", "\n"));
        any = true;
    }

    @Override
    public void finish() throws IOException {
        out.append(any ? "\n]\n" : "]\n");
    }
}
