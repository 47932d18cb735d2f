package lyate.site;

import java.util.Locale;

/** What the proton of a site does. */
public enum Role {
    /** This proton leaves. */
    ACID,
    /** A proton arrives here; the pKa is that of the conjugate acid so made. */
    BASE;

    /** The word used in tables and output. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
