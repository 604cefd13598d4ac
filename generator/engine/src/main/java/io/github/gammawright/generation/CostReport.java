package io.github.gammawright.generation;

import io.github.gammawright.graph.OperationCount;
import java.util.List;

/**
 * The operation counts of a kernel after each stage that made it, in order; the last entry is the kernel as emitted.
 */
public record CostReport(List<Stage> stages) {

    public CostReport {
        stages = List.copyOf(stages);
    }

    /** The count of the kernel as it was emitted. */
    public OperationCount emitted() {
        return stages.get(stages.size() - 1).count();
    }

    /**
     * One stage.
     *
     * @param name what was done
     * @param count the operations that remained
     * @param cost what they cost by the optimiser's model, in additions
     */
    public record Stage(String name, OperationCount count, double cost) {}
}
