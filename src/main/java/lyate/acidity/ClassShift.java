package lyate.acidity;

import java.util.Locale;
import java.util.Optional;
import lyate.site.SiteClass;
import lyate.site.SiteClass.ClassValue;
import lyate.stock.Medium;

/**
 * Carries a value between water and DMSO by the distance between the two values of its class: narrower than the line of a
 * whole family, because the members of a class are solvated alike.
 */
final class ClassShift {

    /** Share of the class's spread that the shift does not share between the media (assumption). */
    private static final double UNSHARED = 0.35;
    /** Least error of a shift, pKa units: what the shift leaves on acids measured in both media. */
    private static final double LEAST_ERROR = 0.5;
    /** Uncertainty of the slope by which a deviation from the class value is carried (assumption). */
    private static final double SLOPE_ERROR = 0.3;

    private final MediaTransfer transfer;

    ClassShift(MediaTransfer transfer) {
        this.transfer = transfer;
    }

    /** The value in the other medium; empty unless the class has values in both. */
    Optional<Acidity> carry(Acidity value, SiteClass siteClass, Medium to) {
        Optional<ClassValue> here = ClassValueEstimate.valueIn(siteClass, value.medium());
        Optional<ClassValue> there = ClassValueEstimate.valueIn(siteClass, to);
        return value.medium().equals(to) || here.isEmpty() || there.isEmpty() ? Optional.empty()
                : Optional.of(carry(value, siteClass, here.get(), there.get(), to));
    }

    private Acidity carry(Acidity value, SiteClass siteClass, ClassValue here, ClassValue there, Medium to) {
        double slope = transfer.slope(value.medium(), to, siteClass.family()).orElse(1);
        double deviation = value.pKa() - here.pKa();
        double pKa = there.pKa() + slope * deviation;
        double shiftError = Math.max(LEAST_ERROR, UNSHARED * Math.max(here.sigma(), there.sigma()));
        double sigma = Math.hypot(Math.hypot(slope * value.sigma(), shiftError), SLOPE_ERROR * deviation);
        String text = String.format(Locale.ROOT, "class %s: %s %.1f, %s %.1f; deviation times %.2f", siteClass.id(),
                value.medium().id(), here.pKa(), to.id(), there.pKa(), slope);
        return Carried.of(value, pKa, sigma, to, text, value.missing());
    }
}
