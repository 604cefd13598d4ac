package io.github.gammawright.runtime.swarm;

import io.github.gammawright.runtime.CurveEquation;
import io.github.gammawright.runtime.Domain;
import io.github.gammawright.runtime.StateFunction;
import io.github.gammawright.runtime.orbit.Direction;
import io.github.gammawright.runtime.orbit.Outcome;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

/**
 * Follows one curve after the other until it meets a surface, without allocating: for swarms of rays. What it finds is
 * less exact than a {@link io.github.gammawright.runtime.orbit.Run}, and comes many times faster.
 *
 * <p>A surface that a curve meets twice within one step is not seen. Not for several threads at once.
 */
public final class RayTracer {

    private static final double SMALLEST = 1e-12;

    /** Says of a state on a surface whether the curve ends there. */
    @FunctionalInterface
    public interface Filter {

        /** Whether the curve ends there. */
        boolean ends(double[] state);
    }

    private record Surface(String name, StateFunction function, Direction direction, Filter filter) {}

    private final CurveEquation equation;
    private final DormandPrince method;
    private final List<Surface> given = new ArrayList<>();
    private Surface[] surfaces = {};
    private Domain domain = Domain.ALL;
    private int maxSteps = 100_000;
    private double[] before = {};
    private double[] after = {};
    private final double[] point;
    private final double[] trial;

    private Outcome outcome = Outcome.COMPLETED;
    private int surface = -1;
    private double parameter;
    private int steps;

    /**
     * Prepares a tracer.
     *
     * @param equation the system; needs one for each tracer
     * @param absolute the error that a step may have in an entry of any size
     * @param relative the error beside that, over the size of the entry
     */
    public RayTracer(CurveEquation equation, double absolute, double relative) {
        this.equation = equation;
        this.method = new DormandPrince(equation, absolute, relative);
        this.point = new double[equation.pointDimension()];
        this.trial = new double[equation.getDimension()];
    }

    /** Ends curves where the point leaves a domain. */
    public RayTracer within(Domain allowed) {
        this.domain = Objects.requireNonNull(allowed, "domain");
        return this;
    }

    /** Ends curves where a function goes through zero. */
    public RayTracer until(String name, StateFunction function, Direction direction) {
        return until(name, function, direction, state -> true);
    }

    /** Ends curves where a function goes through zero and a filter says so: a disc with an inner and an outer edge, say. */
    public RayTracer until(String name, StateFunction function, Direction direction, Filter filter) {
        given.add(new Surface(
                Objects.requireNonNull(name, "name"),
                Objects.requireNonNull(function, "function"),
                Objects.requireNonNull(direction, "direction"),
                Objects.requireNonNull(filter, "filter")));
        surfaces = given.toArray(new Surface[0]);
        before = new double[surfaces.length];
        after = new double[surfaces.length];
        return this;
    }

    /** Ends curves after so many steps tried; 100,000 unless said. */
    public RayTracer maxSteps(int number) {
        this.maxSteps = number;
        return this;
    }

    /**
     * Follows a curve.
     *
     * @param from the parameter at the start
     * @param state the state at the start; receives the last one, which is finite and in the domain
     * @param to the parameter at the end, on either side
     * @param firstStep how long the first step is tried; its sign doesn't matter
     * @return why it ended; see also {@link #surface}
     * @throws IllegalArgumentException if the curve would start outside the domain
     */
    public Outcome trace(double from, double[] state, double to, double firstStep) {
        if (!accepts(from, state)) {
            throw new IllegalArgumentException(
                    "the curve would start outside the domain, at " + java.util.Arrays.toString(state));
        }
        double sign = Math.signum(to - from);
        surface = -1;
        steps = 0;
        parameter = from;
        if (sign == 0) {
            return end(Outcome.COMPLETED);
        }
        method.start(from, state, sign * Math.abs(firstStep));
        values(from, state, before);
        while (true) {
            double left = to - method.parameter();
            boolean last = Math.abs(method.step()) >= Math.abs(left);
            if (last) {
                method.step(left);
            }
            if (Math.abs(method.step()) <= SMALLEST * Math.max(1, Math.abs(method.parameter())) && !last) {
                return finish(state, borderAhead(sign) ? Outcome.LEFT_DOMAIN : Outcome.STEP_TOO_SMALL);
            }
            if (steps++ >= maxSteps) {
                return finish(state, Outcome.TOO_MANY_EVALUATIONS);
            }
            double error = method.attempt();
            if (!(error <= 1)) {
                method.reject();
                continue;
            }
            double reached = method.parameter() + method.step();
            if (!accepts(reached, method.attempted())) {
                method.reject(0.25);
                continue;
            }
            values(reached, method.attempted(), after);
            if (meets(state)) {
                return outcome;
            }
            double[] kept = before;
            before = after;
            after = kept;
            method.accept();
            if (last) {
                return finish(state, Outcome.COMPLETED);
            }
        }
    }

    private Outcome end(Outcome why) {
        outcome = why;
        return why;
    }

    private Outcome finish(double[] state, Outcome why) {
        System.arraycopy(method.state(), 0, state, 0, state.length);
        parameter = method.parameter();
        return end(why);
    }

    private void values(double at, double[] state, double[] result) {
        for (int s = 0; s < surfaces.length; s++) {
            result[s] = surfaces[s].function().value(at, state);
        }
    }

    /** The first surface in the step that was tried, if there is one; the state there is then put into the array. */
    private boolean meets(double[] state) {
        double first = Double.POSITIVE_INFINITY;
        int which = -1;
        for (int s = 0; s < surfaces.length; s++) {
            boolean increasing = before[s] < 0 && after[s] >= 0;
            boolean decreasing = before[s] > 0 && after[s] <= 0;
            if ((increasing || decreasing) && surfaces[s].direction().accepts(increasing)) {
                double part = root(surfaces[s], before[s], after[s]);
                if (part < first) {
                    method.interpolate(part, trial);
                    if (surfaces[s].filter().ends(trial)) {
                        first = part;
                        which = s;
                    }
                }
            }
        }
        if (which < 0) {
            return false;
        }
        method.interpolate(first, state);
        parameter = method.parameter() + first * method.step();
        surface = which;
        end(Outcome.EVENT);
        return true;
    }

    /** Regula falsi in the variant called Illinois (Dowell &amp; Jarratt 1971), on the interpolated step. */
    private double root(Surface wanted, double atStart, double atEnd) {
        double a = 0;
        double b = 1;
        double fa = atStart;
        double fb = atEnd;
        int side = 0;
        for (int round = 0; round < 60 && b - a > 1e-14; round++) {
            double c = (fa * b - fb * a) / (fa - fb);
            method.interpolate(c, trial);
            double fc = wanted.function().value(method.parameter() + c * method.step(), trial);
            if (fc == 0) {
                return c;
            }
            if (fc > 0 == fb > 0) {
                b = c;
                fb = fc;
                fa = side == -1 ? fa / 2 : fa;
                side = -1;
            } else {
                a = c;
                fa = fc;
                fb = side == 1 ? fb / 2 : fb;
                side = 1;
            }
        }
        return b;
    }

    private boolean accepts(double at, double[] state) {
        double sum = 0;
        for (double value : state) {
            sum += 0 * value;
        }
        if (sum != 0) {
            return false;
        }
        equation.point(at, state, point);
        return domain.contains(point);
    }

    /** Whether the tangent leaves the domain within a millionth of the way, as before a horizon. */
    private boolean borderAhead(double sign) {
        double[] now = method.state();
        double[] rate = new double[now.length];
        equation.derivatives(method.parameter(), now, rate);
        double scale = Math.max(1, Math.abs(method.parameter()));
        for (double part = SMALLEST; part < 1e-6; part *= 2) {
            double move = sign * part * scale;
            for (int i = 0; i < now.length; i++) {
                trial[i] = now[i] + move * rate[i];
            }
            if (!accepts(method.parameter() + move, trial)) {
                return true;
            }
        }
        return false;
    }

    /** Why the last curve ended. */
    public Outcome outcome() {
        return outcome;
    }

    /** The number of the surface that ended the last curve, in the order given; −1 where it was none. */
    public int surface() {
        return surface;
    }

    /** The name of the surface that ended the last curve; empty where it was none. */
    public String surfaceName() {
        return surface < 0 ? "" : surfaces[surface].name();
    }

    /** The parameter where the last curve ended. */
    public double parameter() {
        return parameter;
    }

    /** How many steps were tried for the last curve. */
    public int steps() {
        return steps;
    }
}
