package lyate.review;

import java.util.List;

/** Puts the donors of a step into the rows that users see. */
final class Transfers {

    private final ProtonShares shares;

    Transfers(ProtonShares shares) {
        this.shares = shares;
    }

    List<Transfer> of(List<Donor> donors) {
        return donors.stream().map(this::transfer).toList();
    }

    private Transfer transfer(Donor donor) {
        Comparison comparison = donor.comparison();
        return new Transfer(donor.label(), donor.site().equivalent(), comparison.donor(), donor.logK(), donor.sigmaLogK(),
                donor.transfer().deltaGKiloJoule(), shares.percentTaken(donor), comparison.reason());
    }
}
