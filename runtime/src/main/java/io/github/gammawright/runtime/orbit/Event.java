package io.github.gammawright.runtime.orbit;

import io.github.gammawright.runtime.StateFunction;
import java.util.Objects;

/**
 * Something that takes place where a function goes through zero. An event counts how often it took place and may stop the
 * run. It belongs to one run at a time.
 */
public final class Event {

    /** A function of the state and of its rate. */
    @FunctionalInterface
    public interface Switch {

        /**
         * Evaluates it.
         *
         * @param parameter the curve's parameter
         * @param state as the equation has it; only read
         * @param rate the change of the state as the run goes on: its derivative by the parameter, negated in a run backwards;
         *     only read
         */
        double value(double parameter, double[] state, double[] rate);
    }

    /** What is told of each time that an event takes place. */
    @FunctionalInterface
    public interface Listener {

        /**
         * Takes note.
         *
         * @param parameter the curve's parameter
         * @param state a copy
         */
        void occurred(double parameter, double[] state);
    }

    private final String name;
    private final Switch function;
    private final Direction direction;
    private final boolean needsRate;
    private int stopAfter;
    private Listener listener = (parameter, state) -> {};
    private int count;

    private Event(String name, Switch function, Direction direction, boolean needsRate) {
        this.name = Objects.requireNonNull(name, "name");
        this.function = Objects.requireNonNull(function, "function");
        this.direction = Objects.requireNonNull(direction, "direction");
        this.needsRate = needsRate;
    }

    /** Where a function of the state is zero. */
    public static Event where(String name, StateFunction function, Direction direction) {
        Objects.requireNonNull(function, "function");
        return new Event(name, (parameter, state, rate) -> function.value(parameter, state), direction, false);
    }

    /** Where a function of the state and its rate is zero. */
    public static Event whereRate(String name, Switch function, Direction direction) {
        return new Event(name, function, direction, true);
    }

    /**
     * Where an entry of the state takes a value: a coordinate surface, a radius, or a plane such as θ = π/2.
     *
     * @param index the number of the entry
     * @param value the value
     */
    public static Event surface(String name, int index, double value, Direction direction) {
        return where(name, (parameter, state) -> state[index] - value, direction);
    }

    /** Where an entry of the state, a radius say, is smallest. */
    public static Event closestApproach(String name, int index) {
        return whereRate(name, (parameter, state, rate) -> rate[index], Direction.INCREASING);
    }

    /** Where an entry of the state, a radius say, is largest. */
    public static Event farthestPoint(String name, int index) {
        return whereRate(name, (parameter, state, rate) -> rate[index], Direction.DECREASING);
    }

    /** Stops the run when it takes place. */
    public Event stop() {
        return stopAfter(1);
    }

    /** Stops the run when it takes place for the n-th time. */
    public Event stopAfter(int n) {
        if (n < 1) {
            throw new IllegalArgumentException("an event can't stop a run after " + n + " times");
        }
        this.stopAfter = n;
        return this;
    }

    /** Tells a listener of each time. */
    public Event tell(Listener told) {
        this.listener = Objects.requireNonNull(told, "listener");
        return this;
    }

    /** What it is called. */
    public String name() {
        return name;
    }

    /** How often it took place in the run. */
    public int count() {
        return count;
    }

    Direction direction() {
        return direction;
    }

    boolean needsRate() {
        return needsRate;
    }

    double value(double parameter, double[] state, double[] rate) {
        return function.value(parameter, state, rate);
    }

    void reset() {
        count = 0;
    }

    /** Counts; whether the run is to stop. */
    boolean occurred(double parameter, double[] state) {
        count++;
        listener.occurred(parameter, state);
        return count == stopAfter;
    }
}
