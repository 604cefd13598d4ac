package io.github.gammawright.optimiser;

import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.SamplePoints;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.stream.IntStream;

/**
 * Rewires programs by {@link Resubstitution}: all starts a little, then the most promising ones further. The budget
 * counts looks at values, so that the outcome is the same on every machine; the searches of one generation do not know
 * of each other and run on all cores.
 *
 * <p>Errors are watched at a few points during a search and measured at all points after it. A point where a result
 * turns out to be bad joins those that the later searches watch.
 */
public final class Optimiser {

    private static final int STEPS_A_ROUND = 3000;
    private static final int FREE_VALUES = 60;
    private static final int MOST_MEMBERS = 500;
    private static final int LARGEST = 25_000;
    private static final int MOST_STARTS = 4;
    private static final int WATCHED = 48;
    private static final int MOST_WATCHED = 160;
    private static final int LEARNT_FROM_A_RESULT = 3;
    private static final int SURVIVORS = 4;

    /** Searches that run side by side. */
    private static final int LANES = 2;

    /** The part of the budget in which lineages begin at the starts again and again; the rest goes on with the best. */
    private static final double EXPLORATION = 0.7;

    private static final int SHORTEST_LINEAGE = 3;
    private static final int LINEAGES = 5;
    private static final double MOST_DEARER = 1.3;

    /** What a program may reach at the points, so that it stays below 4 limits everywhere. */
    private static final double TOLERANCE = 3.25;

    /** What an error e times the tolerance costs at each point at first and in the end. */
    private static final double LIGHTEST = 3;

    private static final double HEAVIEST = 8;

    /** What it costs not to stay within the tolerance everywhere. */
    private static final double ANY_ERROR = 24;

    private final SamplePoints points;
    private final long budget;
    private final double tradeOff;
    private long spent;
    private ExactOutputs exact;
    private final TreeSet<Integer> watched = new TreeSet<>();

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
     * @param tradeOff how many times the least error seen a cheaper program may have; below 2 it is the error alone
     *     that decides, else all within the tolerance count as equally good
     */
    public Optimiser(SamplePoints points, long budget, double tradeOff) {
        this.tradeOff = tradeOff;
        this.points = points;
        this.budget = budget;
    }

    /** A state of the search, with the errors at all points, the worst of them, and what all of them cost. */
    private record State(LoweredProgram program, int cost, double[] errors, double error, double penalty, int start) {

        double energy() {
            return cost + penalty;
        }
    }

    /**
     * Orders states: by cost and by what errors beyond the tolerance cost, any at all some operations; or, where
     * accuracy counts more, those first that are close to the least error.
     */
    private Comparator<State> order(List<State> states) {
        Comparator<State> byEnergy = Comparator.comparingDouble(State::energy);
        if (tradeOff >= 2) {
            return byEnergy.thenComparingDouble(State::error);
        }
        double least = states.stream().mapToDouble(State::error).min().orElse(0);
        return Comparator.comparing((State s) -> s.error() > tradeOff * least)
                .thenComparingInt(State::cost)
                .thenComparingDouble(State::error);
    }

    /**
     * What came out.
     *
     * @param program the best program
     * @param start the number of the start that it came from
     * @param error its worst error at the points in multiples of the conditioning limit
     */
    public record Outcome(LoweredProgram program, int start, double error) {}

    /**
     * The best program found for some outputs.
     *
     * @param starts programs that all compute these outputs
     */
    public Outcome optimise(List<LoweredProgram> starts) {
        exact = new ExactOutputs(starts.get(0).program(), points);
        for (int k = 0; k < Math.min(WATCHED, exact.points()); k++) {
            watched.add(k);
        }
        List<State> states = new ArrayList<>();
        for (int i = 0; i < starts.size(); i++) {
            states.add(state(starts.get(i), new Network(starts.get(i)).totalCost(), i));
        }
        List<State> seen = new ArrayList<>(states);
        List<State> promising = promising(states);
        List<State> current = new ArrayList<>();
        int lineages = 0;
        int generation = 0;
        for (int lineage = 0; spent < budget && !promising.isEmpty(); generation++, lineage++) {
            boolean last = spent > EXPLORATION * budget;
            if (last) {
                current = new ArrayList<>(seen.subList(0, Math.min(LANES, seen.size())));
            } else if (current.isEmpty() || lineage >= lineageLength(generation)) {
                current.clear();
                for (int lane = 0; lane < LANES; lane++) {
                    current.add(promising.get(lineages++ % promising.size()));
                }
                lineage = 0;
            }
            List<State> parents = current;
            long seed = 7919L * generation;
            double weight = LIGHTEST + (HEAVIEST - LIGHTEST) * spent / budget;
            List<Round> rounds = IntStream.range(0, LANES)
                    .parallel()
                    .mapToObj(i -> round(parents.get(i % parents.size()), seed + i, weight))
                    .toList();
            List<State> next = new ArrayList<>();
            for (int lane = 0; lane < LANES; lane++) {
                Round round = rounds.get(lane);
                spent += round.looks();
                State parent = parents.get(lane % parents.size());
                next.add(round.result().energy() <= parent.energy() ? round.result() : parent);
                seen.add(round.result());
                learn(round.result());
            }
            current = next;
            seen.sort(order(seen));
            seen = new ArrayList<>(seen.subList(0, Math.min(seen.size(), SURVIVORS)));
        }
        State best = seen.stream().min(order(seen)).orElseThrow();
        return new Outcome(best.program(), best.start(), best.error());
    }

    /** How many generations a lineage lasts, by what the generations so far have cost. */
    private int lineageLength(int generations) {
        long all = budget * generations / Math.max(1, spent);
        return (int) Math.max(SHORTEST_LINEAGE, all / LINEAGES);
    }

    private State state(LoweredProgram program, int cost, int start) {
        double[] errors = exact.errors(program.program());
        double worst = Arrays.stream(errors).max().orElse(0);
        double excess = Arrays.stream(errors)
                .map(error -> NumericGuard.excess(error, TOLERANCE))
                .sum();
        return new State(program, cost, errors, worst, excess > 0 ? ANY_ERROR + HEAVIEST * excess : 0, start);
    }

    /** Watches the points where a result is worst from now on. */
    private void learn(State state) {
        IntStream.range(0, exact.points())
                .filter(k -> state.errors()[k] > TOLERANCE && !watched.contains(k))
                .boxed()
                .sorted(Comparator.comparingDouble(k -> -state.errors()[k]))
                .limit(Math.max(0, Math.min(LEARNT_FROM_A_RESULT, MOST_WATCHED - watched.size())))
                .forEach(watched::add);
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
                    && state.energy() > MOST_DEARER * promising.get(0).energy();
            if (!known && !dear && promising.size() < MOST_STARTS) {
                promising.add(state);
            }
        }
        return promising;
    }

    /** The result of a search and the looks that it took. */
    private record Round(State result, long looks) {}

    private Round round(State parent, long seed, double weight) {
        Network network = new Network(parent.program());
        if (network.size > LARGEST) {
            return new Round(parent, budget);
        }
        int[] watching = watched.stream().mapToInt(Integer::intValue).toArray();
        NumericGuard guard = new NumericGuard(network, exact, watching, TOLERANCE, weight);
        ParameterClosure.extend(network, FREE_VALUES);
        SplittableRandom random = new SplittableRandom(seed);
        int[] window = Windows.choose(network, random, MOST_MEMBERS);
        Resubstitution search = new Resubstitution(network, guard, random.nextLong(), window, MOST_MEMBERS);
        search.run(STEPS_A_ROUND);
        LoweredProgram program = NetworkWriter.write(network);
        return new Round(
                state(program, network.totalCost(), parent.start()), (long) STEPS_A_ROUND * Math.max(1, window.length));
    }
}
