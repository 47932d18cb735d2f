package lyate.fit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.TreeSet;
import lyate.acidity.lfer.Anchor;
import lyate.acidity.lfer.Coefficients;
import lyate.acidity.lfer.Pool;
import lyate.acidity.lfer.Published;
import lyate.acidity.lfer.Scales;
import lyate.acidity.lfer.Term;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/**
 * The Gaussian fit of one pool: published coefficients plus changes of pool and line plus a residual shared by like sites.
 *
 * <p>Everything is one linear Gaussian model, solved in its dual form. Values far from what their neighbours say get a larger
 * noise, in a few rounds (a digitised book has errors), so that no single row bends a line.
 */
final class PoolFit {

    private static final int ROUNDS = 5;
    /** Leave-one-out residuals beyond this many robust standard deviations count less. */
    private static final double OUTLYING = 4;
    /** Turns a median absolute deviation into a standard deviation. */
    private static final double MAD = 1.4826;

    final Pool pool;
    final List<TrainingRow> rows;
    final List<String> descriptors;
    private final double[][] x;
    private final double[][] kernel;
    private final double[] target;
    private final double[] noise;
    private double[] weights;
    private double[] leaveOneOut;
    private DMatrixRMaj inverse;

    PoolFit(Pool pool, List<TrainingRow> rows, Published published) {
        this.pool = pool;
        this.rows = rows;
        TreeSet<String> names = new TreeSet<>();
        rows.forEach(row -> row.site().terms().forEach(term -> names.add(term.name())));
        this.descriptors = List.copyOf(names);
        this.x = new double[rows.size()][descriptors.size()];
        this.target = new double[rows.size()];
        this.noise = new double[rows.size()];
        for (int i = 0; i < rows.size(); i++) {
            TrainingRow row = rows.get(i);
            for (Term term : row.site().terms()) {
                x[i][Collections.binarySearch(descriptors, term.name())] = term.value() / Scales.of(term.name());
            }
            target[i] = row.intrinsic() - published.estimate(pool.medium(), row.site());
            noise[i] = row.noise() * pool.noise();
        }
        this.kernel = kernel();
        solveRobustly();
    }

    private double[][] kernel() {
        int n = rows.size();
        double[][] k = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                boolean sameLine = sameLine(i, j);
                double dot = dot(x[i], x[j]);
                double distance = dot(x[i], x[i]) + dot(x[j], x[j]) - 2 * dot;
                double similarity = rows.get(i).site().environment().similarity(rows.get(j).site().environment());
                k[i][j] = baseVariance(sameLine) + slopeVariance(sameLine) * dot + pool.residual(similarity, distance);
                k[j][i] = k[i][j];
            }
        }
        return k;
    }

    private boolean sameLine(int i, int j) {
        return rows.get(i).site().series().line().equals(rows.get(j).site().series().line());
    }

    private double baseVariance(boolean sameLine) {
        return square(pool.basePool()) + (sameLine ? square(pool.baseLine()) : 0);
    }

    private double slopeVariance(boolean sameLine) {
        return square(pool.slopePool()) + (sameLine ? square(pool.slopeLine()) : 0);
    }

    private void solveRobustly() {
        int n = rows.size();
        double[] variance = Arrays.stream(noise).map(PoolFit::square).toArray();
        double[] used = variance.clone();
        for (int round = 0; round < ROUNDS; round++) {
            solve(used);
            double scale = MAD * median(Arrays.stream(leaveOneOut).map(Math::abs).toArray());
            for (int i = 0; i < n; i++) {
                used[i] = variance[i] * Math.max(1, square(leaveOneOut[i] / scale / OUTLYING));
            }
        }
    }

    private void solve(double[] variance) {
        int n = rows.size();
        DMatrixRMaj a = new DMatrixRMaj(kernel);
        for (int i = 0; i < n; i++) {
            a.add(i, i, variance[i]);
        }
        LinearSolverDense<DMatrixRMaj> solver = LinearSolverFactory_DDRM.symmPosDef(n);
        if (!solver.setA(a)) {
            throw new IllegalStateException("the covariance of pool " + pool.name() + " is not positive definite");
        }
        inverse = new DMatrixRMaj(n, n);
        solver.invert(inverse);
        weights = new double[n];
        leaveOneOut = new double[n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                weights[i] += inverse.get(i, j) * target[j];
            }
            leaveOneOut[i] = weights[i] / inverse.get(i, i);
        }
    }

    /** The anchors of the residual; {@code measured} names the row of the measured table that states each value. */
    List<Anchor> anchors(MeasuredRows measured) {
        List<Anchor> anchors = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            TrainingRow row = rows.get(i);
            anchors.add(new Anchor(row.smiles(), row.label(), row.site(), weights[i],
                    Math.abs(leaveOneOut[i]), measured.idOf(row)));
        }
        return anchors;
    }

    /**
     * A fitted coefficient.
     *
     * @param change        what the fit did to it
     * @param standardError of the change
     */
    record FittedChange(Coefficients.Change change, double standardError) {}

    /** Every coefficient that at least one row speaks of: those of the pool, then those of its lines. */
    List<FittedChange> changes() {
        List<FittedChange> changes = new ArrayList<>();
        TreeSet<String> lines = new TreeSet<>();
        rows.forEach(row -> lines.add(row.site().series().line()));
        addChanges("pool:" + pool.name(), null, changes);
        lines.forEach(line -> addChanges(line, line, changes));
        return changes;
    }

    private void addChanges(String scope, String line, List<FittedChange> changes) {
        add(scope, line, Published.BASE, -1, changes);
        for (int d = 0; d < descriptors.size(); d++) {
            add(scope, line, descriptors.get(d), d, changes);
        }
    }

    private void add(String scope, String line, String descriptor, int index, List<FittedChange> changes) {
        double pooled = index < 0 ? square(pool.basePool()) : square(pool.slopePool());
        double own = index < 0 ? square(pool.baseLine()) : square(pool.slopeLine());
        double[] covariance = new double[rows.size()];
        int n = 0;
        double change = 0;
        for (int i = 0; i < rows.size(); i++) {
            boolean member = line != null && rows.get(i).site().series().line().equals(line);
            double amount = index < 0 ? 1 : x[i][index];
            n += amount != 0 && (line == null || member) ? 1 : 0;
            covariance[i] = amount * (pooled + (member ? own : 0));
            change += covariance[i] * weights[i];
        }
        if (n > 0) {
            double prior = pooled + (line == null ? 0 : own);
            double scale = index < 0 ? 1 : Scales.of(descriptor);
            double variance = Math.max(0, prior - quadratic(covariance));
            changes.add(new FittedChange(new Coefficients.Change(pool.medium(), scope, descriptor, change / scale, n),
                    Math.sqrt(variance) / scale));
        }
    }

    private double quadratic(double[] v) {
        double sum = 0;
        for (int i = 0; i < v.length; i++) {
            double row = 0;
            for (int j = 0; v[i] != 0 && j < v.length; j++) {
                row += inverse.get(i, j) * v[j];
            }
            sum += row * v[i];
        }
        return sum;
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }

    private static double square(double value) {
        return value * value;
    }

    static double median(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        int n = sorted.length;
        return n == 0 ? 0 : n % 2 == 1 ? sorted[n / 2] : (sorted[n / 2 - 1] + sorted[n / 2]) / 2;
    }
}
