package lyate.window;

import lyate.bench.Enthalpies;
import lyate.review.Reviewer;
import lyate.review.StepReviewer;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/**
 * What the window asks.
 *
 * @param stockroom  what there is to choose from
 * @param reviewer   what judges a step
 * @param enthalpies heats of bases with proton donors
 */
record Engine(Stockroom stockroom, Reviewer reviewer, Enthalpies enthalpies) {

    /** Loads the tables. */
    static Engine load(TableFolders folders) {
        return new Engine(Stockroom.load(folders), StepReviewer.load(folders), Enthalpies.load(folders));
    }
}
