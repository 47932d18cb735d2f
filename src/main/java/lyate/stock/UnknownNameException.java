package lyate.stock;

import java.util.List;

/** A name that is not in the stockroom, with the known names nearest to it. */
public final class UnknownNameException extends Exception {

    private static final long serialVersionUID = 1L;

    public UnknownNameException(String what, String name, List<String> nearest) {
        super("no " + what + " called '" + name + "' in the tables; nearest: " + String.join(", ", nearest));
    }
}
