package lyate.molecule;

import java.awt.Color;

/** Colours of a drawing, by element, so that one drawing suits a light and a dark ground. */
@FunctionalInterface
public interface DrawingColours {

    /** The colour of an atom symbol; bonds have the colour of carbon (6). */
    Color of(int atomicNumber);

    /** Everything in one colour. */
    static DrawingColours plain(Color colour) {
        return atomicNumber -> colour;
    }
}
