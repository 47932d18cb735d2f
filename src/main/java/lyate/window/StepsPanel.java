package lyate.window;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.FlowLayout;
import javax.swing.BorderFactory;
import javax.swing.DefaultListModel;
import javax.swing.Icon;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import javax.swing.JScrollPane;
import javax.swing.ListCellRenderer;
import javax.swing.ListSelectionModel;
import lyate.report.Words;
import lyate.review.Finding.Severity;
import lyate.review.Reviewer;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetRow;
import lyate.window.SheetReviews.Judged;

/** The rows of the sheet with their verdicts. */
final class StepsPanel extends JPanel {

    private final Theme theme;
    private final transient SheetDocument document;
    private final transient SheetReviews reviews;
    private final DefaultListModel<SheetRow> rows = new DefaultListModel<>();
    private final JList<SheetRow> list = new JList<>(rows);
    private final JProgressBar progress = new JProgressBar();
    private final JPanel running = new JPanel(new BorderLayout());
    private boolean updating;

    StepsPanel(Theme theme, SheetDocument document, FieldReader reader, Reviewer reviewer) {
        super(new BorderLayout());
        this.theme = theme;
        this.document = document;
        this.reviews = new SheetReviews(reader, reviewer, this::progress);
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setCellRenderer(new Row());
        list.getAccessibleContext().setAccessibleName("Steps");
        list.addListSelectionListener(event -> {
            if (!updating && list.getSelectedIndex() >= 0) {
                document.select(list.getSelectedIndex());
            }
        });
        Keys.bind(list, "DELETE", () -> document.change(document.state().removed()));
        Keys.bind(list, "alt UP", () -> document.change(document.state().moved(-1)));
        Keys.bind(list, "alt DOWN", () -> document.change(document.state().moved(1)));
        JScrollPane scroll = new JScrollPane(list);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        add(scroll);
        add(buttons(), BorderLayout.NORTH);
        JButton stop = new JButton("Stop");
        stop.addActionListener(event -> reviews.cancel());
        progress.setStringPainted(true);
        running.add(progress);
        running.add(stop, BorderLayout.EAST);
        add(running, BorderLayout.SOUTH);
        running.setVisible(false);
        document.onChange(this::refresh);
        theme.onChange(list::repaint);
        refresh();
    }

    private JPanel buttons() {
        JPanel panel = new JPanel(new FlowLayout(FlowLayout.LEADING, theme.space("tiny"), theme.space("tiny")));
        panel.add(button("+", "Add a step", document::add));
        panel.add(button("2\u00d7", "Duplicate the step", () -> document.change(document.state().duplicated())));
        panel.add(button("\u2191", "Move the step up (Alt+Up)", () -> document.change(document.state().moved(-1))));
        panel.add(button("\u2193", "Move the step down (Alt+Down)", () -> document.change(document.state().moved(1))));
        panel.add(button("\u2212", "Delete the step (Delete)", () -> document.change(document.state().removed())));
        return panel;
    }

    private static JButton button(String sign, String name, Runnable action) {
        JButton button = new JButton(sign);
        button.putClientProperty("JButton.buttonType", "toolBarButton");
        button.setToolTipText(name);
        button.getAccessibleContext().setAccessibleName(name);
        button.addActionListener(event -> action.run());
        return button;
    }

    private void refresh() {
        updating = true;
        var sheetRows = document.state().sheet().rows();
        if (rows.size() == sheetRows.size()) {
            for (int i = 0; i < rows.size(); i++) {
                if (!rows.get(i).equals(sheetRows.get(i))) {
                    rows.set(i, sheetRows.get(i));
                }
            }
        } else {
            rows.clear();
            rows.addAll(sheetRows);
        }
        list.setSelectedIndex(document.state().selected());
        list.ensureIndexIsVisible(document.state().selected());
        updating = false;
        if (sheetRows.size() > 1) {
            reviews.update(sheetRows);
        }
    }

    private void progress(int left) {
        running.setVisible(left > 1);
        progress.setMaximum(Math.max(1, rows.size()));
        progress.setValue(rows.size() - left);
        progress.setString(left + " to judge");
        list.repaint();
    }

    /** Whether every row has its verdict. */
    boolean isSettled() {
        return !running.isVisible();
    }

    void close() {
        reviews.close();
    }

    /** Verdict, name, and what is done in the row. */
    private final class Row extends JPanel implements ListCellRenderer<SheetRow> {
        private final JLabel name = new JLabel();
        private final JLabel what = new JLabel();

        Row() {
            super(new BorderLayout());
            int gap = theme.space("gap");
            setBorder(BorderFactory.createEmptyBorder(gap / 2, gap, gap / 2, gap));
            what.putClientProperty("FlatLaf.styleClass", "small");
            add(name, BorderLayout.NORTH);
            add(what);
        }

        @Override
        public Component getListCellRendererComponent(JList<? extends SheetRow> owner, SheetRow row, int index, boolean selected, boolean focused) {
            Judged judged = reviews.of(row).orElse(null);
            String verdict = judged == null ? "\u2026" : judged.verdict().map(known -> Words.verdict(known) + " " + judged.sentence()).orElse("cannot be judged");
            name.setText(row.name() + "  \u2013  " + verdict);
            int size = owner.getFont().getSize();
            name.setIcon(judged == null ? null : judged.verdict().<Icon>map(known -> new VerdictIcon(known, theme.palette(), size))
                    .orElse(new SeverityIcon(Severity.CAUTION, theme.palette(), size)));
            String substrate = StepCells.text(row).get(StepField.SUBSTRATE).lines().findFirst().orElse("");
            what.setText(or(row.text(SheetColumn.BASE), "no base yet") + " in " + or(row.text(SheetColumn.SOLVENT), "no solvent yet") + ": " + or(substrate, "no substrate yet"));
            setToolTipText(judged != null && judged.verdict().isEmpty() ? judged.sentence() : null);
            setBackground(selected ? owner.getSelectionBackground() : owner.getBackground());
            name.setForeground(selected ? owner.getSelectionForeground() : owner.getForeground());
            what.setForeground(selected ? owner.getSelectionForeground() : theme.color("ink.soft"));
            getAccessibleContext().setAccessibleName(name.getText());
            return this;
        }

        private static String or(String text, String otherwise) {
            return text.isEmpty() ? otherwise : text;
        }

        @Override
        public Dimension getPreferredSize() {
            return new Dimension(1, super.getPreferredSize().height);
        }
    }
}
