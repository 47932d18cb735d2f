package lyate.stock;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import lyate.table.NearestNames;
import lyate.table.TableException;
import lyate.table.TableProblem;

/** Things of one kind, found by any of their names; case, spaces and punctuation do not count. */
final class Shelf<T extends Named> {

    private static final int NEAREST = 5;
    /** So many names at least are looked at for each thing that is told. */
    private static final int MOST_NAMES = 8;

    private final String what;
    private final List<T> things;
    private final Map<String, T> byKey = new HashMap<>();

    /**
     * @param what     what one of them is called in messages
     * @param fileName table they came from
     * @throws TableException naming both rows where two share a name
     */
    Shelf(String what, String fileName, List<T> things) {
        this.what = what;
        this.things = List.copyOf(things);
        List<TableProblem> problems = new ArrayList<>();
        for (T thing : this.things) {
            Set<String> own = new HashSet<>();
            thing.names().filter(name -> own.add(key(name))).forEach(name -> {
                T other = byKey.putIfAbsent(key(name), thing);
                if (other != null) {
                    problems.add(new TableProblem(fileName, 0, "aliases", name,
                            "a name of its own in row " + thing.id() + " (row " + other.id() + " has the same)"));
                }
            });
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
    }

    List<T> all() {
        return things;
    }

    Optional<T> lookUp(String name) {
        return Optional.ofNullable(byKey.get(key(name)));
    }

    T find(String name) throws UnknownNameException {
        return lookUp(name).orElseThrow(() -> new UnknownNameException(what, name, nearest(name)));
    }

    /** The nearest names, one for each thing and each spelling that differs in more than case and punctuation. */
    private List<String> nearest(String name) {
        List<String> known = things.stream().flatMap(Named::names).toList();
        Set<Object> told = new HashSet<>();
        return NearestNames.of(name, known, NEAREST * MOST_NAMES).stream().filter(near -> told.add(byKey.get(key(near))))
                .limit(NEAREST).toList();
    }

    /** What a text typed so far may mean: whole name, start of a name, start of a word, inside a name; then as on the shelf. */
    List<T> search(String text, int limit) {
        String wanted = key(text);
        return things.stream()
                .filter(thing -> rank(thing, text, wanted) < Rank.NONE)
                .sorted(Comparator.comparingInt(thing -> rank(thing, text, wanted)))
                .limit(limit).toList();
    }

    private static int rank(Named thing, String text, String wanted) {
        return thing.names().mapToInt(name -> rank(name, text, wanted)).min().orElse(Rank.NONE);
    }

    private static int rank(String name, String text, String wanted) {
        String key = key(name);
        if (key.equals(wanted)) {
            return name.equals(text.strip()) ? Rank.SAME : Rank.WHOLE;
        }
        if (key.startsWith(wanted)) {
            return Rank.START;
        }
        for (String word : name.split("[\\s\\-,()\\[\\]]+")) {
            if (key(word).startsWith(wanted)) {
                return Rank.WORD;
            }
        }
        return key.contains(wanted) ? Rank.INSIDE : Rank.NONE;
    }

    /** Name without case, accents, spaces and punctuation; subscript digits are plain ones. */
    static String key(String name) {
        StringBuilder key = new StringBuilder(name.length());
        for (int i = 0; i < name.length(); i++) {
            char letter = name.charAt(i);
            if (letter < ' ' || letter > '~') {
                return keyBeyondAscii(name);
            }
            if (Character.isLetterOrDigit(letter)) {
                key.append(Character.toLowerCase(letter));
            }
        }
        return key.toString();
    }

    private static String keyBeyondAscii(String name) {
        String plain = Normalizer.normalize(name, Normalizer.Form.NFKD).replaceAll("\\p{M}", "");
        return plain.toLowerCase(Locale.ROOT).replaceAll("[\\s\\p{Punct}\\p{Pd}\u2019\u2032\u00b7\u22c5]", "");
    }

    /** Order of search hits. */
    private static final class Rank {
        static final int SAME = 0;
        static final int WHOLE = 1;
        static final int START = 2;
        static final int WORD = 3;
        static final int INSIDE = 4;
        static final int NONE = 5;

        private Rank() {}
    }
}
