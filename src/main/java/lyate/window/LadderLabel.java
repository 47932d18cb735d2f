package lyate.window;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.report.LabelSpread;
import lyate.report.Rung;

/**
 * A label of the ladder and where its middle goes.
 *
 * @param rung what it names
 * @param y    middle of its text
 */
record LadderLabel(Rung rung, double y) {

    /** Labels of both rails, without overlap; the least important are left out where there is no room. */
    static List<LadderLabel> place(List<Rung> rungs, LadderAxis axis, double height, double top, double bottom) {
        List<LadderLabel> labels = new ArrayList<>(rail(rungs.stream().filter(Rung::left), axis, height, top, bottom));
        labels.addAll(rail(rungs.stream().filter(rung -> !rung.left()), axis, height, top, bottom));
        return labels;
    }

    private static List<LadderLabel> rail(Stream<Rung> rungs, LadderAxis axis, double height, double top, double bottom) {
        int room = (int) ((bottom - top) / height);
        List<Rung> kept = rungs.sorted(Comparator.comparingInt(Rung::importance)).limit(room)
                .sorted(Comparator.comparingDouble((Rung rung) -> -axis.y(rung.pKa()))).collect(Collectors.toCollection(ArrayList::new));
        // Sorted from below, so that of equal values the earlier letter comes to stand lower.
        Collections.reverse(kept);
        double[] wanted = kept.stream().mapToDouble(rung -> axis.y(rung.pKa())).toArray();
        double[] placed = LabelSpread.spread(wanted, height, top, bottom);
        List<LadderLabel> labels = new ArrayList<>();
        for (int i = 0; i < placed.length; i++) {
            labels.add(new LadderLabel(kept.get(i), placed[i]));
        }
        return labels;
    }
}
