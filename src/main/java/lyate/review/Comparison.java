package lyate.review;

import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.stock.KnownPKa;

/**
 * A donor set against a base on one scale.
 *
 * @param donor    pKa of the donor
 * @param acceptor pKa of the base's conjugate acid
 * @param reason   which scale decides and why, one sentence
 * @param other    the same pair on the scale that does not decide, where both have values there
 */
record Comparison(Acidity donor, KnownPKa acceptor, String reason, Optional<Comparison> other) {

    /** log10 K of the transfer at 25 degrees C. */
    double logK() {
        return acceptor.pKa() - donor.pKa();
    }

    /** Standard uncertainty of log K. */
    double sigmaLogK() {
        return Math.hypot(donor.sigma(), acceptor.sigma());
    }

    /** Whether the other scale says something else, beyond what both uncertainties allow. */
    boolean scalesDisagree() {
        return other.filter(there -> Math.abs(there.logK() - logK()) > 2 * Math.hypot(there.sigmaLogK(), sigmaLogK())).isPresent();
    }

    Comparison withOther(Optional<Comparison> onOtherScale) {
        return new Comparison(donor, acceptor, reason, onOtherScale);
    }
}
