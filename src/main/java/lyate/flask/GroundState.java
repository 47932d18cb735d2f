package lyate.flask;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Where the protons would sit if every transfer ran to its end: the strongest bases are filled first. The solver counts
 * what moves from there, which keeps the tiny fractions left by a one-sided transfer exact: they are never the
 * difference of two large numbers.
 *
 * @param held   protons on each cluster of the species list, a whole number
 * @param excess protons present beyond those held; negative where some are missing
 * @param guess  a proton level close to the answer; infinite where the flask holds no proton, or no room for one
 */
record GroundState(int[] held, double excess, double guess) {

    /** Taking up protons {@code few} + 1 to {@code many} of one species. */
    private record Uptake(int species, int few, int many, double level, DoubleDouble protons) {}

    static GroundState of(List<Species> species, DoubleDouble protons) {
        List<Uptake> uptakes = strongestFirst(species);
        int[] held = new int[species.size()];
        DoubleDouble left = protons;
        for (int index = 0; index < uptakes.size(); index++) {
            Uptake uptake = uptakes.get(index);
            if (left.isZero()) {
                return new GroundState(held, 0, index == 0 ? Double.POSITIVE_INFINITY
                        : between(uptakes.get(index - 1), uptake));
            }
            DoubleDouble missing = left.minus(uptake.protons());
            if (missing.value() < 0) {
                return partly(uptakes, index, held, left.value(), -missing.value());
            }
            held[uptake.species()] = uptake.many();
            left = missing;
        }
        return new GroundState(held, 0, Double.NEGATIVE_INFINITY);
    }

    /** The protons run out within one uptake. */
    private static GroundState partly(List<Uptake> uptakes, int index, int[] held, double taken, double room) {
        Uptake uptake = uptakes.get(index);
        double guess = uptake.level() + Math.log10(room / taken) / (uptake.many() - uptake.few());
        if (index > 0) {
            guess = Math.min(guess, Math.max(uptake.level(), between(uptakes.get(index - 1), uptake)));
        }
        if (index + 1 < uptakes.size()) {
            guess = Math.max(guess, Math.min(uptake.level(), between(uptake, uptakes.get(index + 1))));
        }
        boolean mostlyRoom = taken <= room;
        held[uptake.species()] = mostlyRoom ? uptake.few() : uptake.many();
        return new GroundState(held, mostlyRoom ? taken : -room, guess);
    }

    private static double between(Uptake stronger, Uptake weaker) {
        return (stronger.level() + weaker.level()
                + Math.log10(weaker.protons().value() / stronger.protons().value())) / 2;
    }

    private static List<Uptake> strongestFirst(List<Species> species) {
        List<Uptake> uptakes = new ArrayList<>();
        for (int index = 0; index < species.size(); index++) {
            BindingPolynomial polynomial = species.get(index).polynomial();
            int few = 0;
            while (few < polynomial.capacity()) {
                int many = nextCorner(polynomial, few);
                uptakes.add(new Uptake(index, few, many, polynomial.levelBetween(few, many),
                        DoubleDouble.product(species.get(index).amount(), many - few)));
                few = many;
            }
        }
        uptakes.sort(Comparator.comparingDouble(uptake -> -uptake.level()));
        return uptakes;
    }

    /** The number of protons taken up next as the level falls; more than one at once where they help one another. */
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
