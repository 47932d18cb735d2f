package lyate.window;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.Arrays;
import java.util.Locale;
import java.util.Objects;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import javax.swing.JFrame;
import javax.swing.SwingUtilities;
import lyate.table.TableFolders;

/** Measures keystroke to repainted result on a substrate of 40 heavy atoms; needs a display. */
final class Latency {

    private static final String STEM = "CC(C)CC(NC(=O)C(CC(N)=O)NC(=O)c1ccc(O)cc1)C(=O)NC(CO)C(=O)Nc1ccc(F)cc1";
    private static final int WARM_UP = 30;
    private static final int MEASURED = 100;

    private Latency() {}

    public static void main(String[] arguments) throws Exception {
        AtomicReference<Workbench> bench = new AtomicReference<>();
        Engine engine = Engine.load(TableFolders.packaged());
        SwingUtilities.invokeAndWait(() -> {
            Theme theme = new Theme(false);
            theme.install();
            bench.set(new Workbench(theme, engine, Panels.document(StepText.demo().with(StepField.SUBSTRATE, STEM).withSite(""))));
            JFrame frame = new JFrame();
            frame.setContentPane(bench.get());
            frame.setSize(1500, 920);
            frame.setVisible(true);
        });
        while (bench.get().shown().isEmpty()) {
            Thread.sleep(100);
        }
        System.out.println("heavy atoms: " + bench.get().shown().orElseThrow().review().step().substrate().atomCount());
        report("equivalents typed", measure(bench.get(), StepField.EQUIVALENTS, "1.0", "1.1"));
        report("base changed", measure(bench.get(), StepField.BASE, "LDA", "NaH"));
        report("substrate typed", measure(bench.get(), StepField.SUBSTRATE, STEM, STEM.replace("F)", "Cl)")));
        System.exit(0);
    }

    private static double[] measure(Workbench bench, StepField field, String one, String other) throws Exception {
        double[] millis = new double[MEASURED];
        double[] cpu = new double[MEASURED];
        for (int i = 0; i < WARM_UP + MEASURED; i++) {
            String text = i % 2 == 0 ? one : other;
            long cpuBefore = cpuNanos();
            long start = System.nanoTime();
            CountDownLatch painted = new CountDownLatch(1);
            SwingUtilities.invokeAndWait(() -> {
                bench.afterPainting(painted::countDown);
                bench.strip().box(field).field().setText(text);
            });
            if (!painted.await(10, TimeUnit.SECONDS)) {
                throw new IllegalStateException("nothing was painted for " + text);
            }
            if (i >= WARM_UP) {
                millis[i - WARM_UP] = (System.nanoTime() - start) / 1e6;
                cpu[i - WARM_UP] = (cpuNanos() - cpuBefore) / 1e6;
            }
        }
        report(field + ", processor time", cpu);
        return millis;
    }

    /** Time the processor gave to reviewing and to the event thread: what a busy machine does not change. */
    private static long cpuNanos() {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        return Arrays.stream(threads.getThreadInfo(threads.getAllThreadIds())).filter(Objects::nonNull)
                .filter(thread -> thread.getThreadName().equals("review") || thread.getThreadName().startsWith("AWT-EventQueue"))
                .mapToLong(thread -> threads.getThreadCpuTime(thread.getThreadId())).sum();
    }

    private static void report(String what, double[] millis) {
        Arrays.sort(millis);
        System.out.printf(Locale.ROOT, "%s: median %.0f ms, 95th percentile %.0f ms, longest %.0f ms%n", what,
                millis[millis.length / 2], millis[(int) (millis.length * 0.95)], millis[millis.length - 1]);
    }
}
