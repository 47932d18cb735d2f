package lyate.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What a drawn reaction says of the proton that is meant.
 *
 * @param site         label of the atom that loses its proton, or takes one up; empty where the reaction does not tell
 * @param arrives      whether the proton arrives there
 * @param basis        how it was found, in a few words
 * @param doubts       why it may be another; empty where it is sure
 * @param alternatives labels of the other atoms it may be
 * @param remarks      what else is odd about the reaction, in sentences
 */
public record SiteOrigin(Optional<String> site, boolean arrives, String basis, List<String> doubts, List<String> alternatives,
                         List<String> remarks) {

    public SiteOrigin {
        doubts = List.copyOf(doubts);
        alternatives = List.copyOf(alternatives);
        remarks = List.copyOf(remarks);
    }

    /** Whether the reaction leaves no doubt. */
    public boolean sure() {
        return site.isPresent() && doubts.isEmpty();
    }

    /** How sure it is, for people: {@code sure: mapped}. */
    public String confidence() {
        return sure() ? "sure: " + basis : "unsure: " + String.join(", ", doubts.isEmpty() ? List.of(basis) : doubts);
    }

    /** The same with one more remark. */
    public SiteOrigin withRemark(String remark) {
        List<String> more = new ArrayList<>(remarks);
        more.add(remark);
        return new SiteOrigin(site, arrives, basis, doubts, alternatives, more);
    }
}
