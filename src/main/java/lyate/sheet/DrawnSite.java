package lyate.sheet;

import java.util.List;
import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.review.SiteOrigin;
import lyate.sheet.RowException.Problem;
import lyate.sheet.reaction.Reaction;
import lyate.stock.Base;

/** What the reaction of a row says of its site, set against what the other columns say. */
final class DrawnSite {

    private DrawnSite() {}

    /**
     * The site in the numbering of the row's substrate.
     *
     * @param substrate   null where it could not be read
     * @param protonation whether the row is to be read as one
     */
    static Optional<SiteOrigin> of(Optional<Reaction> reaction, Molecule substrate, boolean protonation, List<Problem> problems) {
        if (reaction.isEmpty() || substrate == null) {
            return Optional.empty();
        }
        Optional<Reaction> here = reaction.get().numberedAs(substrate);
        if (here.isEmpty()) {
            problems.add(new Problem(SheetColumn.REACTION, "its substrate is " + reaction.get().substrate().smiles() + ", the column substrate has "
                    + substrate.smiles()));
            return Optional.empty();
        }
        SiteOrigin origin = here.get().origin();
        if (origin.arrives() && !protonation) {
            problems.add(new Problem(SheetColumn.REACTION, "a proton arrives at " + origin.site().orElse("the substrate")
                    + here.get().acid().map(acid -> " (from " + acid.name() + ")").orElse("") + ": this is a protonation; 'lyate check --reaction' judges it"));
        }
        return Optional.of(origin);
    }

    /** The site with what the named base and electrophile do not share with those drawn. */
    static SiteOrigin compared(SiteOrigin origin, Reaction drawn, Base base, Optional<Molecule> partner) {
        SiteOrigin compared = origin;
        if (drawn.base().isPresent() && !drawn.base().get().id().equals(base.id())) {
            compared = compared.withRemark("the reaction shows " + drawn.base().get().name() + " as base, the row names " + base.name());
        }
        if (drawn.partner().isPresent() && partner.filter(named -> !named.sameConstitution(drawn.partner().get())).isPresent()) {
            compared = compared.withRemark("the reaction shows " + drawn.partner().get().smiles() + " as electrophile, the row names " + partner.get().smiles());
        }
        return compared;
    }
}
