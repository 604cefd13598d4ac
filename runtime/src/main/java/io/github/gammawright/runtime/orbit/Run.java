package io.github.gammawright.runtime.orbit;

import io.github.gammawright.runtime.CurveEquation;
import io.github.gammawright.runtime.Domain;
import io.github.gammawright.runtime.conserved.DriftMonitor;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.hipparchus.exception.LocalizedCoreFormats;
import org.hipparchus.exception.MathIllegalArgumentException;
import org.hipparchus.exception.MathIllegalStateException;
import org.hipparchus.ode.ODEIntegrator;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.events.Action;
import org.hipparchus.ode.sampling.ODEStateInterpolator;
import org.hipparchus.ode.sampling.ODEStepHandler;

/**
 * One state followed along its curve, with whatever is to be watched on the way:
 *
 * <pre>{@code
 * var equation = new GeodesicEquation(4, new KerrGeodesicAcceleration(1, 0.9)::evaluate);
 * Event periapsis = Event.closestApproach("periapsis", 1);
 * Ending ending = new Run(equation)
 *         .within(new KerrGeodesicAcceleration(1, 0.9)::inDomain)
 *         .watch(periapsis)
 *         .follow(0, equation.state(point, velocity), 1000);
 * }</pre>
 *
 * <p>Every run ends in a named {@link Outcome}, with a last state that is finite and inside the domain. Towards the end of
 * the domain the steps are cut short until they no longer move the parameter, so that the last state is close to it.
 *
 * <p>Not for several threads at once.
 */
public final class Run {

    /** The smallest step, over the parameter: what needs shorter ones is a singularity. */
    private static final double SMALLEST = 1e-11;

    private static final double CUT = 0.25;
    private static final int STRETCH = 8;

    private final CurveEquation equation;
    private IntegratorFactory factory = IntegratorFactory.standard(StateKind.BODY);
    private Domain domain = Domain.ALL;
    private final List<Event> events = new ArrayList<>();
    private DriftMonitor monitor = new DriftMonitor();
    private TrajectorySink steps;
    private TrajectorySink samples;
    private double sampleInterval;
    private DenseOutput dense;
    private double maximalStep = Double.POSITIVE_INFINITY;
    private double eventTolerance = 1e-13;
    private int maxEvaluations = 50_000_000;

    /** Prepares runs of an equation with the default integrator for bodies. */
    public Run(CurveEquation equation) {
        this.equation = Objects.requireNonNull(equation, "equation");
    }

    /** Takes the default integrator with the tolerances for states of a kind. */
    public Run tolerancesFor(StateKind kind) {
        return integrator(IntegratorFactory.standard(kind));
    }

    /** Takes another integrator. */
    public Run integrator(IntegratorFactory integrators) {
        this.factory = Objects.requireNonNull(integrators, "integrators");
        return this;
    }

    /** Ends where the point leaves a domain; {@code kernel::inDomain} for generated kernels. */
    public Run within(Domain allowed) {
        this.domain = Objects.requireNonNull(allowed, "domain");
        return this;
    }

    /** Looks out for an event; events that stop the run are those made with {@link Event#stop}. */
    public Run watch(Event event) {
        events.add(Objects.requireNonNull(event, "event"));
        return this;
    }

    /** Looks at constants of the motion after each step, and ends the run where the monitor's limit is passed. */
    public Run watch(DriftMonitor driftMonitor) {
        this.monitor = Objects.requireNonNull(driftMonitor, "monitor");
        return this;
    }

    /** Hands on the state after each step of the integrator, and the first one. */
    public Run recordSteps(TrajectorySink sink) {
        this.steps = Objects.requireNonNull(sink, "sink");
        return this;
    }

    /**
     * Hands on states at equal intervals of the parameter, beginning with the first.
     *
     * @param interval positive, whichever way the run goes
     */
    public Run recordSamples(double interval, TrajectorySink sink) {
        if (!(interval > 0)) {
            throw new IllegalArgumentException("an interval can't be " + interval);
        }
        this.sampleInterval = interval;
        this.samples = Objects.requireNonNull(sink, "sink");
        return this;
    }

    /** Keeps all steps in memory, so that each state on the way can be asked for afterwards. */
    public Run recordDense(DenseOutput output) {
        this.dense = Objects.requireNonNull(output, "output");
        return this;
    }

    /** Allows no longer steps. */
    public Run maximalStep(double step) {
        if (!(step > 0)) {
            throw new IllegalArgumentException("a step can't be at most " + step);
        }
        this.maximalStep = step;
        return this;
    }

    /** How close to an event, by the parameter, a run stops; 1e-13 unless said. */
    public Run eventTolerance(double tolerance) {
        if (!(tolerance > 0)) {
            throw new IllegalArgumentException("a tolerance can't be " + tolerance);
        }
        this.eventTolerance = tolerance;
        return this;
    }

    /** Ends after so many evaluations of the right-hand side, at the last step made; 50 million unless said. */
    public Run maxEvaluations(int number) {
        this.maxEvaluations = number;
        return this;
    }

    /**
     * Follows a state.
     *
     * @param from the parameter at the start
     * @param state the state at the start; only read
     * @param to the parameter at the end, on either side
     * @throws IllegalArgumentException if the state is not as long as the equation's, not finite or outside the domain
     */
    public Ending follow(double from, double[] state, double to) {
        if (state.length != equation.getDimension()) {
            throw new IllegalArgumentException(
                    "a state has " + equation.getDimension() + " entries, not " + state.length);
        }
        GuardedEquation guarded = new GuardedEquation(equation, domain);
        if (!guarded.accepts(from, state)) {
            throw new IllegalArgumentException(
                    "the run would start outside the domain, at " + java.util.Arrays.toString(state));
        }
        events.forEach(Event::reset);
        monitor.start(from, state);
        Progress progress = new Progress(from, state.clone(), to >= from);
        progress.first();
        if (from == to) {
            return progress.ending(Outcome.COMPLETED, "", guarded);
        }
        double limit = Math.min(maximalStep, Math.abs(to - from));
        double stretchEnd = to;
        double stepLimit = limit;
        while (true) {
            double smallest = smallestStep(progress.parameter, to);
            if (stepLimit <= smallest) {
                return progress.ending(Outcome.LEFT_DOMAIN, "", guarded);
            }
            Ending ended = stretch(guarded, progress, stretchEnd, smallest, stepLimit);
            if (ended != null) {
                return ended;
            }
            if (progress.left) {
                // Creep on with shorter steps; what came out inside again may go on with long ones.
                double step = Math.min(stepLimit, progress.tried);
                stepLimit = step * CUT;
                double reach = STRETCH * step;
                stretchEnd = Math.abs(to - progress.parameter) <= reach
                        ? to
                        : progress.parameter + (progress.forward ? reach : -reach);
            } else if (stretchEnd == to) {
                return progress.ending(Outcome.COMPLETED, "", guarded);
            } else {
                stretchEnd = to;
                stepLimit = limit;
            }
        }
    }

    private static double smallestStep(double parameter, double to) {
        return SMALLEST * Math.max(Math.abs(parameter), 1e-3 * Math.abs(to - parameter));
    }

    /** Goes on to a parameter; null where the run goes on, be it from outside the domain. */
    private Ending stretch(GuardedEquation guarded, Progress progress, double to, double smallest, double stepLimit) {
        ODEIntegrator integrator = factory.create(smallest, stepLimit);
        int left = maxEvaluations - guarded.evaluations();
        if (left <= 0) {
            return progress.ending(Outcome.TOO_MANY_EVALUATIONS, "", guarded);
        }
        integrator.setMaxEvaluations(left);
        if (stepLimit < Math.abs(to - progress.parameter)) {
            IntegratorFactory.firstStep(integrator, stepLimit);
        }
        List<EventAdapter> adapters = new ArrayList<>();
        for (Event event : events) {
            EventAdapter adapter = new EventAdapter(event, eventTolerance);
            adapters.add(adapter);
            integrator.addEventDetector(adapter);
        }
        integrator.addStepHandler(progress);
        integrator.addStepEndHandler((state, forward) -> progress.drifted ? Action.STOP : Action.CONTINUE);
        if (dense != null) {
            integrator.addStepHandler(dense.stretch());
        }
        progress.left = false;
        try {
            integrator.integrate(guarded, new ODEState(progress.parameter, progress.state), to);
        } catch (GuardedEquation.LeftDomain gone) {
            progress.left = true;
            progress.tried = tried(integrator, stepLimit);
            return null;
        } catch (MathIllegalStateException | MathIllegalArgumentException failure) {
            if (failure.getSpecifier() == LocalizedCoreFormats.MAX_COUNT_EXCEEDED) {
                return progress.ending(Outcome.TOO_MANY_EVALUATIONS, "", guarded);
            }
            return guarded.borderAhead(progress.parameter, progress.state, to, smallest)
                    ? progress.ending(Outcome.LEFT_DOMAIN, "", guarded)
                    : progress.ending(Outcome.STEP_TOO_SMALL, String.valueOf(failure.getMessage()), guarded);
        }
        if (progress.drifted) {
            return progress.ending(Outcome.DRIFT, monitor.worstName(), guarded);
        }
        for (EventAdapter adapter : adapters) {
            if (adapter.stopped()) {
                return progress.ending(Outcome.EVENT, adapter.event().name(), guarded);
            }
        }
        return null;
    }

    private static double tried(ODEIntegrator integrator, double stepLimit) {
        double step = Math.abs(integrator.getCurrentSignedStepsize());
        return step > 0 ? Math.min(step, stepLimit) : stepLimit;
    }

    /** Where a run is, and what it hands on while it goes. */
    private final class Progress implements ODEStepHandler {

        private final boolean forward;
        private final double start;
        private double parameter;
        private double[] state;
        private long nextSample = 1;
        private boolean left;
        private boolean drifted;
        private double tried;

        Progress(double parameter, double[] state, boolean forward) {
            this.start = parameter;
            this.parameter = parameter;
            this.state = state;
            this.forward = forward;
        }

        void first() {
            if (steps != null) {
                steps.accept(parameter, state.clone());
            }
            if (samples != null) {
                samples.accept(parameter, state.clone());
            }
        }

        Ending ending(Outcome outcome, String detail, GuardedEquation guarded) {
            return new Ending(outcome, detail, parameter, state.clone(), guarded.evaluations());
        }

        @Override
        public void handleStep(ODEStateInterpolator interpolator) {
            double end = interpolator.getCurrentState().getTime();
            if (samples != null) {
                double next = start + (forward ? 1 : -1) * nextSample * sampleInterval;
                while (forward ? next <= end : next >= end) {
                    samples.accept(next, interpolator.getInterpolatedState(next).getPrimaryState());
                    nextSample++;
                    next = start + (forward ? 1 : -1) * nextSample * sampleInterval;
                }
            }
            parameter = end;
            state = interpolator.getCurrentState().getPrimaryState();
            if (steps != null) {
                steps.accept(parameter, state.clone());
            }
            drifted = !monitor.look(parameter, state);
        }
    }
}
