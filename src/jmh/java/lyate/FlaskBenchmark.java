package lyate;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import lyate.flask.Coupling;
import lyate.flask.DoseCurve;
import lyate.flask.Equilibrium;
import lyate.flask.Flask;
import lyate.flask.PKaErrors;
import lyate.flask.ProtonBalance;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;
import lyate.flask.UncertaintyPropagation;
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
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class FlaskBenchmark {

    /** 30 heavy atoms: a peptide-like ketoester with acid, amide, phenol and amine sites. */
    static final String SUBSTRATE = "CCOC(=O)CC(=O)CNC(=O)C(Cc1ccc(O)cc1)NC(=O)CC(N)C(=O)O";

    private final MoleculeReader reader = new MoleculeReader();
    private final Flask independent = flask(List.of());
    private final Flask coupled = flask(everyPair(6));
    private final Flask twelve = Flask.of("dmso",
            molecule(everyPair(12), 3, 5, 7, 9, 11, 13, 15, 17, 19, 21, 23, 25), ProtonHolder.base("base", 5.5, 29.4));
    private final Flask rest = Flask.of("dmso", substrate(everyPair(6)), water());
    private final ProtonHolder base = ProtonHolder.base("base", 1, 29.4);
    private final UncertaintyPropagation propagation = new UncertaintyPropagation();
    private final PKaErrors errors = new PKaErrors(List.of(0.2, 0.5, 0.5, 0.9, 0.9, 1.4),
            List.of(new PKaErrors.Shared(List.of(1.0, 1.0, 1.0, 1.0, 1.0, 1.0))));

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

    /** Twelve places that all feel one another, the most that is counted out in full, and a base. */
    @Benchmark
    public Equilibrium twelveCoupledSites() {
        return ProtonBalance.solve(twelve);
    }

    /** The eight-site flask with coupled places, solved anew for every point of the uncertainty. */
    @Benchmark
    public Map<Boolean, Double> propagateUncertainty() {
        return propagation.probabilities(errors, shifts -> takenInFull(shifts));
    }

    @Benchmark
    public DoseCurve doseCurve() {
        return DoseCurve.of(rest, base, 4);
    }

    @Benchmark
    public Molecule readTheMolecule() throws MoleculeException {
        return reader.read(SUBSTRATE);
    }

    private boolean takenInFull(double[] shifts) {
        ProtonHolder substrate = coupled.holders().get(0);
        Flask shifted = coupled.withHolders(List.of(
                substrate.withPKas(place -> substrate.places().get(place).pKa() + shifts[place]),
                coupled.holders().get(1), coupled.holders().get(2)));
        return ProtonBalance.solve(shifted).states().get(0).deprotonated(2) > 0.95;
    }

    private static Flask flask(List<Coupling> couplings) {
        return Flask.of("dmso", substrate(couplings), ProtonHolder.base("base", 3.3, 29.4), water());
    }

    private static ProtonHolder water() {
        return ProtonHolder.acid("water", 0.014, 31.4);
    }

    private static ProtonHolder substrate(List<Coupling> couplings) {
        return molecule(couplings, 4.8, 9.5, 12.1, 16.3, 18.9, 24.5);
    }

    private static ProtonHolder molecule(List<Coupling> couplings, double... pKas) {
        List<ProtonPlace> places = new ArrayList<>();
        for (int place = 0; place < pKas.length; place++) {
            places.add(new ProtonPlace("X" + place, pKas[place]));
        }
        return new ProtonHolder("substrate", 1, places, couplings, pKas.length);
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
