package lyate.flask;

/**
 * A base whose protonated form takes no further part: a hydride whose hydrogen leaves, an alkyllithium that becomes an
 * alkane, an amide whose ammonia leaves.
 *
 * @param name               the name users see
 * @param protons            protons it can take, in the unit of the flask's amounts
 * @param pKaOfConjugateAcid its strength: a donor that is not more acidic is left alone
 */
public record IrreversibleBase(String name, double protons, double pKaOfConjugateAcid) {

    public IrreversibleBase {
        if (!(protons >= 0) || Double.isInfinite(protons)) {
            throw new IllegalArgumentException(name + ": takes " + protons + " protons, expected a number not below 0");
        }
        if (Double.isNaN(pKaOfConjugateAcid)) {
            throw new IllegalArgumentException(name + ": pKa of the conjugate acid is missing");
        }
    }

    /** The same base in another amount. */
    public IrreversibleBase withProtons(double other) {
        return new IrreversibleBase(name, other, pKaOfConjugateAcid);
    }
}
