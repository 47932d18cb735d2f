package lyate.window;

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
record Rung(Kind kind, String name, double pKa, double sigma, String text, Optional<SiteTag> site,
            Optional<Base> base, String note) {

    enum Kind { SITE, BASE, COMPARED, SOLVENT, WATER, PARTNER }

    /** The value without its uncertainty. */
    String brief() {
        return text.replaceFirst(".\u00b1.[0-9.]+", "");
    }

    boolean left() {
        return kind == Kind.SITE;
    }

    boolean intended() {
        return site.map(SiteTag::intended).orElse(false);
    }

    /** Name of its colour in the palette. */
    String accent() {
        return switch (kind) {
            case SITE -> intended() ? "intended" : "site";
            case BASE, COMPARED -> "base";
            case SOLVENT, WATER, PARTNER -> "solvent";
        };
    }

    /** Labels that go first when there is not room for all. */
    int importance() {
        return intended() || kind == Kind.BASE ? 0 : kind == Kind.SITE ? 2 : 1;
    }
}
