package lyate.window;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Dimension;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import javax.swing.JComponent;
import javax.swing.JOptionPane;
import javax.swing.JPanel;
import javax.swing.JSplitPane;
import javax.swing.Timer;
import lyate.review.Reviewer;
import lyate.stock.Base;

/** All parts of the window put together: fields above, pictures and findings in the middle, the drawer below. */
final class Workbench extends JPanel implements Drawer.Wishes, AutoCloseable {

    /** A result that takes longer is announced. */
    private static final int PATIENCE_MILLIS = 300;
    private static final String OUTDATED = "of the last readable step";
    private static final String PICTURES = "pictures";
    private static final String EMPTY = "empty";

    private final SheetDocument document;
    private final StepStrip strip;
    private final StepsPanel steps;
    private final Pane stepsPane;
    private final SubstrateView substrate;
    private final Pane substratePane;
    private final AcidityLadder ladder;
    private final Pane ladderPane;
    private final FindingsPanel findings;
    private final Pane verdictPane;
    private final Veil drawerVeil;
    private final Drawer drawer;
    private final EmptyView empty;
    private final List<Split> splits = new ArrayList<>();
    private final StepPresenter presenter;
    private final CardLayout cards = new CardLayout();
    private final JPanel middle = new JPanel(cards);
    private final Timer patience;
    /** A text half typed for a moment only shall not make the window flicker. */
    private final Timer doubt;
    private StepText asked;
    private StepText answered = new StepText(Map.of(), "");
    private Runnable painted;
    private Optional<Shown> shown = Optional.empty();

    Workbench(Theme theme, Engine engine, SheetDocument document) {
        super(new BorderLayout());
        this.document = document;
        FieldReader reader = new FieldReader(engine::steps);
        Reviewer reviewer = step -> engine.reviewer().review(step);
        presenter = new StepPresenter(reader, reviewer, this::receive);
        strip = new StepStrip(theme, engine, document.state().text(), document::edit, this::dropped);
        setTransferHandler(new StructureDrop(this::dropped));
        substrate = new SubstrateView(theme, this::intend);
        substratePane = new Pane("Substrate", substrate, theme);
        ladder = new AcidityLadder(theme, engine::water, this::intend, this::take);
        ladder.onCompared(() -> drawer().repaint());
        ladder.setTransferHandler(new BaseDrop(engine, this::compare));
        ladderPane = new Pane("Acidity ladder", ladder, new CompareField(theme, engine, this::compare), theme);
        findings = new FindingsPanel(theme, substrate::highlight);
        verdictPane = new Pane("Verdict", findings, theme);
        drawer = new Drawer(theme, engine, this);
        drawerVeil = new Veil(drawer, theme);
        middle.add(pictures(), PICTURES);
        empty = new EmptyView(theme, example -> document.edit(strip.text().with(StepField.SUBSTRATE, example).withSite("")));
        middle.add(empty, EMPTY);
        add(strip, BorderLayout.NORTH);
        steps = new StepsPanel(theme, document, reader, reviewer);
        stepsPane = new Pane("Steps", steps, theme);
        stepsPane.setPreferredSize(new Dimension(theme.space("steps.width"), 0));
        stepsPane.setVisible(document.state().sheet().rows().size() > 1);
        add(stepsPane, BorderLayout.WEST);
        add(middle);
        patience = new Timer(PATIENCE_MILLIS, event -> substratePane.note("working \u2026"));
        patience.setRepeats(false);
        doubt = new Timer(PATIENCE_MILLIS, event -> outdated(true));
        doubt.setRepeats(false);
        document.onChange(this::follow);
        presenter.submit(document.state().text());
        patience.start();
    }

    private JComponent pictures() {
        Split right = new Split(JSplitPane.HORIZONTAL_SPLIT, ladderPane, verdictPane, 0.58);
        Split top = new Split(JSplitPane.HORIZONTAL_SPLIT, substratePane, right, 0.38);
        Split all = new Split(JSplitPane.VERTICAL_SPLIT, top, drawerVeil, 0.68);
        splits.addAll(List.of(right, top, all));
        return all;
    }

    /** How the room is shared now, in words to be remembered. */
    String arrangement() {
        return splits.stream().map(split -> String.format(Locale.ROOT, "%.3f", split.share())).collect(Collectors.joining(" "))
                + " " + drawer.getSelectedIndex();
    }

    /** Shares the room as it was remembered; words that mean nothing change nothing. */
    void arrange(String remembered) {
        String[] words = remembered.split(" ");
        if (words.length == splits.size() + 1 && Arrays.stream(words).limit(splits.size()).allMatch(word -> word.matches("0\\.\\d+")) && words[splits.size()].matches("\\d")) {
            for (int i = 0; i < splits.size(); i++) {
                splits.get(i).setShare(Double.parseDouble(words[i]));
            }
            drawer.setSelectedIndex(Math.min(Integer.parseInt(words[splits.size()]), drawer.getTabCount() - 1));
        }
    }

    /** Shows what the document says now: after typing the fields say it already, after undo or another row they do not. */
    private void follow() {
        stepsPane.setVisible(document.state().sheet().rows().size() > 1);
        StepText text = document.state().text();
        if (!text.equals(strip.text())) {
            strip.show(text);
        }
        if (!text.equals(asked)) {
            asked = text;
            presenter.submit(text);
            patience.restart();
        }
    }

    /** Takes the structures of a file: the first into the step on screen, every further one into a step of its own. */
    private void dropped(Path file) {
        try {
            document.change(document.state().withSubstrates(StructureFile.read(file)));
        } catch (IOException e) {
            JOptionPane.showMessageDialog(this, e.getMessage(), "The file was not taken", JOptionPane.ERROR_MESSAGE);
        }
    }

    /** Makes a site the intended one. */
    @Override
    public void intend(String site) {
        document.edit(strip.text().withSite(site));
    }

    @Override
    public void highlight(List<Integer> atoms) {
        substrate.highlight(atoms);
    }

    @Override
    public void take(Base base) {
        document.edit(strip.text().with(StepField.BASE, base.name()));
    }

    @Override
    public void equivalents(double equivalents) {
        document.edit(strip.text().with(StepField.EQUIVALENTS, BigDecimal.valueOf(equivalents).stripTrailingZeros().toPlainString()));
    }

    @Override
    public boolean isCompared(Base base) {
        return ladder.compared().contains(base);
    }

    @Override
    public void toggle(Base base) {
        if (isCompared(base)) {
            ladder.leaveOut(base);
        } else {
            compare(base);
        }
    }

    private void compare(Base base) {
        ladder.compare(base).ifPresent(reason -> JOptionPane.showMessageDialog(this, reason, "Acidity ladder", JOptionPane.INFORMATION_MESSAGE));
    }

    private void receive(Outcome outcome) {
        patience.stop();
        answered = outcome.text();
        strip.report(outcome);
        substratePane.note("");
        boolean blank = outcome.text().get(StepField.SUBSTRATE).isEmpty();
        if (blank) {
            shown = Optional.empty();
        }
        if (outcome.shown().isEmpty() && shown.isEmpty()) {
            empty.ask(outcome.problems(), blank);
            cards.show(middle, EMPTY);
        } else if (outcome.shown().isEmpty()) {
            doubt.restart();
            return;
        }
        doubt.stop();
        outdated(false);
        outcome.shown().ifPresent(this::show);
    }

    /** Marks everything on screen as belonging to an earlier text than the fields now hold, or takes the mark away. */
    private void outdated(boolean is) {
        List.of(substratePane, verdictPane).forEach(pane -> pane.note(is ? OUTDATED : ""));
        verdictPane.veil(is);
        drawerVeil.set(is);
    }

    /** Whether what is on screen is marked as not belonging to what the fields say. */
    boolean isOutdated() {
        return drawerVeil.isSet();
    }

    private void show(Shown next) {
        shown = Optional.of(next);
        substrate.show(next);
        ladder.show(next);
        findings.show(next.review());
        drawer.show(next);
        cards.show(middle, PICTURES);
        if (painted != null) {
            paintImmediately(getVisibleRect());
            painted.run();
        }
    }

    /** Runs once the next result has been painted; for measuring. */
    void afterPainting(Runnable action) {
        painted = action;
    }

    /** Whether everything on screen belongs to what the fields say. */
    boolean isSettled() {
        return answered.equals(document.state().text()) && drawer.isSettled() && steps.isSettled();
    }

    /** What can be copied or saved as a picture now, by the name the menu gives it. */
    Optional<Picture> picture(WindowMenu.Drawn what) {
        return switch (what) {
            case SUBSTRATE -> substrate.asPicture();
            case LADDER -> ladder.asPicture();
            case CHART -> drawer.asPicture();
        };
    }

    /** What is on screen now. */
    Optional<Shown> shown() {
        return shown;
    }

    StepStrip strip() {
        return strip;
    }

    SubstrateView substrate() {
        return substrate;
    }

    SheetDocument document() {
        return document;
    }

    FindingsPanel findings() {
        return findings;
    }

    Drawer drawer() {
        return drawer;
    }

    AcidityLadder ladder() {
        return ladder;
    }

    @Override
    public void close() {
        patience.stop();
        doubt.stop();
        steps.close();
        drawer.close();
        presenter.close();
    }
}
