package lyate.acidity.lfer;

import java.util.List;
import lyate.site.Role;

/**
 * Everything the relationships know about one site.
 *
 * @param series      the series it belongs to
 * @param equivalent  how many equivalent atoms the molecule has
 * @param terms       its descriptors, each once
 * @param environment its surroundings, for comparison with measured relatives
 * @param missing     what could only be described roughly, in words
 */
public record SiteDescription(Series series, int equivalent, List<Term> terms, Environment environment, List<String> missing) {

    public SiteDescription {
        terms = List.copyOf(terms);
        missing = List.copyOf(missing);
    }

    /** What the number of equivalent places adds to the pKa of one of them. */
    public double statistics() {
        return (series.role() == Role.ACID ? -1 : 1) * Math.log10(equivalent);
    }
}
