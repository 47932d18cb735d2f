package lyate.window;

import java.awt.BorderLayout;
import java.awt.Font;
import java.util.Comparator;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.UIManager;
import lyate.report.Words;
import lyate.review.Review;
import lyate.review.Verdict;

/** The verdict: shape, words, probability, what it means here, and what would change it. */
final class VerdictHeader extends JPanel {

    /** Other outcomes less likely than this are not worth a word. */
    private static final double WORTH_A_WORD = 0.05;

    VerdictHeader(Review review, Palette palette) {
        super(new BorderLayout(palette.space("wide"), palette.space("small")));
        int gap = palette.space("wide");
        setBackground(palette.ground(VerdictIcon.accent(review.verdict())));
        setBorder(BorderFactory.createEmptyBorder(gap, gap, gap, gap));
        Font plain = UIManager.getFont("Label.font");
        JLabel icon = new JLabel(new VerdictIcon(review.verdict(), palette, (int) (plain.getSize2D() * 2.4)));
        icon.setVerticalAlignment(JLabel.TOP);
        add(icon, BorderLayout.WEST);

        JPanel words = new JPanel(new StackLayout(palette.space("small")));
        words.setOpaque(false);
        words.add(title(review, palette, plain));
        WrappedText meaning = new WrappedText(Words.sentence(review.meaning()) + ".");
        meaning.setForeground(palette.color("ink"));
        words.add(meaning);
        WrappedText facts = new WrappedText(facts(review));
        facts.setForeground(palette.color("ink"));
        words.add(facts);
        String others = others(review);
        if (!others.isEmpty()) {
            WrappedText rest = new WrappedText(others);
            rest.setForeground(palette.color("ink.soft"));
            words.add(rest);
        }
        add(words);
    }

    private static JPanel title(Review review, Palette palette, Font plain) {
        JLabel name = new JLabel(Words.verdict(review.verdict()));
        name.setFont(plain.deriveFont(Font.BOLD, plain.getSize2D() * 1.5f));
        name.setForeground(palette.color(VerdictIcon.accent(review.verdict())));
        JLabel probability = new JLabel(probability(review));
        probability.setFont(plain.deriveFont(Font.BOLD));
        probability.setForeground(palette.color("ink"));
        JPanel line = new JPanel(new StackLayout(0));
        line.setOpaque(false);
        line.add(name);
        line.add(probability);
        line.getAccessibleContext().setAccessibleName("Verdict: " + name.getText() + ", " + probability.getText());
        return line;
    }

    private static String probability(Review review) {
        if (review.verdict() == Verdict.UNDECIDED) {
            return "no verdict is likely enough";
        }
        return "probability " + Words.probability(review.probability());
    }

    private static String facts(Review review) {
        String first = review.firstSite().equals(review.intendedSite()) ? "The proton at " + review.intendedSite() + " goes first"
                : "Meant: " + review.intendedSite() + ". First to go: " + review.firstSite();
        String base = review.baseDestroyed() ? review.step().base().name() + ", were any left" : review.workingBase();
        return first + ". log K at " + review.intendedSite() + " " + Words.signed(review.logK()) + " with " + base + "; "
                + (review.sideReactionWins() ? "the side reaction left aside, " : "") + "taken there " + Words.percent(review.intendedPercent())
                + ", the most at another site " + Words.percent(review.otherPercent()) + ".";
    }

    private static String others(Review review) {
        String text = review.probabilities().entrySet().stream()
                .filter(entry -> entry.getKey() != review.verdict() && entry.getValue() >= WORTH_A_WORD)
                .sorted(Map.Entry.<Verdict, Double>comparingByValue(Comparator.reverseOrder()))
                .map(entry -> Words.verdict(entry.getKey()).toLowerCase(Locale.ROOT) + " " + Words.probability(entry.getValue()))
                .collect(Collectors.joining(", "));
        return text.isEmpty() ? "" : (review.verdict() == Verdict.UNDECIDED ? "Possible: " : "Otherwise: ") + text + ".";
    }
}
