package lyate.window;

import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import javax.swing.SwingUtilities;
import lyate.review.ReviewException;

/** Does what may take longer, one thing at a time; a new request makes the one before give up. */
final class Background implements AutoCloseable {

    /** Work that looks up now and then whether it is still wanted. */
    @FunctionalInterface
    interface Work<T> {
        T run(BooleanSupplier goOn) throws ReviewException;
    }

    private final AtomicLong latest = new AtomicLong();
    private final ExecutorService worker;

    Background(String name) {
        worker = Executors.newSingleThreadExecutor(task -> {
            Thread thread = new Thread(task, name);
            thread.setDaemon(true);
            thread.setPriority(Thread.MIN_PRIORITY);
            return thread;
        });
    }

    /**
     * Starts work; the result arrives on the event thread, unless a later request came in between.
     *
     * @param failed told in words why there is no result
     */
    <T> void start(Work<T> work, Consumer<T> done, Consumer<String> failed) {
        long ticket = latest.incrementAndGet();
        worker.execute(() -> {
            try {
                if (ticket == latest.get()) {
                    T result = work.run(() -> ticket == latest.get());
                    deliver(ticket, () -> done.accept(result));
                }
            } catch (ReviewException e) {
                deliver(ticket, () -> failed.accept(e.getMessage()));
            } catch (RuntimeException e) {
                deliver(ticket, () -> failed.accept("the program met a fault: " + e));
            }
        });
    }

    /** Makes running work give up. */
    void cancel() {
        latest.incrementAndGet();
    }

    private void deliver(long ticket, Runnable delivery) {
        SwingUtilities.invokeLater(() -> {
            if (ticket == latest.get()) {
                delivery.run();
            }
        });
    }

    @Override
    public void close() {
        worker.shutdownNow();
    }
}
