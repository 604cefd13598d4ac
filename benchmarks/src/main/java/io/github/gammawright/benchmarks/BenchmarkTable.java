package io.github.gammawright.benchmarks;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.openjdk.jmh.results.Result;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.ChainedOptionsBuilder;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import org.openjdk.jmh.runner.options.VerboseMode;

/**
 * Runs the benchmarks and prints the tables of the README, with error bars, machine and JVM. With {@code --quick} it takes
 * one short fork each, which is good for a first look only; any other arguments are JMH's own.
 */
public final class BenchmarkTable {

    private static final int POINTS_OF_ACCURACY = 1000;

    private static final Map<String, String> GEODESICS = Map.of(
            "denseContraction", "expert's 64 symbols, contracted term by term",
            "expertAcceleration", "acceleration by an expert's hand",
            "expertFlow", "Hamilton's equations by an expert's hand",
            "geodesicAcceleration", "generated `geodesic-acceleration`",
            "geodesicEquation", "the same through `GeodesicEquation`",
            "hamiltonianFlow", "generated `hamiltonian-flow`",
            "hamiltonianEquation", "the same through `HamiltonianEquation`");

    private BenchmarkTable() {}

    /** Prints the tables, or hands over to JMH. */
    public static void main(String[] arguments) throws IOException, RunnerException {
        boolean quick = arguments.length == 1 && arguments[0].equals("--quick");
        if (arguments.length > 0 && !quick) {
            org.openjdk.jmh.Main.main(arguments);
            return;
        }
        Collection<RunResult> results = new Runner(options(quick)).run();
        Map<String, Result<?>> scores = new HashMap<>();
        for (RunResult result : results) {
            scores.put(result.getPrimaryResult().getLabel(), result.getPrimaryResult());
        }
        System.out.println();
        System.out.println(machine(results.iterator().next()));
        System.out.println();
        christoffel(scores).forEach(System.out::println);
        System.out.println();
        geodesics(scores).forEach(System.out::println);
    }

    private static org.openjdk.jmh.runner.options.Options options(boolean quick) {
        ChainedOptionsBuilder options = new OptionsBuilder()
                .include(ChristoffelBenchmark.class.getName())
                .include(GeodesicBenchmark.class.getName())
                .verbosity(VerboseMode.NORMAL);
        if (quick) {
            options.forks(1)
                    .warmupIterations(2)
                    .warmupTime(TimeValue.milliseconds(300))
                    .measurementIterations(3)
                    .measurementTime(TimeValue.milliseconds(300));
        }
        return options.build();
    }

    private static List<String> christoffel(Map<String, Result<?>> scores) {
        Accuracy accuracy = new Accuracy(POINTS_OF_ACCURACY);
        List<String> lines = new ArrayList<>();
        lines.add("| all Christoffel symbols of `kerr` at a point | operations | ns | worst error |");
        lines.add("| --- | --- | --- | --- |");
        for (Contender contender : Contender.all(KerrInputs.MASS, KerrInputs.SPIN)) {
            lines.add(String.format(
                    Locale.ROOT,
                    "| %s | %s | %s | %.0e |",
                    contender.description(),
                    contender.operations(),
                    score(scores.get(contender.benchmark())),
                    accuracy.worstError(contender)));
        }
        lines.add("| the harness alone | | " + score(scores.get("baseline")) + " | |");
        return lines;
    }

    private static List<String> geodesics(Map<String, Result<?>> scores) {
        List<String> lines = new ArrayList<>();
        lines.add("| right-hand side of a geodesic of `kerr` | ns |");
        lines.add("| --- | --- |");
        for (String name : List.of(
                "denseContraction",
                "expertAcceleration",
                "geodesicAcceleration",
                "geodesicEquation",
                "expertFlow",
                "hamiltonianFlow",
                "hamiltonianEquation")) {
            lines.add("| " + GEODESICS.get(name) + " | " + score(scores.get(name)) + " |");
        }
        return lines;
    }

    private static String score(Result<?> result) {
        return String.format(Locale.ROOT, "%.1f ± %.1f", result.getScore(), result.getScoreError());
    }

    private static String machine(RunResult result) throws IOException {
        return processor() + ", " + Runtime.getRuntime().availableProcessors() + " processors, "
                + System.getProperty("os.name") + "; " + result.getParams().getVmName() + " "
                + result.getParams().getVmVersion() + "; JMH "
                + result.getParams().getJmhVersion() + ", "
                + result.getParams().getForks() + " forks; ± is the 99.9 % confidence interval";
    }

    /** The processor by its own name where the system tells it. */
    private static String processor() throws IOException {
        Path file = Path.of("/proc/cpuinfo");
        if (Files.isReadable(file)) {
            for (String line : Files.readAllLines(file)) {
                if (line.startsWith("model name")) {
                    return line.substring(line.indexOf(':') + 1).trim();
                }
            }
        }
        return System.getProperty("os.arch");
    }
}
