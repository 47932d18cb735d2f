package lyate.window;

import java.awt.Cursor;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import java.util.stream.Stream;
import javax.swing.JPanel;
import javax.swing.ToolTipManager;
import javax.swing.UIManager;
import lyate.report.Ladder;
import lyate.report.LetteredSite;
import lyate.report.Rung;
import lyate.report.Words;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;

/** The acidity ladder; arrow keys walk its rungs, a click or Enter on a site makes it the intended one. */
final class AcidityLadder extends JPanel {

    private final Theme theme;
    private final Consumer<String> onSite;
    private final Consumer<Base> onBase;
    private final Supplier<Solvent> water;
    private transient Runnable compareListener = () -> {};
    private Shown shown;
    private List<Base> compared = List.of();
    private Optional<Ladder> ladder = Optional.empty();
    private LadderPicture picture;
    private Dimension pictureSize;
    private final FocusWalk walk = new FocusWalk();

    /** @param water the row for water, which stands on the ladder where the solvent is not dry */
    AcidityLadder(Theme theme, Supplier<Solvent> water, Consumer<String> onSite, Consumer<Base> onBase) {
        this.theme = theme;
        this.onSite = onSite;
        this.onBase = onBase;
        this.water = water;
        setFocusable(true);
        setOpaque(true);
        Mouse mouse = new Mouse();
        addMouseListener(mouse);
        addMouseMotionListener(mouse);
        ToolTipManager.sharedInstance().registerComponent(this);
        Keys.bind(this, "UP", () -> moveFocus(1));
        Keys.bind(this, "DOWN", () -> moveFocus(-1));
        Keys.bind(this, "ENTER", this::chooseFocused);
        Keys.bind(this, "SPACE", this::chooseFocused);
        Keys.bind(this, "DELETE", () -> focused().flatMap(Rung::base).ifPresent(this::leaveOut));
        Keys.repaintOnFocus(this);
        theme.onChange(this::refresh);
        getAccessibleContext().setAccessibleName("Acidity ladder");
    }

    void show(Shown next) {
        shown = next;
        refresh();
    }

    /** Shows a further base beside the one chosen; says why not where the axis has no value for it. */
    Optional<String> compare(Base base) {
        Optional<Medium> medium = ladder.map(Ladder::medium);
        if (medium.isPresent() && base.pKa(medium.get()).isEmpty()) {
            return Optional.of("No pKa of " + base.name() + " in " + Words.medium(medium.get()) + " is known.");
        }
        if (!compared.contains(base)) {
            compared = Stream.concat(compared.stream(), Stream.of(base)).toList();
            refresh();
            compareListener.run();
        }
        return Optional.empty();
    }

    /** The ladder, as a picture. */
    Optional<Picture> asPicture() {
        return ladder.map(known -> new Picture("acidity-ladder", getSize(), theme.color("ground"),
                g -> new LadderPicture(known, theme.palette(), g.getFont(), getSize(), g).paint(g, Optional.empty())));
    }

    /** No longer shows a base beside the one chosen. */
    void leaveOut(Base base) {
        compared = compared.stream().filter(other -> !other.equals(base)).toList();
        walk.leave();
        refresh();
        compareListener.run();
    }

    /** Called whenever another base is compared, or one no longer. */
    void onCompared(Runnable listener) {
        compareListener = listener;
    }

    /** The bases shown beside the one chosen. */
    List<Base> compared() {
        return compared;
    }

    private void refresh() {
        ladder = shown == null ? Optional.empty() : Ladder.of(shown.review(), shown.tags().sites(), compared, Optional.of(water.get()));
        ladder.ifPresent(known -> getAccessibleContext().setAccessibleDescription(String.join(". ", known.rungs().stream().map(AcidityLadder::sentence).toList())));
        picture = null;
        repaint();
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        g.setColor(theme.color("ground"));
        g.fillRect(0, 0, getWidth(), getHeight());
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        if (ladder.isPresent()) {
            picture(g).paint(g, isFocusOwner() ? focused() : Optional.empty());
            Keys.paintFocus(g, this, theme);
        }
        g.dispose();
    }

    private LadderPicture picture(Graphics2D g) {
        if (picture == null || !getSize().equals(pictureSize)) {
            pictureSize = getSize();
            picture = new LadderPicture(ladder.orElseThrow(), theme.palette(), UIManager.getFont("Label.font"), pictureSize, g);
        }
        return picture;
    }

    private Optional<Rung> focused() {
        return ladder.map(Ladder::rungs).flatMap(walk::of);
    }

    private void moveFocus(int by) {
        walk.move(by, ladder.map(known -> known.rungs().size()).orElse(0));
        repaint();
    }

    private void chooseFocused() {
        focused().ifPresent(this::choose);
    }

    /** A site becomes the intended one, a compared base the base. */
    private void choose(Rung rung) {
        rung.site().ifPresent(site -> onSite.accept(site.label()));
        rung.base().ifPresent(base -> {
            leaveOut(base);
            onBase.accept(base);
        });
    }

    private Optional<Rung> rungAt(MouseEvent event) {
        return picture == null ? Optional.empty() : picture.rungAt(event.getPoint());
    }

    @Override
    public String getToolTipText(MouseEvent event) {
        return rungAt(event).map(rung -> rung.site().map(site -> SiteCard.html(shown, site)).orElse(sentence(rung))).orElse(null);
    }

    private static String sentence(Rung rung) {
        return rung.site().map(LetteredSite::sentence).orElse(rung.name() + ", pKa " + rung.text() + (rung.note().isEmpty() ? "" : ". " + rung.note()));
    }

    private final class Mouse extends MouseAdapter {
        @Override
        public void mousePressed(MouseEvent event) {
            requestFocusInWindow();
        }

        @Override
        public void mouseClicked(MouseEvent event) {
            rungAt(event).filter(rung -> rung.site().isPresent() || event.getClickCount() == 2).ifPresent(AcidityLadder.this::choose);
        }

        @Override
        public void mouseMoved(MouseEvent event) {
            boolean active = rungAt(event).filter(rung -> rung.site().isPresent() || rung.base().isPresent()).isPresent();
            setCursor(Cursor.getPredefinedCursor(active ? Cursor.HAND_CURSOR : Cursor.DEFAULT_CURSOR));
        }
    }
}
