package lyate.window;

import java.awt.Font;
import java.awt.GridBagConstraints;
import java.awt.GridBagLayout;
import java.awt.Insets;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.UIManager;

/** What stands in place of the pictures while there is no substrate. */
final class EmptyView extends JPanel {

    private static final List<String> EXAMPLES = List.of("ethyl acetoacetate", "4-hydroxyacetanilide", "O=C(C1CCC1)Nc1ccc(C)c(O)c1");

    private final Theme theme;
    private final JLabel title = new JLabel("Type, paste or drop a structure above");
    private final JLabel hint = new JLabel("SMILES, InChI, a systematic name, or a molfile. For example:");

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
            add(button, below);
        }
        dress();
        theme.onChange(this::dress);
    }

    private void dress() {
        title.setFont(UIManager.getFont("Label.font").deriveFont(Font.BOLD, UIManager.getFont("Label.font").getSize2D() * 1.4f));
        hint.setForeground(theme.color("ink.soft"));
    }
}
