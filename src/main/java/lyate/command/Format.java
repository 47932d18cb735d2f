package lyate.command;

import java.util.Locale;

/** How results are written. */
enum Format {
    TEXT, CSV, JSON;

    /** As it is typed. */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
