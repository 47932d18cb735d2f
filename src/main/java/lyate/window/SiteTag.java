package lyate.window;

import lyate.report.Words;
import lyate.review.Transfer;

/**
 * A proton site of the substrate as the window names it.
 *
 * @param letter   A for the most acidic site, then B, C, ...
 * @param transfer its proton against the base
 * @param intended whether it is the site that is meant
 */
record SiteTag(String letter, Transfer transfer, boolean intended) {

    /** Site label, for example {@code N7}. */
    String label() {
        return transfer.donor();
    }

    /** Index of the atom that stands for the site. */
    int atom() {
        return transfer.atoms().get(0);
    }

    /** Share of its protons taken, 0 to 1. */
    double fraction() {
        return Math.max(0, Math.min(1, transfer.percentTaken() / 100));
    }

    /** For example {@code 9.9 ± 0.4}. */
    String value() {
        return Words.withSigma(transfer.acidity());
    }

    /** One line that says everything, for tooltips and screen readers. */
    String sentence() {
        return "Site " + letter + ", " + label() + ", pKa " + value() + " in " + Words.medium(transfer.acidity().medium())
                + " (" + transfer.acidity().basis().word() + "), " + Words.percent(transfer.percentTaken()) + " taken"
                + (intended ? ", intended site" : "");
    }
}
