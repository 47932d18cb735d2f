package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import lyate.molecule.MoleculeReader;
import lyate.review.StepReviewer;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A batch keeps the order, gives the same answers on any number of threads, and holds few rows at a time. */
class BatchReviewTest {

    private static final List<String> SUBSTRATES = List.of("CC(C)=O", "Oc1ccccc1", "CC(=O)CC(=O)OCC", "not a structure", "C#CC",
            "CCO", "COC(=O)Cc1ccccc1", "C[N+](=O)[O-]");

    @ParameterizedTest
    @ValueSource(ints = {2, 3})
    void sameAnswersInTheSameOrderOnAnyNumberOfThreads(int threads) throws IOException, SheetException {
        List<String> one = run(1);
        assertEquals(96, one.size());
        assertEquals(one, run(threads));
    }

    @Test
    void rowThatCannotBeUsedStopsNothing() throws IOException, SheetException {
        List<String> results = run(2);
        assertTrue(results.get(3).startsWith("column substrate: "), results.get(3));
        assertTrue(results.get(4).contains("verdict"), results.get(4));
    }

    @Test
    void programErrorCostsItsRowAlone() {
        SheetRow row = new SheetRow(new SheetHeader(List.of("substrate", "base", "solvent")), 1, 2, List.of("CC(C)=O", "LDA", "THF"), "");
        BatchReview broken = new BatchReview(new StepReader(new MoleculeReader(), Stockroom.load(TableFolders.packaged())), step -> {
            throw new IllegalArgumentException("beyond the table");
        });
        assertEquals("the program failed on this row, please report it (IllegalArgumentException: beyond the table)", broken.review(row).problem());
    }

    @Test
    void fewItemsAreHeldAtATime() {
        AtomicInteger drawn = new AtomicInteger();
        AtomicInteger most = new AtomicInteger();
        AtomicInteger done = new AtomicInteger();
        Iterator<Integer> endless = IntStream.range(0, 100_000).boxed().peek(i -> drawn.incrementAndGet()).iterator();
        new OrderedWork(2).run(endless, i -> i, i -> {
            assertEquals(done.getAndIncrement(), i);
            most.accumulateAndGet(drawn.get() - done.get(), Math::max);
        });
        assertEquals(100_000, done.get());
        assertTrue(most.get() < 200, "held " + most.get());
    }

    private static List<String> run(int threads) throws IOException, SheetException {
        TableFolders folders = TableFolders.packaged();
        BatchReview batch = new BatchReview(new StepReader(new MoleculeReader(), Stockroom.load(folders)), StepReviewer.load(folders));
        StringBuilder sheet = new StringBuilder("substrate,base,solvent\n");
        IntStream.range(0, 96).forEach(i -> sheet.append(SUBSTRATES.get(i % SUBSTRATES.size()))
                .append(i % 3 == 0 ? ",LDA,THF\n" : ",K2CO3,DMF\n"));
        List<String> results = new ArrayList<>();
        batch.run(new SheetReader(new StringReader(sheet.toString())), threads, reviewed -> results.add(reviewed.review()
                .map(review -> "verdict " + review.verdict() + review.probabilities() + review.transfers() + review.findings())
                .orElse(reviewed.problem())));
        return results;
    }
}
