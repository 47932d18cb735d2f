package lyate.window;

import lyate.review.Reviewer;
import lyate.stock.Stockroom;

/**
 * What the window asks.
 *
 * @param stockroom what there is to choose from
 * @param reviewer  what judges a step
 */
record Engine(Stockroom stockroom, Reviewer reviewer) {}
