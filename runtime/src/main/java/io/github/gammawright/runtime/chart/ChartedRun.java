package io.github.gammawright.runtime.chart;

import io.github.gammawright.runtime.orbit.Ending;
import io.github.gammawright.runtime.orbit.Outcome;
import io.github.gammawright.runtime.orbit.Run;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.UnaryOperator;

/**
 * A run through several charts: where an event stops the run in one of them, the state is carried over and goes on in
 * another. Boyer–Lindquist outside and Kerr–Schild inside, for one.
 */
public final class ChartedRun {

    private static final int MAX_CHANGES = 10_000;

    private final List<Leg> legs = new ArrayList<>();
    private final List<Door> doors = new ArrayList<>();

    private record Leg(String chart, Run run) {}

    private record Door(String from, String event, String to, UnaryOperator<double[]> change) {}

    /**
     * How a charted run ended.
     *
     * @param chart the name of the chart that the last state is in
     * @param ending the ending in that chart
     * @param changes how often the chart was changed
     */
    public record Arrival(String chart, Ending ending, int changes) {}

    /** Adds a chart with the run that is to be used in it; the run's events stop where the chart is to be changed. */
    public ChartedRun in(String chart, Run run) {
        legs.add(new Leg(chart, Objects.requireNonNull(run, "run")));
        return this;
    }

    /**
     * Adds a change of charts.
     *
     * @param from the chart that is left
     * @param event the name of the event that stops its run
     * @param to the chart that is entered
     * @param change carries a state over, such as {@link ChartChange#velocityState} of a change of coordinates
     */
    public ChartedRun change(String from, String event, String to, UnaryOperator<double[]> change) {
        doors.add(new Door(from, event, to, Objects.requireNonNull(change, "change")));
        return this;
    }

    /**
     * Follows a state.
     *
     * @param chart the chart it starts in
     * @param from the parameter at the start
     * @param state the state in that chart; only read
     * @param to the parameter at the end
     * @throws IllegalArgumentException if a chart is not known
     * @throws ChartException if a state cannot be carried over
     */
    public Arrival follow(String chart, double from, double[] state, double to) {
        String current = chart;
        double parameter = from;
        double[] now = state;
        for (int changes = 0; ; changes++) {
            Ending ending = run(current).follow(parameter, now, to);
            Door door = ending.outcome() == Outcome.EVENT ? door(current, ending.detail()) : null;
            if (door == null || changes == MAX_CHANGES) {
                return new Arrival(current, ending, changes);
            }
            now = door.change().apply(ending.state());
            parameter = ending.parameter();
            current = door.to();
        }
    }

    private Run run(String chart) {
        for (Leg leg : legs) {
            if (leg.chart().equals(chart)) {
                return leg.run();
            }
        }
        throw new IllegalArgumentException("there is no chart called " + chart);
    }

    private Door door(String from, String event) {
        for (Door door : doors) {
            if (door.from().equals(from) && door.event().equals(event)) {
                return door;
            }
        }
        return null;
    }
}
