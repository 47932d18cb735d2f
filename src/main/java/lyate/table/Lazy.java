package lyate.table;

import java.util.Objects;
import java.util.function.Supplier;

/**
 * A value worked out when it is first asked for, once, and kept. Safe to share between threads; where working it out fails,
 * the next one to ask tries again.
 */
public final class Lazy<T> implements Supplier<T> {

    private final Supplier<T> work;
    private volatile T value;

    private Lazy(Supplier<T> work) {
        this.work = work;
    }

    /**
     * One that is worked out when asked for.
     *
     * @param work pure; never gives null
     */
    public static <T> Lazy<T> of(Supplier<T> work) {
        return new Lazy<>(work);
    }

    /** One that is there already. */
    public static <T> Lazy<T> known(T value) {
        Lazy<T> known = new Lazy<>(() -> value);
        known.value = Objects.requireNonNull(value);
        return known;
    }

    @Override
    public T get() {
        T known = value;
        return known == null ? workOut() : known;
    }

    private synchronized T workOut() {
        if (value == null) {
            value = Objects.requireNonNull(work.get());
        }
        return value;
    }
}
