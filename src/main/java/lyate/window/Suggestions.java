package lyate.window;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Point;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.Collections;
import java.util.List;
import java.util.function.Function;
import javax.swing.Action;
import javax.swing.DefaultListModel;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JPopupMenu;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import javax.swing.ListCellRenderer;
import javax.swing.ListSelectionModel;

/** Names from the stockroom offered below a field while it is typed in; arrows choose, Enter takes, Escape closes. */
final class Suggestions {

    /** A hit: the name that goes into the field, and what helps to choose. */
    record Hit(String name, String aliases, String value) {}

    private final JTextField field;
    private final Theme theme;
    private final Function<String, List<Hit>> search;
    private final DefaultListModel<Hit> hits = new DefaultListModel<>();
    private final JList<Hit> list = new JList<>(hits) {
        /** A row is never wider than the popup: the value at its right edge must be in sight. */
        @Override
        public boolean getScrollableTracksViewportWidth() {
            return true;
        }
    };
    private final JPopupMenu popup = new JPopupMenu();
    private final Runnable onTake;
    private boolean taking;

    /** @param onTake called once a hit's name is in the field */
    Suggestions(JTextField field, Theme theme, Function<String, List<Hit>> search, Runnable onTake) {
        this.onTake = onTake;
        this.field = field;
        this.theme = theme;
        this.search = search;
        list.setFocusable(false);
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setCellRenderer(new Row(theme));
        list.getAccessibleContext().setAccessibleName("Suggestions");
        JScrollPane scroll = new JScrollPane(list);
        scroll.setBorder(null);
        popup.setFocusable(false);
        popup.add(scroll);
        field.addFocusListener(new FocusAdapter() {
            @Override
            public void focusLost(FocusEvent event) {
                popup.setVisible(false);
            }
        });
        list.addMouseListener(new MouseAdapter() {
            @Override
            public void mouseClicked(MouseEvent event) {
                take();
            }
        });
        Keys.bind(field, "DOWN", () -> move(1));
        Keys.bind(field, "UP", () -> move(-1));
        Keys.bind(field, "ESCAPE", () -> popup.setVisible(false));
        Object enterKey = field.getInputMap().get(KeyStroke.getKeyStroke("ENTER"));
        Action enter = enterKey == null ? null : field.getActionMap().get(enterKey);
        Keys.bind(field, "ENTER", () -> {
            if (popup.isVisible() && list.getSelectedIndex() >= 0) {
                take();
            } else if (enter != null) {
                enter.actionPerformed(null);
            }
        });
    }

    /** Offers what the text may mean; call after each edit by the user. */
    void offer() {
        if (taking || !field.isFocusOwner()) {
            return;
        }
        if (field.getText().isBlank()) {
            popup.setVisible(false);
        } else {
            open();
        }
    }

    private void open() {
        hits.clear();
        hits.addAll(search.apply(field.getText()));
        if (hits.isEmpty()) {
            popup.setVisible(false);
            return;
        }
        list.setVisibleRowCount(Math.min(hits.size(), 10));
        list.setFont(field.getFont());
        int height = Math.min(list.getPreferredSize().height + theme.space("gap"), 2 * theme.space("popup.height"));
        popup.setPopupSize(new Dimension(Math.max(field.getWidth(), theme.space("popup.width")), height));
        if (!popup.isVisible()) {
            Point below = new Point(0, field.getHeight());
            popup.show(field, below.x, below.y);
        }
        list.clearSelection();
    }

    boolean isOpen() {
        return popup.isVisible();
    }

    /** What is offered. */
    List<Hit> offered() {
        return Collections.list(hits.elements());
    }

    private void move(int by) {
        if (!popup.isVisible()) {
            open();
            return;
        }
        int next = Math.floorMod(list.getSelectedIndex() + by, hits.size());
        list.setSelectedIndex(next);
        list.ensureIndexIsVisible(next);
    }

    private void take() {
        Hit hit = list.getSelectedValue();
        popup.setVisible(false);
        if (hit != null) {
            taking = true;
            field.setText(hit.name());
            taking = false;
            onTake.run();
        }
    }

    /** Name in bold, aliases after it, value at the right edge. */
    private static final class Row extends JPanel implements ListCellRenderer<Hit> {
        private final JLabel name = new JLabel();
        private final JLabel aliases = new JLabel();
        private final JLabel value = new JLabel();

        Row(Theme theme) {
            super(new BorderLayout(theme.space("gap"), 0));
            setBorder(javax.swing.BorderFactory.createEmptyBorder(theme.space("tiny"), theme.space("gap"), theme.space("tiny"), theme.space("gap")));
            add(name, BorderLayout.WEST);
            add(aliases);
            add(value, BorderLayout.EAST);
        }

        @Override
        public Component getListCellRendererComponent(JList<? extends Hit> owner, Hit hit, int index, boolean selected, boolean focused) {
            name.setText(hit.name());
            aliases.setText(hit.aliases());
            value.setText(hit.value());
            setBackground(selected ? owner.getSelectionBackground() : owner.getBackground());
            for (JLabel label : List.of(name, aliases, value)) {
                label.setForeground(selected ? owner.getSelectionForeground() : owner.getForeground());
                label.setFont(owner.getFont());
            }
            name.setFont(owner.getFont().deriveFont(Font.BOLD));
            getAccessibleContext().setAccessibleName(hit.name() + ", " + hit.value());
            return this;
        }
    }
}
