package lyate.report;

import java.util.ArrayList;
import java.util.List;
import lyate.review.Review;
import lyate.review.Transfer;

/**
 * A proton site of the substrate under the letter that drawing, ladder, curve and table share.
 *
 * @param letter   A for the first to go, then B, C, ...; after Z come AA, AB, ...
 * @param transfer its proton against the base
 * @param intended whether it is the site that is meant
 */
public record LetteredSite(String letter, Transfer transfer, boolean intended) {

    private static final int ALPHABET = 26;
    /** A site this far beyond the base, log10 units, is not worth many words. */
    private static final double OUT_OF_REACH = -5;

    /** The sites of the substrate, the first to go first. */
    public static List<LetteredSite> of(Review review) {
        List<LetteredSite> sites = new ArrayList<>();
        for (Transfer transfer : review.transfers()) {
            if (!transfer.atoms().isEmpty()) {
                sites.add(new LetteredSite(letter(sites.size()), transfer, transfer.donor().equals(review.intendedSite())));
            }
        }
        return sites;
    }

    private static String letter(int index) {
        String last = String.valueOf((char) ('A' + index % ALPHABET));
        return index < ALPHABET ? last : letter(index / ALPHABET - 1) + last;
    }

    /** Whether it matters here: meant, or within reach of the base. */
    public boolean counts() {
        return intended || transfer.logK() > OUT_OF_REACH;
    }

    /** Share of its protons taken, 0 to 1. */
    public double fraction() {
        return Math.max(0, Math.min(1, transfer.percentTaken() / 100));
    }

    String ink() {
        return intended ? Ink.INTENDED : counts() ? Ink.SITE : Ink.SOFT;
    }

    /** Label of its atom, for example {@code N7}. */
    public String label() {
        return transfer.donor();
    }

    /** Index of the atom that stands for it. */
    public int atom() {
        return transfer.atoms().get(0);
    }

    /** Its pKa as written. */
    public String value() {
        return Words.withSigma(transfer.acidity());
    }

    /** All there is to say in one line, for those who do not see the picture. */
    public String sentence() {
        return letter + ": " + label() + (intended ? " (intended)" : "") + ", pKa " + value() + " in " + Words.medium(transfer.acidity().medium())
                + " (" + transfer.acidity().basis().word() + "), " + Words.percent(transfer.percentTaken()) + " taken";
    }
}
