package lyate.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.FlowLayout;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import javax.swing.BorderFactory;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import lyate.bench.Amounts;
import lyate.bench.WorkUpKit;
import lyate.bench.WorkUpKit.Answer;
import lyate.bench.WorkUpKit.Plan;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.report.WorkUpWords;
import lyate.sheet.Quantity;
import lyate.stock.Acid;
import lyate.stock.Medium;
import org.jfree.chart.ChartPanel;

/** How to quench the step, and at which pH to extract. */
final class WorkUpPanel extends LazyTab {

    private static final Quantity PH = new Quantity("pH", 0, 14);

    private final Theme theme;
    private final transient Engine engine;
    private final transient Supplier<Optional<Amounts>> amounts;
    private final JTextField product = new JTextField(24);
    private final JComboBox<String> acids = new JComboBox<>();
    private final JTextField pH = new JTextField("7", 5);
    private final transient ChartPanel chart = Charts.panel("Uncharged share against pH");
    private final JPanel words = new JPanel();
    /** Loaded on first use; touched by the background thread alone. */
    private transient WorkUpKit kit;
    private transient Answer answer;

    WorkUpPanel(Theme theme, Engine engine, Supplier<Optional<Amounts>> amounts) {
        super("work-up");
        this.theme = theme;
        this.engine = engine;
        this.amounts = amounts;
        product.putClientProperty("JTextField.placeholderText", "the substrate, its anion quenched");
        JPanel form = new JPanel(new FlowLayout(FlowLayout.LEADING, theme.space("gap"), theme.space("small")));
        form.add(label("Product", product));
        form.add(product);
        JLabel acidLabel = new JLabel("Acid");
        acidLabel.setLabelFor(acids);
        form.add(acidLabel);
        form.add(acids);
        form.add(label("to pH", pH));
        form.add(pH);
        product.getAccessibleContext().setAccessibleName("Product");
        acids.getAccessibleContext().setAccessibleName("Acid of the quench");
        pH.getAccessibleContext().setAccessibleName("pH of the quench");
        add(form, BorderLayout.NORTH);
        add(chart);
        JScrollPane remarks = new JScrollPane(new Column(words), JScrollPane.VERTICAL_SCROLLBAR_AS_NEEDED, JScrollPane.HORIZONTAL_SCROLLBAR_NEVER);
        remarks.setBorder(BorderFactory.createEmptyBorder());
        remarks.setPreferredSize(new Dimension(theme.space("findings.width") * 3 / 2, 0));
        add(remarks, BorderLayout.EAST);
        listen(product);
        listen(pH);
        acids.addActionListener(event -> again());
        theme.onChange(this::refresh);
    }

    private static JLabel label(String text, JTextField field) {
        JLabel label = new JLabel(text);
        label.setLabelFor(field);
        return label;
    }

    private void listen(JTextField field) {
        field.getDocument().addDocumentListener(new DocumentListener() {
            @Override
            public void insertUpdate(DocumentEvent event) {
                again();
            }

            @Override
            public void removeUpdate(DocumentEvent event) {
                again();
            }

            @Override
            public void changedUpdate(DocumentEvent event) {
                again();
            }
        });
    }

    private void again() {
        if (shown() != null) {
            show(shown());
        }
    }

    @Override
    Optional<Picture> asPicture() {
        return Charts.picture("work-up", chart, theme);
    }

    @Override
    Object key(Shown next) {
        return List.of(StepKey.of(next.review().step()), product.getText(), String.valueOf(acids.getSelectedItem()), pH.getText(), amounts.get());
    }

    @Override
    void work(Shown wanted) {
        Optional<Plan> plan = plan(wanted);
        plan.ifPresent(known -> start("working out the quench \u2026", goOn -> {
            if (kit == null) {
                kit = WorkUpKit.load(engine.folders(), engine.stockroom(), engine.enthalpies());
            }
            return kit.ask(known);
        }, result -> {
            answer = result;
            refresh();
        }));
    }

    private void fillAcids() {
        acids.setModel(new DefaultComboBoxModel<>(engine.stockroom().acids().stream().filter(acid -> acid.pKa(Medium.WATER).isPresent())
                .map(Acid::name).sorted().toArray(String[]::new)));
    }

    /** What is asked for; empty, with the field marked, where a field cannot be read. */
    private Optional<Plan> plan(Shown wanted) {
        if (acids.getItemCount() == 0) {
            fillAcids();
        }
        OptionalDouble target = PH.parse(pH.getText());
        pH.putClientProperty("JComponent.outline", target.isEmpty() ? "error" : null);
        Optional<Molecule> molecule = Optional.empty();
        String problem = "";
        if (!product.getText().isBlank()) {
            try {
                molecule = Optional.of(engine.molecules().read(product.getText()));
            } catch (MoleculeException e) {
                problem = CaretMessage.of(e.getMessage()).sentence();
            }
        }
        product.putClientProperty("JComponent.outline", problem.isEmpty() ? null : "error");
        say(problem);
        Optional<Acid> acid = engine.stockroom().acids().stream().filter(known -> known.name().equals(acids.getSelectedItem())).findFirst();
        if (target.isEmpty() || !problem.isEmpty() || acid.isEmpty() || amounts.get().isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new Plan(wanted.review().step(), amounts.get().get(), molecule, acid.get(), target.getAsDouble()));
    }

    @Override
    void refresh() {
        if (answer == null) {
            return;
        }
        double target = PH.parse(pH.getText()).orElse(7);
        chart.setChart(new WorkUpChart(theme.palette()).chart(answer, target));
        words.removeAll();
        words.setLayout(new StackLayout(theme.space("small")));
        words.setBackground(theme.color("ground"));
        int gap = theme.space("gap");
        words.setBorder(BorderFactory.createEmptyBorder(gap, gap, gap, gap));
        for (String line : WorkUpWords.lines(answer)) {
            WrappedText text = new WrappedText(line);
            text.setForeground(theme.color("ink"));
            words.add(text);
        }
        words.revalidate();
        words.repaint();
    }
}
