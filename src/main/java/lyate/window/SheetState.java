package lyate.window;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;
import lyate.sheet.RouteSheet;

/**
 * A sheet and the row that is looked at; what undo goes back to.
 *
 * @param sheet    at least one row
 * @param selected index of the row
 */
record SheetState(RouteSheet sheet, int selected) {

    /** The same sheet, another row. */
    SheetState select(int row) {
        return new SheetState(sheet, Math.max(0, Math.min(row, sheet.rows().size() - 1)));
    }

    /** What the row says. */
    StepText text() {
        return StepCells.text(sheet.rows().get(selected));
    }

    SheetState write(StepText text) {
        return new SheetState(StepCells.write(sheet, selected, text), selected);
    }

    /** The selected row with another substrate, and rows that say the same of further ones after it. */
    SheetState withSubstrates(List<String> structures) {
        SheetState state = write(text().with(StepField.SUBSTRATE, structures.get(0)).withSite(""));
        for (String structure : structures.subList(1, structures.size())) {
            SheetState next = state.duplicated();
            state = next.write(next.text().with(StepField.SUBSTRATE, structure));
        }
        return new SheetState(state.sheet(), selected);
    }

    /** A blank row after the selected one, selected. */
    SheetState added() {
        return inserted(Collections.nCopies(sheet.header().names().size(), ""));
    }

    /** A second row that says the same, selected. */
    SheetState duplicated() {
        return inserted(sheet.rows().get(selected).cells());
    }

    private SheetState inserted(List<String> cells) {
        RouteSheet longer = sheet.withRow(cells);
        List<Integer> order = indices(sheet.rows().size());
        order.add(selected + 1, sheet.rows().size());
        return new SheetState(longer.withOrder(order), selected + 1);
    }

    /** Without the selected row; the last one is blanked, not removed. */
    SheetState removed() {
        if (sheet.rows().size() == 1) {
            return new SheetState(sheet.withOrder(List.of()).withRow(Collections.nCopies(sheet.header().names().size(), "")), 0);
        }
        List<Integer> order = indices(sheet.rows().size());
        order.remove(selected);
        return new SheetState(sheet.withOrder(order), selected).select(selected);
    }

    /** The selected row moved up or down; the same state where it is at the end. */
    SheetState moved(int by) {
        int to = selected + by;
        if (to < 0 || to >= sheet.rows().size()) {
            return this;
        }
        List<Integer> order = indices(sheet.rows().size());
        Collections.swap(order, selected, to);
        return new SheetState(sheet.withOrder(order), to);
    }

    private static List<Integer> indices(int count) {
        return new ArrayList<>(IntStream.range(0, count).boxed().toList());
    }
}
