package lyate.sheet;

import java.util.List;

/** A row cannot be turned into a step; the message names every column at fault, what was found and what was expected. */
public final class RowException extends Exception {

    private static final long serialVersionUID = 1L;

    public RowException(List<String> problems) {
        super(String.join("; ", problems));
    }
}
