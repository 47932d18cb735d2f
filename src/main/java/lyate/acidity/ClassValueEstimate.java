package lyate.acidity;

import java.util.List;
import java.util.Optional;
import lyate.acidity.Acidity.Basis;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.SiteClass.ClassValue;
import lyate.stock.Medium;

/** The plainest estimate: every site has the value of its class. */
public final class ClassValueEstimate implements SiteEstimate {

    @Override
    public Optional<Acidity> estimate(Molecule molecule, ProtonSite site, Medium medium) {
        return valueIn(site, medium).map(value -> new Acidity(value.pKa(), value.sigma(), medium, Basis.ESTIMATED,
                List.of(new Contribution("class value: " + site.siteClass().name(), Effect.ATOM, value.pKa(), List.of(site.atom()))),
                List.of(), List.of(), value.source()));
    }

    private static Optional<ClassValue> valueIn(ProtonSite site, Medium medium) {
        if (medium.equals(Medium.WATER)) {
            return site.siteClass().water();
        }
        return medium.equals(Medium.DMSO) ? site.siteClass().dmso() : Optional.empty();
    }
}
