package lyate;

import java.io.IOException;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/**
 * Every measurement of docs/performance.md in one run: first within one process, then of whole processes.
 * Arguments: which benchmarks, as part of their name or {@code .*}; how many turns the processes take, 0 for none.
 */
public final class Benchmarks {

    private Benchmarks() {}

    public static void main(String[] arguments) throws RunnerException, IOException, InterruptedException {
        if (!arguments[0].equals("none")) {
            new Runner(new OptionsBuilder().include(arguments[0]).build()).run();
        }
        if (!arguments[1].equals("0")) {
            WholeProcesses.main(new String[] {arguments[1]});
        }
    }
}
