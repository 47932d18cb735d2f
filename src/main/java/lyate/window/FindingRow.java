package lyate.window;

import java.awt.BorderLayout;
import java.awt.Font;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.UIManager;
import lyate.molecule.Molecule;
import lyate.report.Words;
import lyate.review.Finding;

/** One finding: severity, sentence, and on demand the evidence and the source. Pointing at it marks its atoms. */
final class FindingRow extends JPanel {

    private final JPanel details;
    private final JButton more;
    private final String sentence;

    FindingRow(Finding finding, Molecule substrate, Theme theme, boolean open, Consumer<List<Integer>> highlight) {
        super(new BorderLayout(theme.space("gap"), theme.space("small")));
        Palette palette = theme.palette();
        sentence = finding.sentence();
        int gap = palette.space("gap");
        setBackground(palette.color("ground"));
        setBorder(BorderFactory.createEmptyBorder(gap, gap, gap, gap));

        Font plain = UIManager.getFont("Label.font");
        JLabel icon = new JLabel(new SeverityIcon(finding.severity(), palette, (int) (plain.getSize2D() * 1.3)));
        icon.setVerticalAlignment(JLabel.TOP);
        icon.getAccessibleContext().setAccessibleName(finding.severity().word());

        WrappedText kind = text(Words.sentence(finding.severity().word()) + ": " + finding.kind().code().replace('-', ' '),
                palette, finding.severity().word());
        kind.setFont(plain.deriveFont(Font.BOLD));
        more = new JButton();
        more.putClientProperty("JButton.buttonType", "borderless");
        more.putClientProperty("FlatLaf.styleClass", "small");
        more.putClientProperty("FlatLaf.style", "margin: 0,4,0,4; minimumWidth: 0");
        more.addActionListener(event -> setOpen(!isOpen()));
        JPanel head = new JPanel(new BorderLayout());
        head.setOpaque(false);
        head.add(kind);
        JPanel corner = new JPanel(new BorderLayout());
        corner.setOpaque(false);
        corner.add(more, BorderLayout.NORTH);
        head.add(corner, BorderLayout.EAST);

        details = details(finding, substrate, palette);
        JPanel body = new JPanel(new StackLayout(palette.space("small")));
        body.setOpaque(false);
        body.add(head);
        body.add(text(sentence, palette, "ink"));
        body.add(details);
        add(icon, BorderLayout.WEST);
        add(body);
        setOpen(open);
        markAtomsOnHover(finding.atoms(), highlight);
    }

    private static JPanel details(Finding finding, Molecule substrate, Palette palette) {
        JPanel details = new JPanel(new StackLayout(palette.space("small")));
        details.setOpaque(false);
        finding.evidence().forEach(fact -> details.add(text("\u2022 " + fact, palette, "ink")));
        if (!finding.atoms().isEmpty()) {
            details.add(text("Atoms: " + String.join(", ", finding.atoms().stream().map(substrate::label).toList()), palette, "ink.soft"));
        }
        details.add(text("Source: " + finding.source(), palette, "ink.soft"));
        return details;
    }

    private static WrappedText text(String text, Palette palette, String colour) {
        WrappedText area = new WrappedText(text);
        area.setForeground(palette.color(colour));
        return area;
    }

    boolean isOpen() {
        return details.isVisible();
    }

    private void setOpen(boolean open) {
        details.setVisible(open);
        more.setText(open ? "less" : "why");
        more.getAccessibleContext().setAccessibleName((open ? "Hide" : "Show") + " the evidence: " + sentence);
        revalidate();
    }

    private void markAtomsOnHover(List<Integer> atoms, Consumer<List<Integer>> highlight) {
        MouseAdapter hover = new MouseAdapter() {
            @Override
            public void mouseEntered(MouseEvent event) {
                highlight.accept(atoms);
            }

            @Override
            public void mouseExited(MouseEvent event) {
                highlight.accept(List.of());
            }
        };
        addMouseListener(hover);
        more.addMouseListener(hover);
    }
}
