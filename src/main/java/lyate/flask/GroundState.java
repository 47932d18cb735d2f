package lyate.flask;

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

    static GroundState of(List<Species> species, DoubleDouble protons) {
        List<Uptake> uptakes = Uptake.strongestFirst(species);
        int[] held = new int[species.size()];
        DoubleDouble left = protons;
        for (int index = 0; index < uptakes.size(); index++) {
            if (left.isZero()) {
                return new GroundState(held, 0, index == 0 ? Double.POSITIVE_INFINITY
                        : between(species, uptakes.get(index - 1), uptakes.get(index)));
            }
            Uptake uptake = uptakes.get(index);
            DoubleDouble missing = left.minus(DoubleDouble.product(species.get(uptake.species()).amount(), uptake.protons()));
            if (missing.value() < 0) {
                return partly(species, uptakes, index, held, left.value(), -missing.value());
            }
            held[uptake.species()] = uptake.many();
            left = missing;
        }
        return new GroundState(held, 0, Double.NEGATIVE_INFINITY);
    }

    /** The protons run out within one uptake. */
    private static GroundState partly(List<Species> species, List<Uptake> uptakes, int index, int[] held, double taken,
                                      double room) {
        Uptake uptake = uptakes.get(index);
        double guess = uptake.level() + Math.log10(room / taken) / uptake.protons();
        if (index > 0) {
            guess = Math.min(guess, Math.max(uptake.level(), between(species, uptakes.get(index - 1), uptake)));
        }
        if (index + 1 < uptakes.size()) {
            guess = Math.max(guess, Math.min(uptake.level(), between(species, uptake, uptakes.get(index + 1))));
        }
        boolean mostlyRoom = taken <= room;
        held[uptake.species()] = mostlyRoom ? uptake.few() : uptake.many();
        return new GroundState(held, mostlyRoom ? taken : -room, guess);
    }

    /** Level at which the full one has lost as many protons as the empty one has gained. */
    private static double between(List<Species> species, Uptake full, Uptake empty) {
        return (full.level() + empty.level() + Math.log10(
                species.get(empty.species()).amount() / species.get(full.species()).amount())) / 2;
    }
}
