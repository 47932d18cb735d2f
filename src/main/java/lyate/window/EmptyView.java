package lyate.window;

import java.awt.Font;
import java.awt.GridBagConstraints;
import java.awt.GridBagLayout;
import java.awt.Insets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.Consumer;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.UIManager;

/** What stands in place of the pictures while there is no substrate. */
final class EmptyView extends JPanel {

    private static final List<String> EXAMPLES = List.of("ethyl acetoacetate", "4-hydroxyacetanilide", "O=C(C1CCC1)Nc1ccc(C)c(O)c1");

    private final Theme theme;
    private final JLabel title = new JLabel();
    private final JLabel hint = new JLabel();
    private final List<JButton> examples = new ArrayList<>();

    EmptyView(Theme theme, Consumer<String> onExample) {
        super(new GridBagLayout());
        this.theme = theme;
        int gap = theme.space("gap");
        GridBagConstraints below = new GridBagConstraints(0, GridBagConstraints.RELATIVE, 1, 1, 0, 0, GridBagConstraints.CENTER,
                GridBagConstraints.NONE, new Insets(gap / 2, 0, gap / 2, 0), 0, 0);
        add(title, below);
        add(hint, below);
        for (String example : EXAMPLES) {
            JButton button = new JButton(example);
            button.addActionListener(event -> onExample.accept(example));
            examples.add(button);
            add(button, below);
        }
        ask(Map.of(), true);
        dress();
        theme.onChange(this::dress);
    }

    /**
     * Says what is missing.
     *
     * @param problems what is wrong with the step, by field
     * @param blank    whether there is no substrate at all
     */
    void ask(Map<StepField, String> problems, boolean blank) {
        boolean chooses = Set.of(StepField.BASE, StepField.SOLVENT).containsAll(problems.keySet());
        title.setText(blank ? "Type, paste or drop a structure above"
                : chooses ? "Now " + String.join(", ", new TreeMap<>(problems).values()) : "This step cannot be read yet");
        hint.setText(blank ? "SMILES, InChI, a systematic name, or a .mol, .sdf, .smi or .rxn file. For example:"
                : chooses ? "Any usual name, abbreviation or formula will do." : "Below the field stands what is wrong.");
        examples.forEach(button -> button.setVisible(blank));
    }

    private void dress() {
        title.setFont(UIManager.getFont("Label.font").deriveFont(Font.BOLD, UIManager.getFont("Label.font").getSize2D() * 1.4f));
        hint.setForeground(theme.color("ink.soft"));
    }
}
