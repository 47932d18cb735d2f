package lyate.review;

import java.util.Map;

/**
 * Where the protons are at equilibrium, at the amounts of the step.
 *
 * @param percentTaken share of the substrate molecules whose site has lost a proton, by site label
 * @param percentOfPartnerTaken share of the partner's most acidic site that has lost its proton
 * @param percentOfBaseSpentOnWater share of the base that moisture uses up
 */
record ProtonShares(Map<String, Double> percentTaken, double percentOfPartnerTaken, double percentOfBaseSpentOnWater) {

    ProtonShares {
        percentTaken = Map.copyOf(percentTaken);
    }

    double percentTaken(Donor donor) {
        return percentTaken.get(donor.label());
    }
}
