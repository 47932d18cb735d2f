package lyate.review;

import lyate.acidity.Acidity;
import lyate.stock.KnownPKa;

/**
 * A donor set against a base on one scale.
 *
 * @param donor    pKa of the donor
 * @param acceptor pKa of the base's conjugate acid
 * @param reason   which scale decides and why, one sentence
 */
record Comparison(Acidity donor, KnownPKa acceptor, String reason) {

    /** log10 K of the transfer at 25 degrees C. */
    double logK() {
        return acceptor.pKa() - donor.pKa();
    }
}
