package io.github.gammawright.runtime.conserved;

import java.util.ArrayList;
import java.util.List;

/**
 * Watches how far constants of the motion move away from their values at the start of a run, and says when one has gone
 * too far. Not for several threads at once.
 */
public final class DriftMonitor {

    private final List<ConservedQuantity> quantities;
    private final double limit;
    private final double[] initial;
    private final double[] last;
    private final double[] worst;
    private final double[] worstAt;
    private boolean started;

    /**
     * What became of one quantity.
     *
     * @param name its name
     * @param initial its value at the start
     * @param last its value when last looked at
     * @param worst the largest change since the start, over |initial| where that is not 0; never negative
     * @param worstAt the parameter at which that was
     */
    public record Drift(String name, double initial, double last, double worst, double worstAt) {}

    /** Watches without a limit. */
    public DriftMonitor(ConservedQuantity... quantities) {
        this(Double.POSITIVE_INFINITY, quantities);
    }

    /**
     * Watches with a limit.
     *
     * @param limit the change that ends a run, relative to the initial value, absolute where that is 0
     * @param quantities what to watch
     */
    public DriftMonitor(double limit, ConservedQuantity... quantities) {
        if (!(limit >= 0)) {
            throw new IllegalArgumentException("a limit can't be " + limit);
        }
        this.quantities = List.of(quantities);
        this.limit = limit;
        this.initial = new double[quantities.length];
        this.last = new double[quantities.length];
        this.worst = new double[quantities.length];
        this.worstAt = new double[quantities.length];
    }

    /** Takes the values of a state as those to keep, and forgets what was before. */
    public void start(double parameter, double[] state) {
        for (int q = 0; q < initial.length; q++) {
            initial[q] = quantities.get(q).function().value(parameter, state);
            last[q] = initial[q];
            worst[q] = Double.isFinite(initial[q]) ? 0 : Double.POSITIVE_INFINITY;
            worstAt[q] = parameter;
        }
        started = true;
    }

    /**
     * Looks at a state; the first one is taken as the start.
     *
     * @return whether all are within the limit; a value that is not a number is not
     */
    public boolean look(double parameter, double[] state) {
        if (!started) {
            start(parameter, state);
        }
        boolean within = true;
        for (int q = 0; q < initial.length; q++) {
            last[q] = quantities.get(q).function().value(parameter, state);
            double scale = initial[q] == 0 ? 1 : Math.abs(initial[q]);
            double change = Math.abs(last[q] - initial[q]) / scale;
            if (!(change <= worst[q])) {
                worst[q] = Double.isNaN(change) ? Double.POSITIVE_INFINITY : change;
                worstAt[q] = parameter;
            }
            within &= worst[q] <= limit;
        }
        return within;
    }

    /** The largest drift of all quantities. */
    public double worst() {
        double result = 0;
        for (double value : worst) {
            result = Math.max(result, value);
        }
        return result;
    }

    /** The quantity with the largest drift; empty text where nothing is watched. */
    public String worstName() {
        int place = -1;
        for (int q = 0; q < worst.length; q++) {
            if (place < 0 || worst[q] > worst[place]) {
                place = q;
            }
        }
        return place < 0 ? "" : quantities.get(place).name();
    }

    /** What became of each quantity, in the order given. */
    public List<Drift> report() {
        List<Drift> result = new ArrayList<>();
        for (int q = 0; q < initial.length; q++) {
            result.add(new Drift(quantities.get(q).name(), initial[q], last[q], worst[q], worstAt[q]));
        }
        return result;
    }
}
