package lyate.window;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.LongSupplier;
import java.util.function.Supplier;
import lyate.sheet.RouteSheet;

/** The sheet that is open, with undo and redo. For the event thread. */
final class SheetDocument {

    /** Keystrokes in one field that follow each other faster than this are undone together. */
    private static final long TOGETHER_NANOS = 1_500_000_000L;
    private static final int MOST_STEPS_BACK = 500;

    private final LongSupplier clock;
    private final Supplier<StepText> newStep;
    private final Deque<SheetState> past = new ArrayDeque<>();
    private final Deque<SheetState> future = new ArrayDeque<>();
    private final List<Runnable> listeners = new ArrayList<>();
    private SheetState state;
    private String savedText;
    private Optional<Path> file = Optional.empty();
    private Optional<StepField> lastField = Optional.empty();
    private long lastEdit;

    /** A sheet whose added steps begin blank. */
    SheetDocument(RouteSheet sheet, LongSupplier clock) {
        this(sheet, clock, () -> new StepText(Map.of(), ""));
    }

    /** @param newStep what an added step begins with */
    SheetDocument(RouteSheet sheet, LongSupplier clock, Supplier<StepText> newStep) {
        this.clock = clock;
        this.newStep = newStep;
        this.state = new SheetState(sheet, 0);
        this.savedText = sheet.text();
    }

    /** Called after every change of sheet, selection or file. */
    void onChange(Runnable listener) {
        listeners.add(listener);
    }

    SheetState state() {
        return state;
    }

    Optional<Path> file() {
        return file;
    }

    boolean isModified() {
        return !state.sheet().text().equals(savedText);
    }

    /** Whether another program has written the file since it was read or saved here. */
    boolean changedOnDisk() throws IOException {
        return file.isPresent() && RouteSheet.changedSince(file.get(), savedText);
    }

    boolean canUndo() {
        return !past.isEmpty();
    }

    boolean canRedo() {
        return !future.isEmpty();
    }

    /** Looks at another row. */
    void select(int row) {
        lastField = Optional.empty();
        become(state.select(row));
    }

    /** Writes what is typed into the selected row. */
    void edit(StepText text) {
        Optional<StepField> field = onlyDifference(state.text(), text);
        long now = clock.getAsLong();
        boolean together = field.isPresent() && field.equals(lastField) && now - lastEdit < TOGETHER_NANOS && !past.isEmpty();
        SheetState next = state.write(text);
        if (together) {
            future.clear();
            become(next);
        } else {
            change(next);
        }
        lastField = field;
        lastEdit = now;
    }

    /** Takes a new state that can be undone. */
    void change(SheetState next) {
        if (next.equals(state)) {
            return;
        }
        past.push(state);
        if (past.size() > MOST_STEPS_BACK) {
            past.removeLast();
        }
        future.clear();
        lastField = Optional.empty();
        become(next);
    }

    /** Adds a step after the selected one. */
    void add() {
        change(state.added().write(newStep.get()));
    }

    void undo() {
        step(past, future);
    }

    void redo() {
        step(future, past);
    }

    private void step(Deque<SheetState> from, Deque<SheetState> to) {
        if (!from.isEmpty()) {
            to.push(state);
            lastField = Optional.empty();
            become(from.pop());
        }
    }

    /** Opens another sheet; there is no way back from here. */
    void open(RouteSheet sheet, Optional<Path> from, String saved) {
        past.clear();
        future.clear();
        lastField = Optional.empty();
        file = from;
        savedText = saved;
        become(new SheetState(sheet, 0));
    }

    /** To be called once the present text is in a file. */
    void saved(Path to) {
        file = Optional.of(to);
        savedText = state.sheet().text();
        listeners.forEach(Runnable::run);
    }

    private void become(SheetState next) {
        state = next;
        List.copyOf(listeners).forEach(Runnable::run);
    }

    private static Optional<StepField> onlyDifference(StepText before, StepText after) {
        List<StepField> different = Arrays.stream(StepField.values()).filter(field -> !before.get(field).equals(after.get(field))).toList();
        return different.size() == 1 ? Optional.of(different.get(0)) : Optional.empty();
    }
}
