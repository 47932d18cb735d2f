package lyate.flask;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

/**
 * A proton transfer HA + B → A + HB at temperatures other than 25 degrees C.
 *
 * @param logK               log10 of its equilibrium constant at the temperature
 * @param deltaGKiloJoule    ΔG = −RT ln K, kJ/mol
 * @param temperatureKelvin  temperature, K
 * @param assumption         how the value at 25 degrees C was carried over, one sentence for the user
 */
public record TransferThermodynamics(double logK, double deltaGKiloJoule, double temperatureKelvin, String assumption) {

    /** Molar gas constant, J/(mol K); exact since the 2019 SI (CODATA 2018). */
    public static final double GAS_CONSTANT = 8.31446261815324;

    private static final double COLDEST_KELVIN = 123.15;
    private static final double HOTTEST_KELVIN = 573.15;
    private static final double COLDEST_TRUSTED_KELVIN = 173.15;
    private static final double HOTTEST_TRUSTED_KELVIN = 423.15;
    private static final String ISOCOULOMBIC =
            "transfer taken as isocoulombic without entropy change: log K scales with 298.15 K / T";
    private static final String VANT_HOFF =
            "log K carried over by the van 't Hoff equation with a constant transfer enthalpy of %.1f kJ/mol";
    private static final String FAR = "; far from the 25 degrees C the values were measured at";

    /**
     * A donor or the conjugate acid of an acceptor.
     *
     * @param pKa                at 25 degrees C
     * @param ionisationEnthalpy kJ/mol at 25 degrees C in the same medium, where measured
     */
    public record Acid(double pKa, OptionalDouble ionisationEnthalpy) {

        /** An acid whose ionisation enthalpy is not known. */
        public static Acid of(double pKa) {
            return new Acid(pKa, OptionalDouble.empty());
        }

        /** An acid of known ionisation enthalpy, kJ/mol. */
        public static Acid of(double pKa, double ionisationEnthalpy) {
            return new Acid(pKa, OptionalDouble.of(ionisationEnthalpy));
        }
    }

    /**
     * The transfer at a temperature. Enthalpies are used where both partners have one, since only their difference
     * means anything; otherwise the transfer is taken as isocoulombic.
     *
     * @param temperatureKelvin −150 to +300 degrees C; beyond −100 to +150 the assumption says that it is far off
     */
    public static TransferThermodynamics of(Acid donor, Acid acceptor, double temperatureKelvin) {
        requireTemperature(temperatureKelvin);
        double logK298 = acceptor.pKa() - donor.pKa();
        if (donor.ionisationEnthalpy().isPresent() && acceptor.ionisationEnthalpy().isPresent()) {
            double enthalpy = donor.ionisationEnthalpy().getAsDouble() - acceptor.ionisationEnthalpy().getAsDouble();
            return at(logK298 - shift(enthalpy, temperatureKelvin), temperatureKelvin,
                    String.format(Locale.ROOT, VANT_HOFF, enthalpy));
        }
        return at(logK298 * Flask.ROOM_KELVIN / temperatureKelvin, temperatureKelvin, ISOCOULOMBIC);
    }

    /** ΔG = −RT ln K in kJ/mol. */
    public static double deltaGKiloJoule(double logK, double temperatureKelvin) {
        return -GAS_CONSTANT * temperatureKelvin * Math.log(10) * logK / 1000;
    }

    /**
     * pKa at another temperature by the van 't Hoff equation, its enthalpy taken as constant.
     *
     * @param ionisationEnthalpy kJ/mol
     */
    public static double pKaAt(double pKa298, double ionisationEnthalpy, double temperatureKelvin) {
        requireTemperature(temperatureKelvin);
        return pKa298 + shift(ionisationEnthalpy, temperatureKelvin);
    }

    /**
     * A flask whose pKa values were given for its present temperature, at another one: every pKa and coupling scales with
     * the ratio of the temperatures, which makes every transfer in it isocoulombic.
     */
    public static Flask isocoulombic(Flask flask, double temperatureKelvin) {
        requireTemperature(temperatureKelvin);
        double factor = flask.temperatureKelvin() / temperatureKelvin;
        List<ProtonHolder> holders = flask.holders().stream().map(holder -> new ProtonHolder(holder.name(), holder.amount(),
                holder.places().stream().map(place -> place.withPKa(place.pKa() * factor)).toList(),
                holder.couplings().stream().map(coupling ->
                        new Coupling(coupling.first(), coupling.second(), coupling.raise() * factor)).toList(),
                holder.protonsHeld())).toList();
        return new Flask(holders, temperatureKelvin, flask.medium());
    }

    private static TransferThermodynamics at(double logK, double temperatureKelvin, String assumption) {
        boolean far = temperatureKelvin < COLDEST_TRUSTED_KELVIN || temperatureKelvin > HOTTEST_TRUSTED_KELVIN;
        return new TransferThermodynamics(logK, deltaGKiloJoule(logK, temperatureKelvin), temperatureKelvin,
                far ? assumption + FAR : assumption);
    }

    private static double shift(double enthalpyKiloJoule, double temperatureKelvin) {
        return 1000 * enthalpyKiloJoule / (GAS_CONSTANT * Math.log(10)) * (1 / temperatureKelvin - 1 / Flask.ROOM_KELVIN);
    }

    private static void requireTemperature(double temperatureKelvin) {
        if (!(temperatureKelvin >= COLDEST_KELVIN && temperatureKelvin <= HOTTEST_KELVIN)) {
            throw new IllegalArgumentException("temperature " + temperatureKelvin + " K, expected " + COLDEST_KELVIN + " to "
                    + HOTTEST_KELVIN + " K (-150 to +300 degrees C)");
        }
    }
}
