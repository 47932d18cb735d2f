package lyate.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Point;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.UIManager;
import lyate.report.Words;
import lyate.review.Finding;
import lyate.review.FindingKind;
import lyate.review.Review;

/** The verdict, then the findings by severity; what can hurt people stands apart at the foot, always open. */
final class FindingsPanel extends JPanel {

    private static final Set<FindingKind> SAFETY = EnumSet.of(FindingKind.GAS_EVOLVED, FindingKind.HEAT_RELEASED,
            FindingKind.THERMAL_HAZARD, FindingKind.PYROPHORIC, FindingKind.WATER_REACTIVE, FindingKind.TOXIC, FindingKind.PEROXIDE_FORMER);
    /** Verdict, heading and first finding. */
    private static final int FIRST_TO_SEE = 3;
    private static final int LEAST_LINES = 5;
    private static final String WHO_DECIDES = "This is not a risk assessment. The safety data sheets, the local rules and a qualified person decide.";

    private final Theme theme;
    private final Consumer<List<Integer>> highlight;
    private final Column column = new Column();
    private final Column safety = new Column();
    private final JScrollPane columnScroll;
    private final JScrollPane safetyScroll;
    private Review review;

    FindingsPanel(Theme theme, Consumer<List<Integer>> highlight) {
        super(new BorderLayout());
        this.theme = theme;
        this.highlight = highlight;
        columnScroll = scroll(column);
        add(columnScroll);
        safetyScroll = scroll(safety);
        add(safetyScroll, BorderLayout.SOUTH);
        theme.onChange(this::rebuild);
        getAccessibleContext().setAccessibleName("Findings");
    }

    void show(Review next) {
        review = next;
        rebuild();
    }

    private void rebuild() {
        if (review == null) {
            return;
        }
        Point position = columnScroll.getViewport().getViewPosition();
        column.removeAll();
        safety.removeAll();
        column.setLayout(new StackLayout(theme.space("hair")));
        safety.setLayout(new StackLayout(theme.space("hair")));
        column.setBackground(theme.color("line.soft"));
        safety.setBackground(theme.color("line.soft"));
        column.add(new VerdictHeader(review, theme.palette()));
        List<Finding> chemistry = review.findings().stream().filter(finding -> !SAFETY.contains(finding.kind())).toList();
        column.add(section(chemistry.isEmpty() ? "No findings" : "Findings"));
        for (Finding finding : chemistry) {
            column.add(new FindingRow(finding, review.step().substrate(), theme, finding.severity() == Finding.Severity.STOP, highlight));
        }
        if (!review.explanation().isEmpty()) {
            column.add(section("Why, and what would change it"));
            column.add(lines(review.explanation()));
        }
        if (!review.assumptions().isEmpty()) {
            column.add(section("Assumed"));
            column.add(lines(review.assumptions()));
        }
        showSafety(review.findings().stream().filter(finding -> SAFETY.contains(finding.kind())).toList());
        column.revalidate();
        column.repaint();
        revalidate();
        validate();
        columnScroll.getViewport().setViewPosition(position);
    }

    private void showSafety(List<Finding> hazards) {
        safetyScroll.setVisible(!hazards.isEmpty());
        safety.add(section("Safety"));
        hazards.forEach(hazard -> safety.add(new FindingRow(hazard, review.step().substrate(), theme, false, highlight)));
        safety.add(lines(List.of(WHO_DECIDES)));
    }

    private JLabel section(String title) {
        JLabel label = new JLabel(title);
        label.setFont(UIManager.getFont("Label.font").deriveFont(Font.BOLD));
        label.setForeground(theme.color("ink.soft"));
        label.setOpaque(true);
        label.setBackground(theme.color("ground.soft"));
        int gap = theme.space("gap");
        label.setBorder(BorderFactory.createEmptyBorder(gap / 2, gap, gap / 2, gap));
        return label;
    }

    private JPanel lines(List<String> sentences) {
        JPanel panel = new JPanel(new StackLayout(theme.space("small")));
        int gap = theme.space("gap");
        panel.setBorder(BorderFactory.createEmptyBorder(gap, gap, gap, gap));
        panel.setBackground(theme.color("ground"));
        for (String sentence : sentences) {
            WrappedText text = new WrappedText(Words.sentence(sentence));
            text.setForeground(theme.color("ink"));
            panel.add(text);
        }
        return panel;
    }

    private static JScrollPane scroll(JComponent content) {
        JScrollPane scroll = new JScrollPane(content, JScrollPane.VERTICAL_SCROLLBAR_AS_NEEDED, JScrollPane.HORIZONTAL_SCROLLBAR_NEVER);
        scroll.setBorder(null);
        scroll.getVerticalScrollBar().setUnitIncrement(UIManager.getFont("Label.font").getSize() * 2);
        return scroll;
    }

    /** Safety notes scroll beyond a third of the height, sooner where verdict and first finding would not be seen; a note is always in sight. */
    @Override
    public void doLayout() {
        if (safetyScroll.isVisible()) {
            safety.setSize(getWidth(), Math.max(1, safety.getHeight()));
            int wanted = safety.getPreferredSize().height;
            int first = Arrays.stream(column.getComponents()).limit(FIRST_TO_SEE).mapToInt(part -> part.getPreferredSize().height).sum();
            int least = LEAST_LINES * getFontMetrics(UIManager.getFont("Label.font")).getHeight();
            int room = Math.max(least, Math.min(getHeight() / 3, getHeight() - first));
            safetyScroll.setPreferredSize(new Dimension(getWidth(), Math.min(wanted, room)));
        }
        super.doLayout();
    }
}
