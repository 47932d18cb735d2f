package lyate.acidity.lfer;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lyate.acidity.Acidity.Effect;

/** Collects the descriptors of one site; the same name met twice adds up. */
final class Terms {

    private final Map<String, Term> byName = new LinkedHashMap<>();
    private final List<String> missing = new ArrayList<>();

    void add(String name, Effect effect, double value, int atom, String note) {
        if (value == 0) {
            return;
        }
        Term before = byName.get(name);
        if (before == null) {
            byName.put(name, new Term(name, effect, value, List.of(atom), note));
        } else {
            List<Integer> atoms = new ArrayList<>(before.atoms());
            atoms.add(atom);
            String both = note.isEmpty() || before.note().isEmpty() ? before.note() + note : before.note() + ", " + note;
            byName.put(name, new Term(name, effect, before.value() + value, atoms, both));
        }
    }

    void add(String name, Effect effect, double value, int atom) {
        add(name, effect, value, atom, "");
    }

    /** Says that something could only be estimated roughly. */
    void miss(String words) {
        if (!missing.contains(words)) {
            missing.add(words);
        }
    }

    double value(String name) {
        Term term = byName.get(name);
        return term == null ? 0 : term.value();
    }

    List<Term> list() {
        return List.copyOf(byName.values());
    }

    List<String> missing() {
        return List.copyOf(missing);
    }
}
