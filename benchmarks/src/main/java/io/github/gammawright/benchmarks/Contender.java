package io.github.gammawright.benchmarks;

import io.github.gammawright.benchmarks.kernels.KerrFull;
import io.github.gammawright.benchmarks.kernels.KerrNonZero;
import io.github.gammawright.runtime.PointKernel;
import java.util.List;
import java.util.Optional;

/**
 * One way to compute the connection of Kerr's metric.
 *
 * @param benchmark the method of {@link ChristoffelBenchmark} that measures it
 * @param description what it is, for a table
 * @param kernel gives all 64 symbols row by row, or the twenty that are not zero in index order
 * @param length how many the kernel gives
 * @param straightLine the class whose operations can be counted; empty where it has loops or is no code of ours
 */
record Contender(
        String benchmark, String description, PointKernel kernel, int length, Optional<Class<?>> straightLine) {

    /** All of them for a hole, the generated kernels and the expert's first. */
    static List<Contender> all(double mass, double spin) {
        return List.of(
                counted(
                        "generatedNonZero",
                        "generated, `non-zero`",
                        new KerrNonZero(mass, spin)::evaluate,
                        20,
                        KerrNonZero.class),
                counted(
                        "expertNonZero",
                        "expert by hand, 20 stores",
                        new ExpertNonZero(mass, spin)::evaluate,
                        20,
                        ExpertNonZero.class),
                counted("generatedFull", "generated, `full`", new KerrFull(mass, spin)::evaluate, 64, KerrFull.class),
                counted(
                        "expertFull",
                        "expert by hand, 64 stores",
                        new ExpertFull(mass, spin)::evaluate,
                        64,
                        ExpertFull.class),
                counted(
                        "naiveEmission",
                        "closed forms printed one by one, `Math.pow`",
                        new NaiveEmission(mass, spin)::evaluate,
                        20,
                        NaiveEmission.class),
                other(
                        "automaticDifferentiation",
                        "Hipparchus `Gradient` of the metric, numeric inverse",
                        new AutomaticDifferentiation(mass, spin)::evaluate,
                        64),
                other(
                        "finiteDifferences",
                        "central differences of the metric, numeric inverse",
                        new FiniteDifferences(mass, spin)::evaluate,
                        64),
                other(
                        "computerAlgebra",
                        "Symja's numeric evaluator on the closed forms",
                        new ComputerAlgebra(mass, spin)::evaluate,
                        20));
    }

    private static Contender counted(
            String benchmark, String description, PointKernel kernel, int length, Class<?> type) {
        return new Contender(benchmark, description, kernel, length, Optional.of(type));
    }

    private static Contender other(String benchmark, String description, PointKernel kernel, int length) {
        return new Contender(benchmark, description, kernel, length, Optional.empty());
    }
}
