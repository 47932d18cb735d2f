package lyate.stock;

/**
 * A pKa somebody published.
 *
 * @param pKa    value
 * @param sigma  standard uncertainty, pKa units
 * @param source citation
 */
public record KnownPKa(double pKa, double sigma, String source) {}
