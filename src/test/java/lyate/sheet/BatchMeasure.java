package lyate.sheet;

import com.sun.management.OperatingSystemMXBean;
import java.io.BufferedReader;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.MemoryPoolMXBean;
import java.lang.management.MemoryType;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.IntFunction;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.report.SheetCsv;
import lyate.review.StepReviewer;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.openscience.cdk.aromaticity.Aromaticity;
import org.openscience.cdk.aromaticity.ElectronDonation;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.graph.Cycles;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smiles.SmilesParser;

/**
 * What a long sheet costs, beside what merely reading its structures costs, in one run; see docs/performance.md. Arguments:
 * number of rows, threads.
 */
public final class BatchMeasure {

    private static final int WARM_UP = 3000;
    private static final double NANOS = 1e9;
    private static final double MEBIBYTE = 1 << 20;

    private final OperatingSystemMXBean system = (OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean();
    private final TableFolders tables = TableFolders.packaged();
    private final MoleculeReader molecules = MoleculeReader.load(tables);
    private final Stockroom stockroom = Stockroom.load(tables);
    private final BatchReview batch = new BatchReview(new StepReader(molecules, stockroom), StepReviewer.load(tables, stockroom));

    private BatchMeasure() {}

    /** Wall clock and processor time of some work, seconds. */
    private record Cost(double wall, double processor) {}

    public static void main(String[] arguments) throws IOException {
        int rows = Integer.parseInt(arguments[0]);
        int threads = Integer.parseInt(arguments[1]);
        new BatchMeasure().run(rows, threads);
    }

    private void run(int rows, int threads) throws IOException {
        Path sheet = Files.createTempFile("long", ".csv");
        Path result = Files.createTempFile("result", ".csv");
        try {
            LongSheet.write(Math.min(rows, WARM_UP), sheet);
            review(sheet, result, threads);
            read(Math.min(rows, WARM_UP), BatchMeasure::bare);
            LongSheet.write(rows, sheet);
            Cost bare = read(rows, BatchMeasure::bare);
            Cost own = read(rows, row -> molecule(LongSheet.substrate(row)));
            Cost review = review(sheet, result, threads);
            say("rows %d, threads %d, processors %d", rows, threads, Runtime.getRuntime().availableProcessors());
            say("bare reading (parse, rings, aromaticity): %.1f us of processor time a structure", 1e6 * bare.processor() / rows);
            say("own reading (with normalisation and symmetry): %.1f us, ratio %.1f", 1e6 * own.processor() / rows, own.processor() / bare.processor());
            say("review of the sheet: %.1f us, ratio %.1f; %.0f rows a second by the clock, %.0f a second of processor time",
                    1e6 * review.processor() / rows, review.processor() / bare.processor(), rows / review.wall(), rows / review.processor());
        } finally {
            Files.delete(sheet);
            Files.delete(result);
        }
    }

    private Cost read(int rows, IntFunction<Object> reading) {
        return cost(() -> {
            for (int row = 0; row < rows; row++) {
                if (reading.apply(row) == null) {
                    throw new IllegalStateException("nothing read");
                }
            }
        });
    }

    private Cost review(Path sheet, Path result, int threads) throws IOException {
        AtomicInteger done = new AtomicInteger();
        AtomicInteger refused = new AtomicInteger();
        try (BufferedReader text = Files.newBufferedReader(sheet); var out = Files.newBufferedWriter(result)) {
            SheetReader rows = new SheetReader(text);
            SheetCsv csv = new SheetCsv(out, rows.header()).begin();
            Cost cost = cost(() -> batch.run(rows, threads, row -> {
                refused.addAndGet(row.review().isPresent() ? 0 : 1);
                write(csv, row);
                int count = done.incrementAndGet();
                if (count == 10_000 || count % 100_000 == 0) {
                    say("  after %d rows: %.0f MiB live on the heap of %.0f MiB at most, %d refused", count, liveMebibytes(),
                            Runtime.getRuntime().maxMemory() / MEBIBYTE, refused.get());
                }
            }));
            return cost;
        } catch (SheetException e) {
            throw new IllegalStateException(e);
        }
    }

    private static void write(SheetCsv csv, ReviewedRow row) {
        try {
            csv.write(row);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    /** What is left after a full collection. */
    private static double liveMebibytes() {
        System.gc();
        return ManagementFactory.getMemoryPoolMXBeans().stream().filter(pool -> pool.getType() == MemoryType.HEAP)
                .map(MemoryPoolMXBean::getCollectionUsage).filter(usage -> usage != null).mapToLong(usage -> usage.getUsed()).sum() / MEBIBYTE;
    }

    private Cost cost(Runnable work) {
        long wall = System.nanoTime();
        long processor = system.getProcessCpuTime();
        work.run();
        return new Cost((System.nanoTime() - wall) / NANOS, (system.getProcessCpuTime() - processor) / NANOS);
    }

    private Object molecule(String smiles) {
        try {
            return molecules.read(smiles);
        } catch (MoleculeException e) {
            throw new IllegalStateException(e);
        }
    }

    private static Object bare(int row) {
        try {
            IAtomContainer molecule = new SmilesParser(SilentChemObjectBuilder.getInstance()).parseSmiles(LongSheet.substrate(row));
            Cycles.markRingAtomsAndBonds(molecule);
            new Aromaticity(ElectronDonation.daylight(), Cycles.all()).apply(molecule);
            return molecule;
        } catch (CDKException e) {
            throw new IllegalStateException(e);
        }
    }

    private static void say(String format, Object... values) {
        System.out.println(String.format(Locale.ROOT, format, values));
    }
}
