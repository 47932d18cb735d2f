package lyate.site;

import java.util.List;

/**
 * An atom that can lose or gain a proton. Equivalent atoms are one site.
 *
 * @param role       whether its proton leaves or arrives
 * @param atom       index of the atom that stands for the site: the lowest of its equivalents
 * @param equivalent indices of all equivalent atoms, ascending, the site's own included
 * @param hydrogens  hydrogens on all of them together; for a base the number of places a proton can go
 * @param siteClass  the row that matched last
 */
public record ProtonSite(Role role, int atom, List<Integer> equivalent, int hydrogens, SiteClass siteClass) {

    public ProtonSite {
        equivalent = List.copyOf(equivalent);
    }
}
