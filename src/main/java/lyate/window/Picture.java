package lyate.window;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.Graphics2D;
import java.util.function.Consumer;

/**
 * Something drawn that can be copied or saved.
 *
 * @param name    what it shows, fit for a file name
 * @param size    as on screen
 * @param ground  what it is drawn on
 * @param painter draws it; the font is set already
 */
record Picture(String name, Dimension size, Color ground, Consumer<Graphics2D> painter) {}
