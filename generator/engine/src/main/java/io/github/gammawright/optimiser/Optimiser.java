package io.github.gammawright.optimiser;

import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.SamplePoints;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Rewires programs by {@link Resubstitution}: all starts a little, then the most promising ones further. The budget
 * counts looks at values, so that the outcome is the same on every machine.
 */
public final class Optimiser {

    private static final int STEPS_A_ROUND = 3000;
    private static final int FREE_VALUES = 60;
    private static final int MOST_MEMBERS = 500;
    private static final int LARGEST = 25_000;
    private static final int MOST_STARTS = 3;
    private static final double MOST_DEARER = 1.3;

    /** What a program may reach at the guard's points, so that it stays below 4 limits everywhere. */
    private static final double TOLERANCE = 2.5;

    private final SamplePoints points;
    private final long budget;
    private final double tradeOff;
    private long spent;
    private ExactOutputs exact;

    /**
     * An optimiser.
     *
     * @param points where errors are measured
     * @param budget how many values may be looked at as parts of a replacement
     */
    public Optimiser(SamplePoints points, long budget) {
        this(points, budget, 4);
    }

    /**
     * An optimiser that weighs cost against error.
     *
     * @param tradeOff how many times the least error seen a cheaper program may have; below 2 it is the error alone that decides, else all within
     *     2.5 limits count as equally good
     */
    public Optimiser(SamplePoints points, long budget, double tradeOff) {
        this.tradeOff = tradeOff;
        this.points = points;
        this.budget = budget;
    }

    /** A state of the search. */
    private record State(LoweredProgram program, int cost, double error, int start) {}

    /**
     * Orders states: those that keep their digits come before those that do not, and among either the cheap ones first.
     * Where none stays within the tolerance, a multiple of the least error counts as kept, four times it by default.
     */
    private Comparator<State> order(List<State> states) {
        double least = states.stream().mapToDouble(State::error).min().orElse(0);
        double kept = Math.max(tradeOff < 2 ? 0 : TOLERANCE, tradeOff * least);
        return Comparator.comparing((State s) -> s.error() > kept)
                .thenComparingInt(State::cost)
                .thenComparingDouble(State::error);
    }

    /**
     * What came out.
     *
     * @param program the best program
     * @param start the number of the start that it came from
     * @param error its worst error at the guard's points in multiples of the conditioning limit
     */
    public record Outcome(LoweredProgram program, int start, double error) {}

    /**
     * The best program found for some outputs.
     *
     * @param starts programs that all compute these outputs
     */
    public Outcome optimise(List<LoweredProgram> starts) {
        exact = new ExactOutputs(starts.get(0).program(), points);
        List<State> states = new ArrayList<>();
        for (int i = 0; i < starts.size(); i++) {
            Network network = new Network(starts.get(i));
            NumericGuard guard = new NumericGuard(starts.get(i).program(), exact, points, TOLERANCE);
            states.add(new State(starts.get(i), network.totalCost(), guard.reached(), i));
        }
        List<State> seen = new ArrayList<>(states);
        List<State> current = promising(states);
        int width = Math.max(2, current.size());
        for (int generation = 0; spent < budget; generation++) {
            List<State> next = new ArrayList<>();
            for (int i = 0; i < width && spent < budget; i++) {
                State parent = current.get(i % current.size());
                next.add(round(parent, 7919L * generation + i));
            }
            if (next.isEmpty()) {
                break;
            }
            seen.addAll(next);
            seen.sort(order(seen));
            seen = new ArrayList<>(seen.subList(0, Math.min(seen.size(), 4)));
            width = Math.max(2, (width + 1) / 2);
            current = seen;
        }
        State best = seen.stream().min(order(seen)).orElseThrow();
        return new Outcome(best.program(), best.start(), best.error());
    }

    /** The starts that are worth a try: no two alike, none much dearer than the best, few in all. */
    private List<State> promising(List<State> states) {
        List<State> sorted = new ArrayList<>(states);
        sorted.sort(order(states));
        List<State> promising = new ArrayList<>();
        for (State state : sorted) {
            boolean known = promising.stream()
                    .anyMatch(other -> other.program()
                            .program()
                            .instructions()
                            .equals(state.program().program().instructions()));
            boolean dear = !promising.isEmpty()
                    && state.cost() > MOST_DEARER * promising.get(0).cost();
            if (!known && !dear && promising.size() < MOST_STARTS) {
                promising.add(state);
            }
        }
        return promising;
    }

    private State round(State parent, long seed) {
        Network network = new Network(parent.program());
        if (network.size > LARGEST) {
            spent = budget;
            return parent;
        }
        NumericGuard guard = new NumericGuard(parent.program().program(), exact, points, TOLERANCE);
        ParameterClosure.extend(network, FREE_VALUES);
        SplittableRandom random = new SplittableRandom(seed);
        int[] window = Windows.choose(network, random, MOST_MEMBERS);
        Resubstitution search = new Resubstitution(network, guard, random.nextLong(), window, MOST_MEMBERS);
        search.run(STEPS_A_ROUND);
        spent += (long) STEPS_A_ROUND * Math.max(1, window.length);
        return new State(NetworkWriter.write(network), network.totalCost(), guard.reached(), parent.start());
    }
}
