package lyate.window;

import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.util.UIScale;
import java.awt.BorderLayout;
import java.awt.FlowLayout;
import java.awt.Frame;
import java.awt.GridBagConstraints;
import java.awt.GridBagLayout;
import java.awt.Insets;
import java.util.EnumMap;
import java.util.Map;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JDialog;
import javax.swing.JFileChooser;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import javax.swing.KeyStroke;

/** What the user can set once and for all. */
final class PreferencesWindow extends JDialog {

    private static final int[] PERCENT = {100, 110, 125, 150, 175, 200, 250, 300};

    private final transient Theme theme;
    private final transient LookKeeper looks;
    private final transient WindowMemory memory;
    private final JComboBox<Look> look = new JComboBox<>(Look.values());
    private final JComboBox<String> size = new JComboBox<>();
    private final Map<StepField, JTextField> usual = new EnumMap<>(StepField.class);
    private final JTextField tables = new JTextField(28);
    private final JPanel form = new JPanel(new GridBagLayout());
    private int rows;

    PreferencesWindow(Frame owner, Theme theme, LookKeeper looks, WindowMemory memory) {
        super(owner, "Preferences", true);
        this.theme = theme;
        this.looks = looks;
        this.memory = memory;
        look.setSelectedItem(memory.look());
        for (int percent : PERCENT) {
            size.addItem(percent + " %");
        }
        size.setSelectedItem(Math.round(UIScale.getZoomFactor() * 100) + " %");
        row("Colours", look);
        row("Size", size);
        StepText blank = memory.newStep();
        for (StepField field : StepField.values()) {
            if (field != StepField.SUBSTRATE && field != StepField.PARTNER) {
                JTextField text = new JTextField(blank.get(field), 28);
                text.putClientProperty("JTextField.placeholderText", field.isNumber() ? "the usual" : "left open");
                usual.put(field, text);
                row("New steps: " + field.label(), text);
            }
        }
        tables.setText(memory.get("tables", ""));
        tables.putClientProperty("JTextField.placeholderText", "only the tables of the program");
        row("Folder with tables of your own", tables);
        JButton browse = new JButton("Browse\u2026");
        browse.addActionListener(event -> browse());
        row("", browse);
        row("", new JLabel("Tables are read when the program starts."));
        form.setBorder(BorderFactory.createEmptyBorder(theme.space("margin"), theme.space("margin"), theme.space("gap"), theme.space("margin")));
        add(form);
        add(buttons(), BorderLayout.SOUTH);
        getRootPane().registerKeyboardAction(event -> dispose(), KeyStroke.getKeyStroke("ESCAPE"), JComponent.WHEN_IN_FOCUSED_WINDOW);
        pack();
        setLocationRelativeTo(owner);
    }

    private void row(String words, JComponent field) {
        JLabel label = new JLabel(words);
        label.setLabelFor(field);
        if (!words.isEmpty()) {
            field.getAccessibleContext().setAccessibleName(words);
        }
        int gap = theme.space("small");
        form.add(label, new GridBagConstraints(0, rows, 1, 1, 0, 0, GridBagConstraints.LINE_START, GridBagConstraints.NONE,
                new Insets(gap, 0, gap, theme.space("wide")), 0, 0));
        form.add(field, new GridBagConstraints(1, rows++, 1, 1, 1, 0, GridBagConstraints.LINE_START,
                field instanceof JTextField ? GridBagConstraints.HORIZONTAL : GridBagConstraints.NONE, new Insets(gap, 0, gap, 0), 0, 0));
    }

    private JPanel buttons() {
        JButton keep = new JButton("Keep");
        keep.addActionListener(event -> keep());
        getRootPane().setDefaultButton(keep);
        JButton cancel = new JButton("Cancel");
        cancel.addActionListener(event -> dispose());
        JPanel panel = new JPanel(new FlowLayout(FlowLayout.TRAILING, theme.space("gap"), theme.space("gap")));
        panel.add(keep);
        panel.add(cancel);
        return panel;
    }

    private void browse() {
        JFileChooser chooser = new JFileChooser(tables.getText());
        chooser.setFileSelectionMode(JFileChooser.DIRECTORIES_ONLY);
        if (chooser.showOpenDialog(this) == JFileChooser.APPROVE_OPTION) {
            tables.setText(chooser.getSelectedFile().toString());
        }
    }

    private void keep() {
        float zoom = size.getSelectedIndex() < 0 ? UIScale.getZoomFactor() : PERCENT[size.getSelectedIndex()] / 100f;
        usual.forEach((field, text) -> memory.put("new." + field.name(), text.getText().strip()));
        memory.put("tables", tables.getText().strip());
        memory.put("zoom", Float.toString(zoom));
        looks.choose((Look) look.getSelectedItem());
        memory.save();
        dispose();
        if (UIScale.setZoomFactor(zoom)) {
            FlatLaf.updateUI();
        }
    }
}
