package lyate;

import java.util.List;
import java.util.concurrent.TimeUnit;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
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

/** What classing every site of a molecule costs, against reading the molecule. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class SiteBenchmark {

    private final MoleculeReader reader = new MoleculeReader();
    private final SiteFinder finder = new SiteFinder(SiteClasses.load(TableFolders.packaged()));

    @Benchmark
    public Molecule read() throws MoleculeException {
        return reader.read(FlaskBenchmark.SUBSTRATE);
    }

    /** Read anew each time, because a molecule keeps its ring sizes. */
    @Benchmark
    public List<ProtonSite> readAndFindSites() throws MoleculeException {
        return finder.sites(reader.read(FlaskBenchmark.SUBSTRATE));
    }
}
