package lyate.window;

import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.function.Consumer;
import javax.swing.SwingUtilities;
import lyate.bench.Enthalpies;
import lyate.molecule.MoleculeReader;
import lyate.review.StepReviewer;
import lyate.sheet.StepReader;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;

/**
 * What the window asks. The tables are read in the background, so that the window stands before they are; whoever asks
 * earlier waits. Safe to share between threads.
 */
final class Engine {

    private final TableFolders folders;
    private final CompletableFuture<MoleculeReader> molecules;
    private final CompletableFuture<Stockroom> stockroom;
    private final CompletableFuture<StepReader> steps;
    private final CompletableFuture<StepReviewer> reviewer;
    private final CompletableFuture<Enthalpies> enthalpies;

    private Engine(TableFolders folders, CompletableFuture<MoleculeReader> molecules, CompletableFuture<Stockroom> stockroom,
                   CompletableFuture<StepReviewer> reviewer, CompletableFuture<Enthalpies> enthalpies) {
        this.folders = folders;
        this.molecules = molecules;
        this.stockroom = stockroom;
        this.steps = molecules.thenCombine(stockroom, StepReader::new);
        this.reviewer = reviewer;
        this.enthalpies = enthalpies;
    }

    /** An engine whose parts are there already. */
    Engine(TableFolders folders, Stockroom stockroom, StepReviewer reviewer, Enthalpies enthalpies) {
        this(folders, CompletableFuture.completedFuture(MoleculeReader.load(folders)), CompletableFuture.completedFuture(stockroom), CompletableFuture.completedFuture(reviewer),
                CompletableFuture.completedFuture(enthalpies));
    }

    /** Starts reading the tables and returns at once. */
    static Engine load(TableFolders folders) {
        CompletableFuture<Stockroom> stockroom = CompletableFuture.supplyAsync(() -> Stockroom.load(folders));
        return new Engine(folders, CompletableFuture.supplyAsync(() -> MoleculeReader.load(folders)), stockroom,
                stockroom.thenApplyAsync(room -> StepReviewer.load(folders, room)), stockroom.thenApplyAsync(room -> Enthalpies.load(folders)));
    }

    /** Tells, on the event thread, why the tables cannot be read; never called where they can. */
    void onFailure(Consumer<String> told) {
        CompletableFuture.allOf(molecules, stockroom, reviewer, enthalpies).whenComplete((nothing, failure) -> {
            if (failure != null) {
                String words = String.valueOf(failure instanceof CompletionException ? failure.getCause().getMessage() : failure.getMessage());
                SwingUtilities.invokeLater(() -> told.accept(words));
            }
        });
    }

    /** Where the tables are. */
    TableFolders folders() {
        return folders;
    }

    /** What turns text into a molecule. */
    MoleculeReader molecules() {
        return molecules.join();
    }

    /** What turns a row of a sheet into a step. */
    StepReader steps() {
        return steps.join();
    }

    /** What there is to choose from. */
    Stockroom stockroom() {
        return stockroom.join();
    }

    /** What judges a step. */
    StepReviewer reviewer() {
        return reviewer.join();
    }

    /** Heats of bases with proton donors. */
    Enthalpies enthalpies() {
        return enthalpies.join();
    }

    /** Bases a text may mean; none while the tables are still being read. */
    List<Base> searchBases(String text, int limit) {
        return stockroom.isDone() ? stockroom().searchBases(text, limit) : List.of();
    }

    /** Solvents a text may mean; none while the tables are still being read. */
    List<Solvent> searchSolvents(String text, int limit) {
        return stockroom.isDone() ? stockroom().searchSolvents(text, limit) : List.of();
    }

    /** The row for water. */
    Solvent water() {
        try {
            return stockroom().solvent(Medium.WATER.id());
        } catch (UnknownNameException e) {
            throw new IllegalStateException("solvents.csv needs a row for water", e);
        }
    }
}
