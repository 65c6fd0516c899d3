package skytally;

import java.util.Collection;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.results.Result;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.ChainedOptionsBuilder;
import org.openjdk.jmh.runner.options.CommandLineOptionException;
import org.openjdk.jmh.runner.options.CommandLineOptions;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/**
 * Runs the benchmarks and says what they come to, as ratios of figures of one run: a slow machine is slow on both
 * sides. Takes the options of JMH.
 */
public final class Benchmarks {

    private static final String ALLOCATED = "gc.alloc.rate.norm";

    private final Map<String, RunResult> results = new HashMap<>();

    private Benchmarks(Collection<RunResult> run) {
        for (RunResult result : run) {
            String name = result.getParams().getBenchmark();
            results.put(name.substring(name.lastIndexOf('.', name.lastIndexOf('.') - 1) + 1), result);
        }
    }

    public static void main(String[] options) throws RunnerException, CommandLineOptionException {
        ChainedOptionsBuilder chosen =
                new OptionsBuilder().parent(new CommandLineOptions(options)).addProfiler(GCProfiler.class);
        new Benchmarks(new Runner(chosen.build()).run()).report();
    }

    private void report() {
        ratio(
                "A pair of luminaire and place, 10 000 luminaires against 500 (1.0 where cost is linear)",
                "DirectLightBenchmark.manyLuminaires",
                "DirectLightBenchmark.fewLuminaires");
        ratio(
                "The same pair by pair, against the loop",
                "DirectLightBenchmark.pairByPair",
                "DirectLightBenchmark.fewLuminaires");
        allocation("Bytes made anew for a pair in the loop", "DirectLightBenchmark.manyLuminaires");
        ratio(
                "A line of sight by a library's adaptive integrator, against the house's rule",
                "SingleScatteringBenchmark.byLibrary",
                "SingleScatteringBenchmark.byHouse");
        ratio(
                "A dome of all orders, against its first order alone",
                "SkyglowKernelBenchmark.dome",
                "SkyglowKernelBenchmark.firstOrderOfDome");
        ratio(
                "A new atmosphere, against a dome in one that is ready",
                "SkyglowKernelBenchmark.newAtmosphere",
                "SkyglowKernelBenchmark.dome");
        ratio(
                "A new atmosphere one wavelength at a time, against six side by side",
                "SkyglowKernelBenchmark.newAtmosphereByWavelength",
                "SkyglowKernelBenchmark.newAtmosphere");
    }

    private void ratio(String what, String over, String under) {
        RunResult above = results.get(over);
        RunResult below = results.get(under);
        if (above != null && below != null) {
            print(what, quickest(above) / quickest(below));
        }
    }

    /** The iteration that neighbours on the machine disturbed least. */
    private static double quickest(RunResult result) {
        return result.getPrimaryResult().getStatistics().getMin();
    }

    private void allocation(String what, String name) {
        RunResult result = results.get(name);
        Result<?> bytes = result == null ? null : result.getSecondaryResults().get(ALLOCATED);
        if (bytes != null) {
            print(what, bytes.getScore());
        }
    }

    private static void print(String what, double value) {
        System.out.printf(Locale.ROOT, "%s: %.2f%n", what, value);
    }
}
