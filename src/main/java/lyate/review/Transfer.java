package lyate.review;

import java.util.List;
import lyate.acidity.Acidity;

/**
 * One donor against the base that is really in the flask.
 *
 * @param donor        name users see: a site label such as {@code C3}, {@code solvent}, {@code water}, or a partner's site
 * @param atoms        substrate atoms of the site (indices); empty for other donors
 * @param acidity      pKa of the donor on the scale that decides
 * @param logK         log10 of K = 10^(pKa of the base's conjugate acid − pKa of the donor)
 * @param sigmaLogK    its standard uncertainty
 * @param deltaG       kJ/mol at the temperature of the step
 * @param percentTaken share of this donor's protons gone at equilibrium, at the amounts given
 * @param decidedBy    which scale and why, one sentence
 */
public record Transfer(String donor, List<Integer> atoms, Acidity acidity, double logK, double sigmaLogK,
                       double deltaG, double percentTaken, String decidedBy) {

    public Transfer {
        atoms = List.copyOf(atoms);
    }

    /** The equilibrium constant. */
    public double equilibriumConstant() {
        return Math.pow(10, logK);
    }
}
