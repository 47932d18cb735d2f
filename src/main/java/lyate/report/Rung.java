package lyate.report;

import java.util.Optional;
import lyate.stock.Base;

/**
 * One entry of the acidity ladder.
 *
 * @param kind  what it is, which decides rail, shape and colour
 * @param name  name beside the mark
 * @param pKa   height on the axis
 * @param sigma standard uncertainty; half the length of the bar
 * @param text  value as written
 * @param site  the substrate's site, for a site
 * @param base  the stockroom's base, for a compared one
 * @param note  what to know about its place, for tooltips; may be empty
 */
public record Rung(Kind kind, String name, double pKa, double sigma, String text, Optional<LetteredSite> site,
            Optional<Base> base, String note) {

    /** What a rung is. */
    public enum Kind { SITE, BASE, COMPARED, SOLVENT, WATER, PARTNER }

    /** The value without its uncertainty. */
    public String brief() {
        return text.replaceFirst(".\u00b1.[0-9.]+", "");
    }

    /** Whether it stands on the left, with the sites of the substrate. */
    public boolean left() {
        return kind == Kind.SITE;
    }

    /** Whether it is the site that is meant. */
    public boolean intended() {
        return site.map(LetteredSite::intended).orElse(false);
    }

    /** Labels that go first when there is not room for all. */
    public int importance() {
        return intended() || kind == Kind.BASE ? 0 : kind == Kind.SITE ? 2 : 1;
    }
}
