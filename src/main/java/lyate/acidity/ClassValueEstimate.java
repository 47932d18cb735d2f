package lyate.acidity;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.acidity.Acidity.Alternative;
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
                List.of(new Contribution(words(site.siteClass()), Effect.ATOM, value.pKa(), List.of(site.atom()))),
                List.of(), List.of(), "spread of the class, " + site.siteClass().id(), List.of(), value.source()));
    }

    private static String words(SiteClass siteClass) {
        return "class value: " + siteClass.name();
    }

    /** A value beside that of its class in the same medium, where there is one and it is not named already. */
    static Acidity besideClassValue(Acidity acidity, SiteClass siteClass) {
        Optional<ClassValue> value = valueIn(siteClass, acidity.medium());
        String words = words(siteClass);
        boolean named = acidity.basis() == Basis.ESTIMATED && acidity.contributions().stream().anyMatch(term -> term.text().equals(words))
                || acidity.alternatives().stream().anyMatch(way -> way.text().equals(words));
        return value.isEmpty() || named ? acidity : acidity.beside(Stream.concat(acidity.alternatives().stream(),
                Stream.of(new Alternative(words, value.get().pKa(), value.get().sigma()))).toList());
    }

    /** The value of the class in a medium; only water and DMSO have any. */
    static Optional<ClassValue> valueIn(SiteClass siteClass, Medium medium) {
        if (medium.equals(Medium.WATER)) {
            return siteClass.water();
        }
        return medium.equals(Medium.DMSO) ? siteClass.dmso() : Optional.empty();
    }
}
