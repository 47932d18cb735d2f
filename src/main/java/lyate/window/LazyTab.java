package lyate.window;

import java.awt.BorderLayout;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.SwingConstants;

/** A tab whose content takes a moment to work out: it does so only while somebody looks, and only when the answer changes. */
abstract class LazyTab extends JPanel implements AutoCloseable {

    private final transient Background background;
    private final JLabel remark = new JLabel("", SwingConstants.CENTER);
    private transient Optional<Object> key = Optional.empty();
    private transient Shown shown;
    private boolean due;
    private boolean busy;

    LazyTab(String name) {
        super(new BorderLayout());
        background = new Background(name);
        add(remark, BorderLayout.SOUTH);
        remark.setVisible(false);
        getAccessibleContext().setAccessibleName(name);
    }

    /** What the answer depends on. */
    abstract Object key(Shown next);

    /** Works the answer out with {@link #start}. */
    abstract void work(Shown wanted);

    /** The answer still holds, but the step on screen is another one. */
    abstract void refresh();

    /** The chart of the tab, where it has one. */
    Optional<Picture> asPicture() {
        return Optional.empty();
    }

    /** Shows another step. */
    void show(Shown next) {
        shown = next;
        if (key.equals(Optional.of(key(next))) && !due) {
            refresh();
        } else {
            due = true;
            lookedAt();
        }
    }

    /** To be called when the tab comes into view. */
    void lookedAt() {
        due |= shown != null && !key.equals(Optional.of(key(shown)));
        if (due && shown != null && isShowing()) {
            due = false;
            key = Optional.of(key(shown));
            work(shown);
        }
    }

    /** Whether an answer is on its way. */
    boolean isBusy() {
        return busy;
    }

    Shown shown() {
        return shown;
    }

    /** Runs work in the background; a sentence says so meanwhile. */
    <T> void start(String doing, Background.Work<T> work, Consumer<T> done) {
        busy = true;
        say(doing);
        background.start(work, result -> {
            busy = false;
            say("");
            done.accept(result);
        }, message -> {
            busy = false;
            say(message);
        });
    }

    /** A remark below the content; empty for none. */
    void say(String words) {
        remark.setText(words);
        remark.setVisible(!words.isEmpty());
    }

    @Override
    public void close() {
        background.close();
    }
}
