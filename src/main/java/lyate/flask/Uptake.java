package lyate.flask;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Taking up protons {@code few} + 1 to {@code many} of one species.
 *
 * @param species index in the list of species
 * @param few     protons held before
 * @param many    protons held after; more than one further where they help one another in
 * @param level   proton level at which both weigh the same
 */
record Uptake(int species, int few, int many, double level) {

    /** Every uptake of the species, strongest base first. */
    static List<Uptake> strongestFirst(List<Species> species) {
        List<Uptake> uptakes = new ArrayList<>();
        for (int index = 0; index < species.size(); index++) {
            BindingPolynomial polynomial = species.get(index).polynomial();
            int few = 0;
            while (few < polynomial.capacity()) {
                int many = nextCorner(polynomial, few);
                uptakes.add(new Uptake(index, few, many, polynomial.levelBetween(few, many)));
                few = many;
            }
        }
        uptakes.sort(Comparator.comparingDouble(uptake -> -uptake.level()));
        return uptakes;
    }

    /** Protons taken up at once. */
    int protons() {
        return many - few;
    }

    private static int nextCorner(BindingPolynomial polynomial, int few) {
        int best = few + 1;
        for (int many = few + 2; many <= polynomial.capacity(); many++) {
            if (polynomial.levelBetween(few, many) >= polynomial.levelBetween(few, best)) {
                best = many;
            }
        }
        return best;
    }
}
