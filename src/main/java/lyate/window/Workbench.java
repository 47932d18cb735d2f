package lyate.window;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JOptionPane;
import javax.swing.JPanel;
import javax.swing.JSplitPane;
import lyate.molecule.MoleculeReader;
import lyate.stock.Base;

/** All parts of the window put together: fields above, pictures and findings in the middle, the drawer below. */
final class Workbench extends JPanel implements Drawer.Wishes, AutoCloseable {

    private static final String PICTURES = "pictures";
    private static final String EMPTY = "empty";

    private final StepStrip strip;
    private final SubstrateView substrate;
    private final Pane substratePane;
    private final AcidityLadder ladder;
    private final CompareField compare;
    private final FindingsPanel findings;
    private final Drawer drawer;
    private final StepPresenter presenter;
    private final CardLayout cards = new CardLayout();
    private final JPanel middle = new JPanel(cards);
    private Runnable painted;
    private Optional<Shown> shown = Optional.empty();

    Workbench(Theme theme, Engine engine, StepText first) {
        super(new BorderLayout());
        presenter = new StepPresenter(new StepReader(new MoleculeReader(), engine.stockroom()), engine.reviewer(), this::receive);
        strip = new StepStrip(theme, engine.stockroom(), first, presenter::submit);
        substrate = new SubstrateView(theme, this::intend);
        substratePane = new Pane("Substrate", substrate, theme);
        ladder = new AcidityLadder(theme, this::intend, this::take);
        ladder.setTransferHandler(new BaseDrop(engine.stockroom(), this::compare));
        compare = new CompareField(theme, engine.stockroom(), this::compare);
        findings = new FindingsPanel(theme, substrate::highlight);
        drawer = new Drawer(theme, engine, this);
        middle.add(pictures(theme), PICTURES);
        middle.add(new EmptyView(theme, example -> open(strip.text().with(StepField.SUBSTRATE, example).withSite(""))), EMPTY);
        add(strip, BorderLayout.NORTH);
        add(middle);
        presenter.submit(first);
    }

    private JComponent pictures(Theme theme) {
        JSplitPane right = split(JSplitPane.HORIZONTAL_SPLIT, new Pane("Acidity ladder", ladder, compare, theme), new Pane("Findings", findings, theme), 0.58);
        JSplitPane top = split(JSplitPane.HORIZONTAL_SPLIT, substratePane, right, 0.38);
        return split(JSplitPane.VERTICAL_SPLIT, top, drawer, 0.74);
    }

    private static JSplitPane split(int orientation, JComponent first, JComponent second, double share) {
        JSplitPane split = new JSplitPane(orientation, true, first, second) {
            private boolean placed;

            @Override
            public void doLayout() {
                if (!placed && getWidth() > 0 && getHeight() > 0) {
                    placed = true;
                    setDividerLocation(share);
                }
                super.doLayout();
            }
        };
        split.setResizeWeight(share);
        split.setBorder(BorderFactory.createEmptyBorder());
        return split;
    }

    /** Opens a step in the fields and reviews it. */
    void open(StepText step) {
        strip.show(step);
        presenter.submit(step);
    }

    /** Makes a site the intended one. */
    @Override
    public void intend(String site) {
        open(strip.text().withSite(site));
    }

    @Override
    public void highlight(List<Integer> atoms) {
        substrate.highlight(atoms);
    }

    @Override
    public void take(Base base) {
        open(strip.text().with(StepField.BASE, base.name()));
    }

    @Override
    public void equivalents(double equivalents) {
        open(strip.text().with(StepField.EQUIVALENTS, BigDecimal.valueOf(equivalents).stripTrailingZeros().toPlainString()));
    }

    @Override
    public void compare(Base base) {
        ladder.compare(base).ifPresent(reason -> JOptionPane.showMessageDialog(this, reason, "Acidity ladder", JOptionPane.INFORMATION_MESSAGE));
    }

    private void receive(Outcome outcome) {
        strip.report(outcome);
        substratePane.note(outcome.shown().isEmpty() ? "the last step that could be read" : "");
        if (outcome.text().get(StepField.SUBSTRATE).isEmpty()) {
            shown = Optional.empty();
            cards.show(middle, EMPTY);
            return;
        }
        outcome.shown().ifPresent(this::show);
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
        drawer.close();
        presenter.close();
    }
}
