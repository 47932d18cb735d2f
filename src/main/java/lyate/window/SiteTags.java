package lyate.window;

import java.util.List;
import java.util.Optional;
import lyate.report.LetteredSite;
import lyate.review.Review;
import lyate.review.Transfer;

/**
 * The sites of a review's substrate with their letters; drawing, ladder and tables all use the same ones.
 *
 * @param sites the first to go first
 */
record SiteTags(List<LetteredSite> sites) {

    SiteTags {
        sites = List.copyOf(sites);
    }

    static SiteTags of(Review review) {
        return new SiteTags(LetteredSite.of(review));
    }

    Optional<LetteredSite> labelled(String label) {
        return sites.stream().filter(site -> site.label().equals(label)).findFirst();
    }

    /** The letter of a donor, empty for one that is not a site of the substrate. */
    String letterOf(Transfer transfer) {
        return sites.stream().filter(site -> site.transfer().equals(transfer)).map(LetteredSite::letter).findFirst().orElse("");
    }
}
