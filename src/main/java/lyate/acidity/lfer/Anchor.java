package lyate.acidity.lfer;

/**
 * A site the fit has seen, with the weight its residual got.
 *
 * @param smiles   its molecule
 * @param label    label of the site
 * @param site     its description
 * @param weight   pKa units per unit of {@link Pool#residual}
 * @param measured row of {@code measured-acidities.csv} that states its value; empty where there is none
 */
public record Anchor(String smiles, String label, SiteDescription site, double weight, String measured) {}
