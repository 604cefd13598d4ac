package io.github.gammawright.optimiser;

import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.SamplePoints;

/** Rewires a program by {@link Resubstitution} in several rounds and keeps the cheapest that was seen. */
public final class Optimiser {

    private static final int ROUND = 3000;
    private static final int FREE_VALUES = 60;
    private static final int MOST_MEMBERS = 500;
    private static final double TOLERANCE = 2.5;

    private Optimiser() {}

    /**
     * A program that computes the same outputs at no higher cost.
     *
     * @param steps how many values may be looked at
     */
    public static LoweredProgram optimise(LoweredProgram start, SamplePoints points, long steps, long seed) {
        LoweredProgram best = start;
        LoweredProgram current = start;
        int bestCost = Integer.MAX_VALUE;
        NumericGuard guard = null;
        for (long done = 0, round = 0; done < steps; done += ROUND, round++) {
            Network network = new Network(current);
            guard = new NumericGuard(current.program(), points, TOLERANCE);
            ParameterClosure.extend(network, FREE_VALUES);
            Resubstitution search = new Resubstitution(network, guard, seed + round, MOST_MEMBERS);
            search.run((int) Math.min(ROUND, steps - done));
            current = NetworkWriter.write(network);
            int cost = network.totalCost();
            if (Boolean.getBoolean("trace")) System.out.println("  round "+round+" cost "+cost+" ops "+network.operations()+" size "+network.size+" worst "+guard.worst(network));
            if (cost <= bestCost) {
                best = current;
                bestCost = cost;
            }
        }
        return best;
    }
}
