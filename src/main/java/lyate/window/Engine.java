package lyate.window;

import lyate.bench.Enthalpies;
import lyate.review.Reviewer;
import lyate.review.StepReviewer;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;

/**
 * What the window asks.
 *
 * @param folders    where the tables are
 * @param stockroom  what there is to choose from
 * @param reviewer   what judges a step
 * @param enthalpies heats of bases with proton donors
 */
record Engine(TableFolders folders, Stockroom stockroom, Reviewer reviewer, Enthalpies enthalpies) {


    /** Loads the tables. */
    static Engine load(TableFolders folders) {
        return new Engine(folders, Stockroom.load(folders), StepReviewer.load(folders), Enthalpies.load(folders));
    }

    /** The row for water. */
    Solvent water() {
        try {
            return stockroom.solvent(Medium.WATER.id());
        } catch (UnknownNameException e) {
            throw new IllegalStateException("solvents.csv needs a row for water", e);
        }
    }
}
