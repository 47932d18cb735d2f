package lyate.stock;

import java.util.List;
import java.util.stream.Stream;

/** Something on the shelf that is found by name. */
public interface Named {

    /** Stable name. */
    String id();

    /** Usual name. */
    String name();

    /** Other names and abbreviations. */
    List<String> aliases();

    /** Every name it is found by. */
    default Stream<String> names() {
        return Stream.concat(Stream.of(name(), id()), aliases().stream());
    }
}
