package lyate.review;

import java.util.Locale;

/** What becomes of the intended proton. */
public enum Verdict {
    SELECTIVE("the intended proton is taken, and no other without need"),
    PARTIAL("a real equilibrium at the intended site: fine for catalysis, not for making the anion in full"),
    TOO_WEAK("the base does not reach the intended proton, and nothing else takes the base"),
    WRONG_SITE("a more acidic proton of the substrate takes the base first"),
    LEVELLED("the solvent or its water takes the base first"),
    INCOMPATIBLE("the proton transfer could work, but a side reaction wins"),
    UNDECIDED("the uncertainty does not allow a verdict");

    private final String meaning;

    Verdict(String meaning) {
        this.meaning = meaning;
    }

    /** Stable code for CSV and JSON, for example {@code too-weak}. */
    public String code() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** What it means, in words. */
    public String meaning() {
        return meaning;
    }
}
