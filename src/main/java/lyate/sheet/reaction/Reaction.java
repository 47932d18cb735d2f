package lyate.sheet.reaction;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.review.SiteOrigin;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.Solvent;

/**
 * What a reaction says of a step.
 *
 * @param substrate the reactant that loses the proton, or takes it up; its atoms are numbered from its own first one
 * @param reactant  1-based place of the substrate on the left side
 * @param base      the base, if one on the shelf is drawn
 * @param solvent   the solvent, if one on the shelf is drawn
 * @param acid      an acid on the shelf that is drawn
 * @param partner   the molecule the substrate is joined to, if any
 * @param origin    the site and how sure it is
 */
public record Reaction(Molecule substrate, int reactant, Optional<Base> base, Optional<Solvent> solvent, Optional<Acid> acid,
                       Optional<Molecule> partner, SiteOrigin origin) {

    /** Label of the atom that loses its proton; empty where the reaction does not tell, or where one arrives instead. */
    public Optional<String> site() {
        return origin.site().filter(label -> !origin.arrives());
    }
}
