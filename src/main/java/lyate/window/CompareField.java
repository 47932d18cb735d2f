package lyate.window;

import java.awt.Dimension;
import java.util.function.Consumer;
import javax.swing.JTextField;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import lyate.stock.Base;
import lyate.stock.UnknownNameException;

/** Adds bases of the stockroom to the ladder, to be compared with the one chosen. */
final class CompareField extends JTextField {

    private static final int HITS = 40;

    private final transient Engine engine;
    private final transient Consumer<Base> onBase;
    private final transient Suggestions suggestions;

    CompareField(Theme theme, Engine engine, Consumer<Base> onBase) {
        super(18);
        this.engine = engine;
        this.onBase = onBase;
        putClientProperty("JTextField.placeholderText", "compare with another base");
        getAccessibleContext().setAccessibleName("Base to compare on the ladder");
        setToolTipText("Adds a base to the ladder. There, Enter or a double click takes it, Delete removes it.");
        Runnable enter = this::addTyped;
        Keys.bind(this, "ENTER", enter);
        suggestions = new Suggestions(this, theme, typed -> engine.searchBases(typed, HITS).stream().map(StockWords::hit).toList(), enter);
        getDocument().addDocumentListener(new DocumentListener() {
            @Override
            public void insertUpdate(DocumentEvent event) {
                suggestions.offer();
            }

            @Override
            public void removeUpdate(DocumentEvent event) {
                suggestions.offer();
            }

            @Override
            public void changedUpdate(DocumentEvent event) {
                suggestions.offer();
            }
        });
    }

    private void addTyped() {
        try {
            Base base = engine.stockroom().base(getText());
            setText("");
            putClientProperty("JComponent.outline", null);
            onBase.accept(base);
        } catch (UnknownNameException e) {
            putClientProperty("JComponent.outline", "error");
            setToolTipText(e.getMessage());
        }
    }

    @Override
    public Dimension getMaximumSize() {
        return getPreferredSize();
    }
}
