package lyate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import lyate.acidity.Acidity;
import lyate.acidity.AcidityEstimator;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
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
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.interfaces.IAtomContainer;

/** What classing every site of a molecule and estimating its pKa cost, against reading the molecule. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class SiteBenchmark {

    private final BareReading bare = new BareReading();
    private final MoleculeReader reader = new MoleculeReader();
    private final SiteFinder finder = new SiteFinder(SiteClasses.load(TableFolders.packaged()));
    private final AcidityEstimator estimator = AcidityEstimator.load(TableFolders.packaged()).withoutMeasured();

    /** The toolkit alone: parse, rings, aromaticity. */
    @Benchmark
    public IAtomContainer readBare() throws CDKException {
        return bare.read(FlaskBenchmark.SUBSTRATE);
    }

    @Benchmark
    public Molecule read() throws MoleculeException {
        return reader.read(FlaskBenchmark.SUBSTRATE);
    }

    /** Read anew each time, because a molecule keeps its ring sizes. */
    @Benchmark
    public List<ProtonSite> readAndFindSites() throws MoleculeException {
        return finder.sites(reader.read(FlaskBenchmark.SUBSTRATE));
    }

    /** With an estimate in water for every site, recipe and relatives included. */
    @Benchmark
    public List<Optional<Acidity>> readFindAndEstimate() throws MoleculeException {
        Molecule molecule = reader.read(FlaskBenchmark.SUBSTRATE);
        List<Optional<Acidity>> values = new ArrayList<>();
        for (ProtonSite site : finder.sites(molecule)) {
            values.add(estimator.acidity(molecule, site, Medium.WATER));
        }
        return values;
    }
}
