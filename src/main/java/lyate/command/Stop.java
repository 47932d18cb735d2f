package lyate.command;

import java.util.Iterator;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/**
 * Ctrl-C or a request to end: no further row is begun, those begun are finished and written. The program ends when this
 * is closed, or after half a minute.
 */
final class Stop implements AutoCloseable {

    private static final long MOST_SECONDS = 30;

    private final CountDownLatch closed = new CountDownLatch(1);
    private final Thread hook = new Thread(this::ask, "stop");
    private volatile boolean asked;

    static Stop onSignal() {
        Stop stop = new Stop();
        Runtime.getRuntime().addShutdownHook(stop.hook);
        return stop;
    }

    private void ask() {
        asked = true;
        try {
            closed.await(MOST_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    boolean asked() {
        return asked;
    }

    /** The rows up to the moment the program is asked to end. */
    <T> Iterator<T> until(Iterator<T> rows) {
        return new Iterator<>() {
            @Override
            public boolean hasNext() {
                return !asked && rows.hasNext();
            }

            @Override
            public T next() {
                return rows.next();
            }
        };
    }

    @Override
    public void close() {
        closed.countDown();
        if (!asked) {
            try {
                Runtime.getRuntime().removeShutdownHook(hook);
            } catch (IllegalStateException e) {
                asked = true; // the program is ending this very moment
            }
        }
    }
}
