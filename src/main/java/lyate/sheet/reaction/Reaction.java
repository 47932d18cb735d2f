package lyate.sheet.reaction;

import java.util.Optional;
import java.util.OptionalInt;
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

    /**
     * The same with the atoms of the substrate numbered as in another text for it; empty where that is another molecule.
     * Alternatives keep their meaning.
     */
    public Optional<Reaction> numberedAs(Molecule other) {
        if (other == substrate) {
            return Optional.of(this);
        }
        if (!other.sameConstitution(substrate)) {
            return Optional.empty();
        }
        SiteOrigin there = new SiteOrigin(origin.site().map(label -> label(label, other)), origin.arrives(), origin.basis(), origin.doubts(),
                origin.alternatives().stream().map(label -> label(label, other)).toList(), origin.remarks());
        return Optional.of(new Reaction(other, reactant, base, solvent, acid, partner, there));
    }

    /** Labels of atoms in other reactants stay as they are. */
    private String label(String label, Molecule other) {
        OptionalInt atom = substrate.atomLabelled(label);
        return atom.isEmpty() ? label : other.label(SiteInference.counterpart(substrate, atom.getAsInt(), other).orElseThrow());
    }
}
