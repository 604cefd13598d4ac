package io.github.gammawright.benchmarks;

import io.github.gammawright.benchmarks.kernels.KerrFull;
import io.github.gammawright.benchmarks.kernels.KerrNonZero;
import io.github.gammawright.benchmarks.kernels.KerrSharedFull;
import io.github.gammawright.benchmarks.kernels.KerrSharedNonZero;
import io.github.gammawright.runtime.PointKernel;
import java.util.List;

/**
 * One way to compute the connection of Kerr's metric.
 *
 * @param benchmark the method of {@link ChristoffelBenchmark} that measures it
 * @param description what it is, for a table
 * @param kernel gives all 64 symbols row by row, or the twenty that are not zero in index order
 * @param length how many the kernel gives
 * @param operations of an evaluation; empty where there are loops or it is no code of ours
 */
record Contender(String benchmark, String description, PointKernel kernel, int length, String operations) {

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
                new Contender(
                        "sharedNonZero",
                        "generated, `non-zero`, `--trigonometry shared`",
                        new KerrSharedNonZero(mass, spin)::evaluate,
                        20,
                        withSharedTrigonometry(KerrNonZero.class)),
                new Contender(
                        "sharedFull",
                        "generated, `full`, `--trigonometry shared`",
                        new KerrSharedFull(mass, spin)::evaluate,
                        64,
                        withSharedTrigonometry(KerrFull.class)),
                graphAlone(mass, spin),
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
        return new Contender(
                benchmark, description, kernel, length, Operations.of(type).description());
    }

    /** Shared trigonometry changes nothing but whose sine and cosine are called. */
    private static String withSharedTrigonometry(Class<?> plain) {
        return Operations.of(plain).arithmetic() + " + sincos";
    }

    private static Contender graphAlone(double mass, double spin) {
        return new Contender(
                "graphAlone",
                "expression graph as built, no algebra, no optimiser",
                GraphAlone.kernel(mass, spin),
                20,
                new GraphAlone().operations());
    }

    private static Contender other(String benchmark, String description, PointKernel kernel, int length) {
        return new Contender(benchmark, description, kernel, length, "");
    }
}
