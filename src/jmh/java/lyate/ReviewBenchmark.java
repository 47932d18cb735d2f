package lyate;

import java.util.Optional;
import java.util.concurrent.TimeUnit;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.Step;
import lyate.review.StepReviewer;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** What a full check of one step costs, uncertainty and findings included, against reading the molecule it is about. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 4)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class ReviewBenchmark {

    private final MoleculeReader reader = new MoleculeReader();
    private final StepReviewer reviewer = StepReviewer.load(TableFolders.packaged());
    private final Stockroom stockroom = Stockroom.load(TableFolders.packaged());
    private final Step read = step();

    /** From the structure as text to the review. */
    @Benchmark
    public Review readAndReview() throws ReviewException {
        return reviewer.review(step());
    }

    /** A molecule that is already read; nothing is remembered from one review to the next. */
    @Benchmark
    public Review review() throws ReviewException {
        return reviewer.review(read);
    }

    @Benchmark
    public Molecule readTheMolecule() throws MoleculeException {
        return reader.read(FlaskBenchmark.SUBSTRATE);
    }

    private Step step() {
        try {
            return new Step("bench", reader.read(FlaskBenchmark.SUBSTRATE), Optional.of("C6"), stockroom.base("LDA"), 1.05,
                    stockroom.solvent("THF"), -78, 0.2, 50, Optional.empty());
        } catch (MoleculeException | UnknownNameException e) {
            throw new IllegalStateException(e);
        }
    }
}
