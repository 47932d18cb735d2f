package lyate.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.math.BigDecimal;
import java.util.function.Consumer;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;

/** A field of the step strip: label above, text; what is said below it stands in the {@link HintRow}. */
final class FieldBox extends JPanel {

    private final StepField kind;
    private final JTextField text = new JTextField();
    private final HintLine line;
    private final int width;
    private String usual = "";
    private boolean quiet;

    /** @param width width at 100 %, already scaled */
    FieldBox(StepField kind, Theme theme, int width, Consumer<FieldBox> onEdit) {
        super(new BorderLayout(0, theme.space("tiny")));
        this.kind = kind;
        this.width = width;
        this.line = new HintLine(text);
        setOpaque(false);
        JLabel label = new JLabel(kind.label());
        label.setLabelFor(text);
        label.putClientProperty("FlatLaf.styleClass", "small");
        text.getAccessibleContext().setAccessibleName(kind.fullName() + (kind.isNumber() ? ", " + kind.unit() : ""));
        text.setToolTipText(kind.fullName() + ": " + kind.hint());
        if (kind.isNumber()) {
            Keys.bind(text, "UP", () -> stepBy(1));
            Keys.bind(text, "DOWN", () -> stepBy(-1));
        } else {
            text.putClientProperty("JTextField.placeholderText", kind.hint());
            text.putClientProperty("JTextField.showClearButton", true);
        }
        if (kind != StepField.SUBSTRATE) {
            // What stands there is replaced more often than mended.
            text.putClientProperty("JTextField.selectAllOnFocusPolicy", "always");
        }
        text.getDocument().putProperty("filterNewlines", false);
        text.getDocument().addDocumentListener(new DocumentListener() {
            @Override
            public void insertUpdate(DocumentEvent event) {
                changed();
            }

            @Override
            public void removeUpdate(DocumentEvent event) {
                changed();
            }

            @Override
            public void changedUpdate(DocumentEvent event) {
                changed();
            }

            private void changed() {
                if (!quiet) {
                    onEdit.accept(FieldBox.this);
                }
            }
        });
        add(label, BorderLayout.NORTH);
        add(text);
    }

    StepField kind() {
        return kind;
    }

    JTextField field() {
        return text;
    }

    HintLine line() {
        return line;
    }

    String text() {
        return text.getText();
    }

    /** Sets the text without telling anybody. */
    void setQuietly(String value) {
        if (!text.getText().equals(value)) {
            quiet = true;
            text.setText(value);
            text.setCaretPosition(0);
            quiet = false;
        }
    }

    /** Says in grey what an empty field stands for. */
    void setUsual(double value) {
        usual = BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
        text.putClientProperty("JTextField.placeholderText", usual);
        text.repaint();
    }

    /** Up and down keys move the number, or the usual one where none is written, by a sensible step. */
    private void stepBy(int steps) {
        try {
            BigDecimal value = new BigDecimal(text.getText().isBlank() ? usual : text.getText().strip());
            BigDecimal step = switch (kind) {
                case TEMPERATURE -> BigDecimal.valueOf(5);
                case WATER -> BigDecimal.TEN;
                default -> new BigDecimal("0.05");
            };
            BigDecimal next = value.add(step.multiply(BigDecimal.valueOf(steps)));
            boolean belowZero = next.signum() < 0 && kind != StepField.TEMPERATURE;
            text.setText((belowZero ? BigDecimal.ZERO : next).stripTrailingZeros().toPlainString());
        } catch (NumberFormatException e) {
            // Half a number has no next one; the line below the field already says so.
            text.getToolkit().beep();
        }
    }

    @Override
    public Dimension getPreferredSize() {
        return new Dimension(width, super.getPreferredSize().height);
    }

    @Override
    public Dimension getMinimumSize() {
        return new Dimension(width / 2, super.getMinimumSize().height);
    }
}
