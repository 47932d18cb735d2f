package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;

/**
 * A stereocentre of stated configuration whose C-H the base reaches, so that the configuration is at risk.
 *
 * <p>Only sites of the families {@code ch-acid} and {@code ch-acid-stabilised} count: their anions are flat. The carbanion of
 * a site of family {@code hydrocarbon} is localised and keeps its configuration in the cold (Beak, Basu, Gallagher, Park &amp;
 * Thayumanavan, Acc. Chem. Res. 1996, 29, 552; from memory).
 *
 * @param atom   index of the stereocentre
 * @param logK   log10 K of its proton transfer
 * @param extent how much of the anion there is
 */
public record Epimerisation(int atom, double logK, Extent extent) {

    /** How far the stereocentre is deprotonated. */
    public enum Extent {
        /** The anion is made in full: quenching it sets the configuration anew. */
        FULL,
        /** A little of the anion comes and goes: the configuration is lost with time. */
        PARTIAL
    }

    /** log10 K from which the anion is made in full. */
    static final double FULL_FROM = VerdictRule.COMPLETE;

    /**
     * log10 K from which exchange epimerises within hours. Quinuclidine takes a proton from ethyl acetate at 2.4 × 10^−5 per
     * second and mole per litre at log K −14 (Amyes &amp; Richard, J. Am. Chem. Soc. 1996, 118, 3129; from memory), so that at
     * log K −12 a C-H as open as that one is gone in minutes, and a crowded stereocentre in hours.
     */
    static final double PARTIAL_FROM = -12;

    private static final int CARBON = 6;

    /**
     * The stated stereocentres at risk, the most acidic first; ties in the order of the atoms.
     *
     * @param logKBySite log10 K of every proton transfer from the molecule; sites of base role are passed over
     */
    public static List<Epimerisation> of(Molecule molecule, Map<ProtonSite, Double> logKBySite) {
        List<Integer> centres = molecule.stereocentres();
        List<Epimerisation> found = new ArrayList<>();
        logKBySite.forEach((site, logK) -> {
            if (site.role() == Role.ACID && logK >= PARTIAL_FROM && site.siteClass().family().startsWith("ch-acid")) {
                Extent extent = logK >= FULL_FROM ? Extent.FULL : Extent.PARTIAL;
                site.equivalent().stream()
                        .filter(atom -> centres.contains(atom) && molecule.atomicNumber(atom) == CARBON && molecule.hydrogens(atom) > 0)
                        .forEach(atom -> found.add(new Epimerisation(atom, logK, extent)));
            }
        });
        found.sort(Comparator.comparingDouble(Epimerisation::logK).reversed().thenComparingInt(Epimerisation::atom));
        return found;
    }
}
