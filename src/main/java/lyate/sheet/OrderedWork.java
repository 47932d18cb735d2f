package lyate.sheet;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.Iterator;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import java.util.function.Function;

/**
 * Does one thing to every item of a stream on several threads and hands the results on in the order of the items.
 * Holds only a few items at a time, however long the stream.
 *
 * @param threads how many to use, at least 1
 */
public record OrderedWork(int threads) {

    private static final int ITEMS_PER_TASK = 16;
    private static final int TASKS_PER_THREAD = 4;

    public OrderedWork {
        if (threads < 1) {
            throw new IllegalArgumentException("threads: found " + threads + ", expected at least 1");
        }
    }

    /**
     * Runs to the end of the items, or until this thread is interrupted.
     *
     * @param items   drawn on this thread
     * @param work    pure; called on several threads
     * @param results called on this thread, in the order of the items
     */
    public <I, O> void run(Iterator<I> items, Function<I, O> work, Consumer<O> results) {
        if (threads == 1) {
            while (items.hasNext() && !Thread.currentThread().isInterrupted()) {
                results.accept(work.apply(items.next()));
            }
            return;
        }
        ExecutorService pool = Executors.newFixedThreadPool(threads);
        try {
            Deque<Future<List<O>>> running = new ArrayDeque<>();
            while (items.hasNext() || !running.isEmpty()) {
                while (items.hasNext() && running.size() < threads * TASKS_PER_THREAD) {
                    List<I> some = some(items);
                    running.addLast(pool.submit(() -> some.stream().map(work).toList()));
                }
                running.removeFirst().get().forEach(results);
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        } catch (ExecutionException e) {
            throw new IllegalStateException(e.getCause());
        } finally {
            pool.shutdownNow();
        }
    }

    private static <I> List<I> some(Iterator<I> items) {
        List<I> some = new ArrayList<>();
        while (items.hasNext() && some.size() < ITEMS_PER_TASK) {
            some.add(items.next());
        }
        return some;
    }
}
