package lyate.window;

import java.util.List;
import java.util.Optional;

/** Which of the things drawn in a component has the keyboard; arrow keys go round. */
final class FocusWalk {

    private int at = -1;

    /** Nothing has it. */
    void leave() {
        at = -1;
    }

    /** Goes forward or back by one; from nowhere to the first or the last. */
    void move(int by, int count) {
        if (count > 0) {
            at = at >= 0 ? Math.floorMod(at + by, count) : by > 0 ? 0 : count - 1;
        }
    }

    /** The one of these that has it. */
    <T> Optional<T> of(List<T> things) {
        return at >= 0 && at < things.size() ? Optional.of(things.get(at)) : Optional.empty();
    }
}
