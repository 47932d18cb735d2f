package lyate.acidity;

/**
 * Enthalpy of giving up a proton in water at 25 degrees C.
 *
 * @param kiloJoulePerMole value
 * @param sigma            spread among the members of its kind, kJ/mol
 * @param source           citation
 */
public record IonisationEnthalpy(double kiloJoulePerMole, double sigma, String source) {}
