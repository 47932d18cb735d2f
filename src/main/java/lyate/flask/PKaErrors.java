package lyate.flask;

import java.util.List;
import java.util.stream.DoubleStream;

/**
 * How wrong a set of pKa values may be together: an error of its own for each, and errors that several share because
 * one transfer or one correlation made them.
 *
 * @param own    standard uncertainty of each pKa that it shares with no other
 * @param shared errors felt by several
 */
public record PKaErrors(List<Double> own, List<Shared> shared) {

    /**
     * One error felt by several pKa values.
     *
     * @param loadings by how many pKa units each value moves where this error is one standard deviation; 0 for a value
     *                 it does not touch
     */
    public record Shared(List<Double> loadings) {

        public Shared {
            loadings = List.copyOf(loadings);
        }

        private double size() {
            return loadings.stream().mapToDouble(Math::abs).max().orElse(0);
        }
    }

    public PKaErrors {
        own = List.copyOf(own);
        shared = List.copyOf(shared);
        for (double sigma : own) {
            if (!(sigma >= 0)) {
                throw new IllegalArgumentException("standard uncertainty " + sigma + ", expected a number not below 0");
            }
        }
        for (Shared error : shared) {
            if (error.loadings().size() != own.size()) {
                throw new IllegalArgumentException("a shared error with " + error.loadings().size()
                        + " loadings, expected one for each of the " + own.size() + " pKa values");
            }
        }
    }

    /** Independent errors only. */
    public static PKaErrors independent(double... sigmas) {
        return new PKaErrors(DoubleStream.of(sigmas).boxed().toList(), List.of());
    }

    /** The largest shift each source of error makes at one standard deviation: shared ones first, then own. */
    double[] sizes() {
        return DoubleStream.concat(shared.stream().mapToDouble(Shared::size), own.stream().mapToDouble(sigma -> sigma))
                .toArray();
    }

    /** The shift of every pKa, given each source's error in standard deviations, in the order of {@link #sizes()}. */
    double[] shifts(double[] deviations) {
        double[] shifts = new double[own.size()];
        for (int value = 0; value < shifts.length; value++) {
            shifts[value] = own.get(value) * deviations[shared.size() + value];
            for (int source = 0; source < shared.size(); source++) {
                shifts[value] += shared.get(source).loadings().get(value) * deviations[source];
            }
        }
        return shifts;
    }
}
