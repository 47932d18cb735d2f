package lyate.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.review.Review;
import lyate.review.Transfer;

/**
 * The sites of a review's substrate with their letters; drawing, ladder and tables all use the same ones.
 *
 * @param sites most acidic first
 */
record SiteTags(List<SiteTag> sites) {

    private static final int ALPHABET = 26;

    SiteTags {
        sites = List.copyOf(sites);
    }

    static SiteTags of(Review review) {
        List<SiteTag> sites = new ArrayList<>();
        for (Transfer transfer : review.transfers()) {
            if (!transfer.atoms().isEmpty()) {
                sites.add(new SiteTag(letter(sites.size()), transfer, transfer.donor().equals(review.intendedSite())));
            }
        }
        return new SiteTags(sites);
    }

    Optional<SiteTag> labelled(String label) {
        return sites.stream().filter(site -> site.label().equals(label)).findFirst();
    }

    /** The letter of a donor, empty for one that is not a site of the substrate. */
    String letterOf(Transfer transfer) {
        return sites.stream().filter(site -> site.transfer().equals(transfer)).map(SiteTag::letter).findFirst().orElse("");
    }

    /** A to Z, then AA, AB, ... */
    static String letter(int index) {
        String last = String.valueOf((char) ('A' + index % ALPHABET));
        return index < ALPHABET ? last : letter(index / ALPHABET - 1) + last;
    }
}
