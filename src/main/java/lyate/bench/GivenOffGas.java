package lyate.bench;

import lyate.flask.TransferThermodynamics;

/**
 * Gas a base gives off as it is protonated.
 *
 * @param name              for example {@code hydrogen}
 * @param milliMoleInStep   while the step runs
 * @param milliMoleAtQuench when what is left of the base is destroyed
 * @param celsius           temperature the volumes count for
 * @param kiloPascal        pressure the volumes count for
 */
public record GivenOffGas(String name, double milliMoleInStep, double milliMoleAtQuench, double celsius, double kiloPascal) {

    private static final double GAS_CONSTANT = TransferThermodynamics.GAS_CONSTANT;

    public GivenOffGas {
        if (!(celsius > -273.15) || !(kiloPascal > 0)) {
            throw new IllegalArgumentException("gas at " + celsius + " degrees C and " + kiloPascal
                    + " kPa, expected a temperature above absolute zero and a pressure above 0");
        }
    }

    /** Litres set free while the step runs, as an ideal gas. */
    public double litresInStep() {
        return litres(milliMoleInStep);
    }

    /** Litres set free at the quench, as an ideal gas. */
    public double litresAtQuench() {
        return litres(milliMoleAtQuench);
    }

    private double litres(double milliMole) {
        return milliMole / 1000 * GAS_CONSTANT * (celsius + 273.15) / kiloPascal;
    }
}
