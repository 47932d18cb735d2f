package lyate.window;

import java.util.List;
import java.util.Optional;
import lyate.bench.Enthalpies;
import lyate.molecule.MoleculeDrawing;
import lyate.report.Ladder;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.StepReviewer;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/** What panel tests have in common. */
final class Panels {

    private Panels() {}

    /** Loaded by the first test that asks. */
    private static final class Loaded {
        private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
        private static final Engine ENGINE = new Engine(TableFolders.packaged(), STOCKROOM, StepReviewer.load(TableFolders.packaged(), STOCKROOM),
                Enthalpies.load(TableFolders.packaged()));
    }

    /** The engine of the program, with the tables that come with it. */
    static Engine engine() {
        return Loaded.ENGINE;
    }

    /** A new sheet of one step. */
    static SheetDocument document(StepText step) {
        return new SheetDocument(StepCells.sheetOf(step), System::nanoTime);
    }

    /** What the window would show for a typed step. */
    static Shown shown(StepText text) {
        try {
            Review review = engine().reviewer().review(new FieldReader(engine()::steps).read(text).step().orElseThrow());
            return new Shown(review, MoleculeDrawing.of(review.step().substrate()));
        } catch (ReviewException e) {
            throw new AssertionError(e);
        }
    }

    /** The ladder of what is shown. */
    static Optional<Ladder> ladder(Shown shown) {
        return Ladder.of(shown.review(), shown.tags().sites(), List.of(), Optional.of(engine().water()));
    }
}
