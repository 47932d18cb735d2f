package lyate;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import lyate.molecule.MoleculeReader;
import lyate.review.ReviewException;
import lyate.review.StepReviewer;
import lyate.sheet.RouteSheet;
import lyate.sheet.RowException;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetException;
import lyate.sheet.SheetRow;
import lyate.sheet.StepReader;
import lyate.site.SiteClass;
import lyate.site.SiteClasses;
import lyate.stock.Stockroom;
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
import org.openjdk.jmh.infra.Blackhole;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.smarts.SmartsPattern;

/** The twelve steps of the demo route, read from their rows and reviewed, against what the toolkit alone takes to read and match. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 4)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class BatchBenchmark {

    private static final TableFolders TABLES = TableFolders.packaged();

    private final BareReading bare = new BareReading();
    private final List<SmartsPattern> patterns = patterns();
    private final Stockroom stockroom = Stockroom.load(TABLES);
    private final StepReader steps = new StepReader(new MoleculeReader(), stockroom);
    private final StepReviewer reviewer = StepReviewer.load(TABLES, stockroom);
    private final List<SheetRow> rows = demoRoute().rows();

    @Benchmark
    public void review(Blackhole hole) throws RowException, ReviewException {
        for (SheetRow row : rows) {
            hole.consume(reviewer.review(steps.read(row)));
        }
    }

    /** Parse, rings, aromaticity. */
    @Benchmark
    public void readBare(Blackhole hole) throws CDKException {
        for (SheetRow row : rows) {
            hole.consume(bare.read(row.text(SheetColumn.SUBSTRATE)));
        }
    }

    /** The same, and every pattern of the site classes; a review asks some 300 patterns of side reactions as well. */
    @Benchmark
    public void readBareAndMatch(Blackhole hole) throws CDKException {
        for (SheetRow row : rows) {
            IAtomContainer molecule = bare.read(row.text(SheetColumn.SUBSTRATE));
            for (SmartsPattern pattern : patterns) {
                hole.consume(pattern.matches(molecule));
            }
        }
    }

    private static List<SmartsPattern> patterns() {
        List<SmartsPattern> patterns = new ArrayList<>();
        for (SiteClass row : SiteClasses.load(TABLES).rows()) {
            SmartsPattern pattern = SmartsPattern.create(row.pattern().smarts());
            pattern.setPrepare(false);
            patterns.add(pattern);
        }
        return patterns;
    }

    static RouteSheet demoRoute() {
        try (InputStream route = BatchBenchmark.class.getResourceAsStream("/lyate/demo-route.csv")) {
            return RouteSheet.parse(new String(route.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException | SheetException e) {
            throw new IllegalStateException(e);
        }
    }
}
