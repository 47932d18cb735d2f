package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeDrawing;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.report.Recipe;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.Step;
import lyate.review.StepReviewer;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** The card over a site says what {@code lyate sites --explain} says. */
class SiteCardTest {

    private static final TableFolders TABLES = TableFolders.packaged();

    @Test
    void theCardHoldsEveryLineOfTheRecipe() throws MoleculeException, ReviewException, UnknownNameException {
        Molecule molecule = new MoleculeReader().read("CCOC(=O)Cc1ccc(F)cc1");
        Stockroom stockroom = Stockroom.load(TABLES);
        Review review = StepReviewer.load(TABLES).review(new Step("1", molecule, Optional.of("C6"), stockroom.base("LDA"), 1,
                stockroom.solvent("THF"), -78, 0.2, 30, Optional.empty()));
        Shown shown = new Shown(review, MoleculeDrawing.of(molecule));
        String card = SiteCard.html(shown, shown.intended().orElseThrow());
        List<Recipe.Line> lines = Recipe.of(shown.intended().orElseThrow().transfer().acidity(), molecule::label).lines();
        assertTrue(lines.size() > 3, lines::toString);
        assertEquals("", lines.stream().filter(line -> line.part() != Recipe.Part.PKA).map(line -> SiteCard.escape(line.text()))
                .filter(text -> !card.contains(text)).collect(Collectors.joining("; ")));
    }
}
