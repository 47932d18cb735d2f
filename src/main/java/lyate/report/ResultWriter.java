package lyate.report;

import java.io.IOException;

/**
 * Writes results one by one, so that a long run needs no more memory than a short one.
 *
 * @param <T> what a result is
 */
public interface ResultWriter<T> {

    /** Writes one result. */
    void write(T result) throws IOException;

    /** Writes what comes after the last result. */
    default void finish() throws IOException {}
}
