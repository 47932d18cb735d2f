package lyate.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.FlowLayout;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javax.swing.BorderFactory;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import lyate.bench.Amounts;
import lyate.bench.Batch;
import lyate.bench.GasAndHeat;
import lyate.molecule.Molecule;
import lyate.review.Review;

/** What to weigh and measure out for a batch, and the gas and heat it sets free. */
final class AmountsPanel extends JPanel {

    private static final String MILLIMOLE = "mmol";
    private static final String GRAM = "g";

    private final Theme theme;
    private final transient Engine engine;
    private final JTextField amount = new JTextField("5", 7);
    private final JComboBox<String> unit = new JComboBox<>(new String[] {GRAM, MILLIMOLE});
    private final JTextField titrated = new JTextField(7);
    private final AmountsModel model = new AmountsModel();
    private final JPanel words = new JPanel();
    private transient Review review;
    private transient Optional<Amounts> amounts = Optional.empty();

    AmountsPanel(Theme theme, Engine engine) {
        super(new BorderLayout());
        this.theme = theme;
        this.engine = engine;
        JPanel form = new JPanel(new FlowLayout(FlowLayout.LEADING, theme.space("gap"), theme.space("small")));
        form.add(label("Substrate", amount));
        form.add(amount);
        form.add(unit);
        form.add(label("Strength of the base by titration", titrated));
        form.add(titrated);
        form.add(new JLabel("mol/L"));
        amount.getAccessibleContext().setAccessibleName("Amount of substrate");
        unit.getAccessibleContext().setAccessibleName("Unit of the amount");
        titrated.putClientProperty("JTextField.placeholderText", "label");
        add(form, BorderLayout.NORTH);
        add(table());
        JScrollPane remarks = new JScrollPane(new Column(words), JScrollPane.VERTICAL_SCROLLBAR_AS_NEEDED, JScrollPane.HORIZONTAL_SCROLLBAR_NEVER);
        remarks.setBorder(BorderFactory.createEmptyBorder());
        remarks.setPreferredSize(new Dimension(theme.space("findings.width") * 3 / 2, 0));
        add(remarks, BorderLayout.EAST);
        listen(amount);
        listen(titrated);
        unit.addActionListener(event -> update());
        theme.onChange(this::update);
    }

    private static JLabel label(String words, JTextField field) {
        JLabel label = new JLabel(words);
        label.setLabelFor(field);
        return label;
    }

    private JScrollPane table() {
        RowsTable table = new RowsTable(model, "Amounts", theme);
        // The rows follow one another as they are counted.
        table.setAutoCreateRowSorter(false);
        table.setRowSorter(null);
        return table.scrolled();
    }

    private void listen(JTextField field) {
        field.getDocument().addDocumentListener(new DocumentListener() {
            @Override
            public void insertUpdate(DocumentEvent event) {
                update();
            }

            @Override
            public void removeUpdate(DocumentEvent event) {
                update();
            }

            @Override
            public void changedUpdate(DocumentEvent event) {
                update();
            }
        });
    }

    void show(Shown shown) {
        review = shown.review();
        update();
    }

    /** The amounts on screen. */
    Optional<Amounts> amounts() {
        return amounts;
    }

    private void update() {
        OptionalDouble size = above(amount);
        OptionalDouble strength = titrated.getText().isBlank() ? OptionalDouble.empty() : above(titrated);
        boolean badStrength = !titrated.getText().isBlank() && strength.isEmpty();
        amount.putClientProperty("JComponent.outline", size.isEmpty() ? "error" : null);
        titrated.putClientProperty("JComponent.outline", badStrength ? "error" : null);
        if (review == null || size.isEmpty() || badStrength) {
            return;
        }
        Molecule substrate = review.step().substrate();
        Batch batch = GRAM.equals(unit.getSelectedItem()) ? Batch.ofGrams(substrate, size.getAsDouble()) : Batch.ofMilliMole(substrate, size.getAsDouble());
        Amounts worked = Amounts.of(review, batch, strength);
        amounts = Optional.of(worked);
        model.show(review.step(), worked);
        say(worked, GasAndHeat.of(review, worked, engine.enthalpies()));
    }

    private static OptionalDouble above(JTextField field) {
        try {
            double value = Double.parseDouble(field.getText().strip().replace(',', '.'));
            return value > 0 && value < 1e9 ? OptionalDouble.of(value) : OptionalDouble.empty();
        } catch (NumberFormatException e) {
            return OptionalDouble.empty();
        }
    }

    private void say(Amounts amounts, GasAndHeat gasAndHeat) {
        List<String> lines = new ArrayList<>(amounts.warnings());
        gasAndHeat.heatSentence().ifPresent(lines::add);
        lines.addAll(gasAndHeat.cautions());
        words.removeAll();
        words.setLayout(new StackLayout(theme.space("small")));
        words.setBackground(theme.color("ground"));
        int gap = theme.space("gap");
        words.setBorder(BorderFactory.createEmptyBorder(gap, gap, gap, gap));
        for (String line : lines) {
            WrappedText text = new WrappedText(line);
            text.setForeground(theme.color("ink"));
            words.add(text);
        }
        words.revalidate();
        words.repaint();
    }
}
