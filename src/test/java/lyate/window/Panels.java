package lyate.window;

import lyate.bench.Enthalpies;
import lyate.molecule.MoleculeDrawing;
import lyate.molecule.MoleculeReader;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.sheet.StepReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/** What panel tests have in common. */
final class Panels {

    private Panels() {}

    /** Real tables, invented verdicts. */
    static Engine inventedEngine() {
        return new Engine(TableFolders.packaged(), Stockroom.load(TableFolders.packaged()), new InventedReviewer(), Enthalpies.load(TableFolders.packaged()));
    }

    /** A new sheet of one step. */
    static SheetDocument document(StepText step) {
        return new SheetDocument(StepCells.sheetOf(step), System::nanoTime);
    }

    /** What the window would show for a typed step, judged by the invented reviewer. */
    static Shown shown(StepText text) {
        try {
            Review review = new InventedReviewer().review(new FieldReader(() -> new StepReader(new MoleculeReader(), Stockroom.load(TableFolders.packaged())))
                    .read(text).step().orElseThrow());
            return new Shown(review, MoleculeDrawing.of(review.step().substrate()));
        } catch (ReviewException e) {
            throw new AssertionError(e);
        }
    }
}
