package lyate.acidity.lfer;

/**
 * A site the fit has seen, with the weight its residual got.
 *
 * @param smiles   its molecule
 * @param label    label of the site
 * @param site     its description
 * @param weight   pKa units per unit of {@link Pool#residual}
 * @param misfit   how far the value is from what the fit makes of it without it, pKa units, 0 or more
 * @param measured row of {@code measured-acidities.csv} that states its value; empty where there is none
 */
public record Anchor(String smiles, String label, SiteDescription site, double weight, double misfit, String measured) {}
