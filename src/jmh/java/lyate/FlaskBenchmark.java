package lyate;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import lyate.flask.Coupling;
import lyate.flask.Equilibrium;
import lyate.flask.Flask;
import lyate.flask.ProtonBalance;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** What one proton balance costs, against reading the molecule it is about. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class FlaskBenchmark {

    /** 30 heavy atoms: a peptide-like ketoester with acid, amide, phenol and amine sites. */
    private static final String SUBSTRATE = "CCOC(=O)CC(=O)CNC(=O)C(Cc1ccc(O)cc1)NC(=O)CC(N)C(=O)O";

    private final MoleculeReader reader = new MoleculeReader();
    private final Flask independent = flask(List.of());
    private final Flask coupled = flask(everyPair(6));

    /** Six places of the substrate that do not feel one another, base, water: eight in all. */
    @Benchmark
    public Equilibrium eightSitesUncoupled() {
        return ProtonBalance.solve(independent);
    }

    /** Six places of the substrate that all feel one another, base, water: eight in all. */
    @Benchmark
    public Equilibrium eightSitesSixCoupled() {
        return ProtonBalance.solve(coupled);
    }

    @Benchmark
    public Molecule readTheMolecule() throws MoleculeException {
        return reader.read(SUBSTRATE);
    }

    private static Flask flask(List<Coupling> couplings) {
        double[] pKas = {4.8, 9.5, 12.1, 16.3, 18.9, 24.5};
        List<ProtonPlace> places = new ArrayList<>();
        for (int place = 0; place < pKas.length; place++) {
            places.add(new ProtonPlace("X" + place, pKas[place]));
        }
        return Flask.of("dmso",
                new ProtonHolder("substrate", 1, places, couplings, pKas.length),
                ProtonHolder.base("base", 3.3, 29.4),
                ProtonHolder.acid("water", 0.014, 31.4));
    }

    private static List<Coupling> everyPair(int places) {
        List<Coupling> pairs = new ArrayList<>();
        for (int first = 0; first < places; first++) {
            for (int second = first + 1; second < places; second++) {
                pairs.add(new Coupling(first, second, 1.5));
            }
        }
        return pairs;
    }
}
