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

    /** Name for a narrow place: a long one gives way to the first abbreviation. */
    default String shortName() {
        boolean tooLong = name().length() > 8 && !aliases().isEmpty();
        return tooLong ? aliases().get(0) : name();
    }

    /** Every name it is found by, those people write first. */
    default Stream<String> names() {
        return Stream.of(Stream.of(name()), aliases().stream(), Stream.of(id())).flatMap(names -> names);
    }
}
