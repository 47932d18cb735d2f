package lyate.table;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.apache.commons.text.similarity.JaroWinklerSimilarity;

/** Answers an unknown name with the known ones that look most like it. */
public final class NearestNames {

    private NearestNames() {}

    /** At most {@code count} of {@code known}, most similar first; ties keep the order of {@code known}. */
    public static List<String> of(String unknown, Collection<String> known, int count) {
        JaroWinklerSimilarity similarity = new JaroWinklerSimilarity();
        String wanted = unknown.toLowerCase(Locale.ROOT);
        return known.stream().distinct()
                .sorted(Comparator.comparingDouble(name -> -similarity.apply(wanted, name.toLowerCase(Locale.ROOT))))
                .limit(count).toList();
    }
}
