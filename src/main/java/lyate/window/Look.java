package lyate.window;

import java.util.Locale;

/** What the user wants the window to look like. */
enum Look {
    SYSTEM("As the desktop"), LIGHT("Light"), DARK("Dark");

    private final String words;

    Look(String words) {
        this.words = words;
    }

    /** The look a stored word means; as the desktop, where it means none. */
    static Look of(String stored) {
        for (Look look : values()) {
            if (look.stored().equals(stored)) {
                return look;
            }
        }
        return SYSTEM;
    }

    String stored() {
        return name().toLowerCase(Locale.ROOT);
    }

    @Override
    public String toString() {
        return words;
    }
}
