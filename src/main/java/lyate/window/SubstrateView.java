package lyate.window;

import java.awt.Cursor;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Point;
import java.awt.RenderingHints;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.event.MouseWheelEvent;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.JPanel;
import javax.swing.JToolTip;
import javax.swing.Popup;
import javax.swing.PopupFactory;
import javax.swing.SwingUtilities;
import javax.swing.ToolTipManager;
import javax.swing.UIManager;
import lyate.report.LetteredSite;

/** The substrate; a click on a tag, or arrow keys and Enter, set the intended site. Wheel zooms, drag pans, double click fits. */
final class SubstrateView extends JPanel {

    private static final double ZOOM_STEP = 1.15;
    private static final double LEAST_ZOOM = 0.5;
    private static final double MOST_ZOOM = 8;

    private final Theme theme;
    private final Consumer<String> onSite;
    private final AffineTransform view = new AffineTransform();
    private Shown shown;
    private List<Integer> highlighted = List.of();
    private final FocusWalk walk = new FocusWalk();
    private Popup card;
    private SubstratePicture picture;
    private Dimension pictureSize;

    SubstrateView(Theme theme, Consumer<String> onSite) {
        this.theme = theme;
        this.onSite = onSite;
        setFocusable(true);
        setOpaque(true);
        Mouse mouse = new Mouse();
        addMouseListener(mouse);
        addMouseMotionListener(mouse);
        addMouseWheelListener(mouse);
        ToolTipManager.sharedInstance().registerComponent(this);
        Keys.bind(this, "RIGHT", () -> moveFocus(1));
        Keys.bind(this, "DOWN", () -> moveFocus(1));
        Keys.bind(this, "LEFT", () -> moveFocus(-1));
        Keys.bind(this, "UP", () -> moveFocus(-1));
        Keys.bind(this, "ENTER", this::chooseFocused);
        Keys.bind(this, "SPACE", this::chooseFocused);
        Keys.bind(this, "I", this::showCard);
        Keys.bind(this, "ESCAPE", this::hideCard);
        addFocusListener(new FocusAdapter() {
            @Override
            public void focusLost(FocusEvent event) {
                hideCard();
            }
        });
        Keys.bind(this, "0", this::fit);
        Keys.bind(this, "PLUS", () -> zoom(ZOOM_STEP, new Point(getWidth() / 2, getHeight() / 2)));
        Keys.bind(this, "MINUS", () -> zoom(1 / ZOOM_STEP, new Point(getWidth() / 2, getHeight() / 2)));
        Keys.repaintOnFocus(this);
        theme.onChange(this::refresh);
        getAccessibleContext().setAccessibleName("Substrate");
    }

    void show(Shown next) {
        if (shown == null || next.drawing() != shown.drawing()) {
            view.setToIdentity();
            walk.leave();
        }
        shown = next;
        getAccessibleContext().setAccessibleDescription(describe(next));
        refresh();
    }

    /** Marks atoms a finding is about. */
    void highlight(List<Integer> atoms) {
        highlighted = atoms;
        repaint();
    }

    /** The whole molecule. */
    void fit() {
        view.setToIdentity();
        refresh();
    }

    /** The substrate with its tags, as a picture. */
    Optional<Picture> asPicture() {
        return Optional.ofNullable(shown).map(known -> new Picture("substrate", getSize(), theme.color("ground"),
                g -> new SubstratePicture(known, theme.palette(), g.getFont(), getSize(), view, g).paint(g, List.of(), Optional.empty())));
    }

    private static String describe(Shown shown) {
        return String.join(". ", shown.tags().sites().stream().map(LetteredSite::sentence).toList());
    }

    private void refresh() {
        picture = null;
        repaint();
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        g.setColor(theme.color("ground"));
        g.fillRect(0, 0, getWidth(), getHeight());
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setFont(UIManager.getFont("Label.font"));
        if (shown != null) {
            picture(g).paint(g, highlighted, isFocusOwner() ? focused() : Optional.empty());
            Keys.paintFocus(g, this, theme);
        }
        g.dispose();
    }

    private SubstratePicture picture(Graphics2D g) {
        if (picture == null || !getSize().equals(pictureSize)) {
            pictureSize = getSize();
            picture = new SubstratePicture(shown, theme.palette(), g.getFont(), pictureSize, view, g);
        }
        return picture;
    }

    private Optional<LetteredSite> focused() {
        return shown == null ? Optional.empty() : walk.of(shown.tags().sites());
    }

    /** The card of the site that has the keyboard. */
    private void showCard() {
        hideCard();
        if (shown == null || picture == null) {
            return;
        }
        focused().ifPresent(site -> picture.placeOf(site).ifPresent(box -> {
            JToolTip tip = createToolTip();
            tip.setTipText(SiteCard.html(shown, site));
            Point corner = new Point((int) box.getMaxX(), (int) box.getMaxY());
            SwingUtilities.convertPointToScreen(corner, this);
            card = PopupFactory.getSharedInstance().getPopup(this, tip, corner.x, corner.y);
            card.show();
        }));
    }

    /** Whether the card of a site is open. */
    boolean showsCard() {
        return card != null;
    }

    private void hideCard() {
        if (card != null) {
            card.hide();
            card = null;
        }
    }

    private void moveFocus(int by) {
        hideCard();
        walk.move(by, shown == null ? 0 : shown.tags().sites().size());
        repaint();
    }

    private void chooseFocused() {
        focused().ifPresent(site -> onSite.accept(site.label()));
    }

    /** Where the tag of a site is, once it has been painted. */
    Optional<Rectangle2D> placeOf(String label) {
        return picture == null ? Optional.empty() : shown.tags().labelled(label).flatMap(picture::placeOf);
    }

    private Optional<LetteredSite> siteAt(Point point) {
        return picture == null ? Optional.empty() : picture.siteAt(point);
    }

    @Override
    public String getToolTipText(MouseEvent event) {
        return siteAt(event.getPoint()).map(site -> SiteCard.html(shown, site)).orElse(null);
    }

    private void zoom(double factor, Point about) {
        double next = view.getScaleX() * factor;
        if (next >= LEAST_ZOOM && next <= MOST_ZOOM) {
            AffineTransform step = AffineTransform.getTranslateInstance(about.x, about.y);
            step.scale(factor, factor);
            step.translate(-about.x, -about.y);
            view.preConcatenate(step);
            refresh();
        }
    }

    private final class Mouse extends MouseAdapter {
        private Point last;

        @Override
        public void mousePressed(MouseEvent event) {
            requestFocusInWindow();
            last = event.getPoint();
        }

        @Override
        public void mouseClicked(MouseEvent event) {
            Optional<LetteredSite> site = siteAt(event.getPoint());
            if (site.isPresent()) {
                onSite.accept(site.get().label());
            } else if (event.getClickCount() == 2) {
                fit();
            }
        }

        @Override
        public void mouseDragged(MouseEvent event) {
            view.preConcatenate(AffineTransform.getTranslateInstance(event.getX() - last.x, event.getY() - last.y));
            last = event.getPoint();
            refresh();
        }

        @Override
        public void mouseMoved(MouseEvent event) {
            setCursor(Cursor.getPredefinedCursor(siteAt(event.getPoint()).isPresent() ? Cursor.HAND_CURSOR : Cursor.DEFAULT_CURSOR));
        }

        @Override
        public void mouseWheelMoved(MouseWheelEvent event) {
            zoom(Math.pow(ZOOM_STEP, -event.getPreciseWheelRotation()), event.getPoint());
        }
    }
}
