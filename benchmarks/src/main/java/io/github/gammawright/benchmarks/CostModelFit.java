package io.github.gammawright.benchmarks;

import io.github.gammawright.graph.OperationCount;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.optimiser.CostModel;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/**
 * Measures what operations cost and writes the optimiser's model, to be checked in. The cost of an operation is its
 * reciprocal throughput and a sixteenth of its latency, in quarters of an addition: kernels are between the two extremes,
 * and the share is a choice, not a measurement. The least of twenty measurements counts, which other work of the machine
 * disturbs least.
 */
public final class CostModelFit {

    private static final double LATENCY_SHARE = 1.0 / 16;
    private static final int ADDITION = 4;

    private CostModelFit() {}

    /**
     * Runs the measurement.
     *
     * @param arguments the folder for the resource, that is the engine's {@code src/main/resources/…/optimiser}
     */
    public static void main(String[] arguments) throws IOException, RunnerException {
        Map<String, Double> latency = new HashMap<>();
        Map<String, Double> throughput = new HashMap<>();
        Map<String, Double> spill = new HashMap<>();
        for (RunResult result : new Runner(new OptionsBuilder()
                        .include(OperationBenchmark.class.getName())
                        .include(SpillBenchmark.class.getName())
                        .build())
                .run()) {
            String label = result.getPrimaryResult().getLabel();
            double least = result.getPrimaryResult().getStatistics().getMin();
            String operation = result.getParams().getParam("operation");
            switch (label) {
                case "latency" -> latency.put(operation, least);
                case "throughput" -> throughput.put(operation, least);
                default -> spill.put(label, least);
            }
        }
        List<String> lines = lines(latency, throughput, spill.get("all") - spill.get("groups"));
        lines.forEach(System.out::println);
        Files.write(Path.of(arguments[0]).resolve(CostModel.RESOURCE), lines);
    }

    private static List<String> lines(Map<String, Double> latency, Map<String, Double> throughput, double spill) {
        double addition = throughput.get("add") + LATENCY_SHARE * latency.get("add");
        List<String> lines = new ArrayList<>();
        lines.add(
                "# Costs of operations in quarters of an addition, as CostModelFit of the benchmarks measured them on");
        lines.add("# " + System.getProperty("java.vm.name") + " " + System.getProperty("java.vm.version") + ", "
                + System.getProperty("os.arch") + ". Not measured when kernels are made.");
        lines.add("add=" + ADDITION);
        for (String operation : List.of("multiply", "divide")) {
            lines.add(operation + "=" + cost(operation, latency, throughput, addition));
        }
        // the class's own method takes about half of two calls, by ChristoffelBenchmark
        int calls = cost("sin", latency, throughput, addition) + cost("cos", latency, throughput, addition);
        lines.add(OperationCount.SINCOS + "=" + calls / 2);
        lines.add("spill=" + Math.max(1, Math.round(ADDITION * spill / addition)));
        for (RealFunction function : RealFunction.values()) {
            int cost = switch (function) {
                // helpers of the class: a logarithm, a root and some operations; the sign costs a comparison
                case ASINH, ACOSH, ATANH ->
                    cost("log", latency, throughput, addition) + cost("sqrt", latency, throughput, addition);
                case ABS -> 1;
                case SIGNUM -> ADDITION;
                default -> cost(function.symbol(), latency, throughput, addition);
            };
            lines.add(function.symbol() + "=" + cost);
        }
        return lines;
    }

    private static int cost(
            String operation, Map<String, Double> latency, Map<String, Double> throughput, double addition) {
        double own = throughput.get(operation) + LATENCY_SHARE * latency.get(operation) - addition;
        return Math.max(ADDITION, (int) Math.round(ADDITION * own / addition));
    }
}
