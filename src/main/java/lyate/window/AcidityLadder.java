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
import javax.swing.JPanel;
import javax.swing.ToolTipManager;
import javax.swing.UIManager;
import lyate.stock.Base;

/** The acidity ladder; arrow keys walk its rungs, a click or Enter on a site makes it the intended one. */
final class AcidityLadder extends JPanel {

    private final Theme theme;
    private final Consumer<String> onSite;
    private Shown shown;
    private List<Base> compared = List.of();
    private Optional<Ladder> ladder = Optional.empty();
    private LadderPicture picture;
    private Dimension pictureSize;
    private int focusedRung = -1;

    AcidityLadder(Theme theme, Consumer<String> onSite) {
        this.theme = theme;
        this.onSite = onSite;
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
        Keys.repaintOnFocus(this);
        theme.onChange(this::refresh);
        getAccessibleContext().setAccessibleName("Acidity ladder");
    }

    void show(Shown next) {
        shown = next;
        refresh();
    }

    /** Shows further bases beside the one chosen. */
    void compare(List<Base> bases) {
        compared = List.copyOf(bases);
        refresh();
    }

    private void refresh() {
        ladder = shown == null ? Optional.empty() : Ladder.of(shown, compared);
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
        return ladder.map(Ladder::rungs).filter(rungs -> focusedRung >= 0 && focusedRung < rungs.size()).map(rungs -> rungs.get(focusedRung));
    }

    private void moveFocus(int by) {
        ladder.map(Ladder::rungs).filter(rungs -> !rungs.isEmpty()).ifPresent(rungs -> {
            focusedRung = focusedRung < 0 ? by > 0 ? 0 : rungs.size() - 1 : Math.floorMod(focusedRung + by, rungs.size());
            repaint();
        });
    }

    private void chooseFocused() {
        focused().flatMap(Rung::site).ifPresent(site -> onSite.accept(site.label()));
    }

    private Optional<Rung> rungAt(MouseEvent event) {
        return picture == null ? Optional.empty() : picture.rungAt(event.getPoint());
    }

    @Override
    public String getToolTipText(MouseEvent event) {
        return rungAt(event).map(rung -> rung.site().map(site -> SiteCard.html(shown, site)).orElse(sentence(rung))).orElse(null);
    }

    private static String sentence(Rung rung) {
        return rung.site().map(SiteTag::sentence).orElse(rung.name() + ", pKa " + rung.text() + (rung.note().isEmpty() ? "" : ". " + rung.note()));
    }

    private final class Mouse extends MouseAdapter {
        @Override
        public void mousePressed(MouseEvent event) {
            requestFocusInWindow();
        }

        @Override
        public void mouseClicked(MouseEvent event) {
            rungAt(event).flatMap(Rung::site).ifPresent(site -> onSite.accept(site.label()));
        }

        @Override
        public void mouseMoved(MouseEvent event) {
            boolean site = rungAt(event).flatMap(Rung::site).isPresent();
            setCursor(Cursor.getPredefinedCursor(site ? Cursor.HAND_CURSOR : Cursor.DEFAULT_CURSOR));
        }
    }
}
