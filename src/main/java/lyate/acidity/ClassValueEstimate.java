package lyate.acidity;

import java.util.List;
import java.util.Optional;
import lyate.acidity.Acidity.Basis;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.SiteClass;
import lyate.site.SiteClass.ClassValue;
import lyate.stock.Medium;

/** The plainest estimate: every site has the value of its class. */
public final class ClassValueEstimate implements SiteEstimate {

    @Override
    public Optional<Acidity> estimate(Molecule molecule, ProtonSite site, Medium medium) {
        return valueIn(site.siteClass(), medium).map(value -> new Acidity(value.pKa(), value.sigma(), medium, Basis.ESTIMATED,
                List.of(new Contribution("class value: " + site.siteClass().name(), Effect.ATOM, value.pKa(), List.of(site.atom()))),
                List.of(), List.of(), value.source()));
    }

    /** The value of the class in a medium; only water and DMSO have any. */
    static Optional<ClassValue> valueIn(SiteClass siteClass, Medium medium) {
        if (medium.equals(Medium.WATER)) {
            return siteClass.water();
        }
        return medium.equals(Medium.DMSO) ? siteClass.dmso() : Optional.empty();
    }
}
