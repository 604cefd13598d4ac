package io.github.gammawright.benchmarks;

import io.github.gammawright.benchmarks.kernels.KerrHamiltonianFlow;

/** The method of Dormand and Prince (1980; coefficients from memory) as one writes it for one kernel, with fixed steps. */
final class HandWrittenDormandPrince {

    private static final double[][] A = {
        {1.0 / 5},
        {3.0 / 40, 9.0 / 40},
        {44.0 / 45, -56.0 / 15, 32.0 / 9},
        {19372.0 / 6561, -25360.0 / 2187, 64448.0 / 6561, -212.0 / 729},
        {9017.0 / 3168, -355.0 / 33, 46732.0 / 5247, 49.0 / 176, -5103.0 / 18656},
        {35.0 / 384, 0, 500.0 / 1113, 125.0 / 192, -2187.0 / 6784, 11.0 / 84},
    };
    private static final double[] E = {
        71.0 / 57600, 0, -71.0 / 16695, 71.0 / 1920, -17253.0 / 339200, 22.0 / 525, -1.0 / 40
    };

    private final KerrHamiltonianFlow flow;
    private final double[][] k = new double[7][8];
    private final double[] y = new double[8];
    private final double[] x = new double[4];
    private final double[] p = new double[4];

    HandWrittenDormandPrince(KerrHamiltonianFlow flow) {
        this.flow = flow;
    }

    /** Makes steps; the sum of the error estimates plus r. */
    double run(double[] start, double h, int steps) {
        System.arraycopy(start, 0, y, 0, 8);
        double errors = 0;
        for (int step = 0; step < steps; step++) {
            for (int s = 0; s < 7; s++) {
                for (int i = 0; i < 8; i++) {
                    double sum = 0;
                    for (int q = 0; q < s; q++) {
                        sum += A[s - 1][q] * k[q][i];
                    }
                    double value = y[i] + h * sum;
                    if (i < 4) {
                        x[i] = value;
                    } else {
                        p[i - 4] = value;
                    }
                }
                if (s > 0 || step == 0) {
                    flow.evaluate(x, p, k[s]);
                }
            }
            double square = 0;
            for (int i = 0; i < 8; i++) {
                double error = 0;
                for (int q = 0; q < 7; q++) {
                    error += E[q] * k[q][i];
                }
                double end = i < 4 ? x[i] : p[i - 4];
                double scaled = h * error / (1 + Math.max(Math.abs(y[i]), Math.abs(end)));
                square += scaled * scaled;
                y[i] = end;
            }
            double norm = Math.sqrt(square / 8);
            errors += norm + 0 * Math.pow(norm, -0.2);
            double[] first = k[0];
            k[0] = k[6];
            k[6] = first;
        }
        return errors + y[1];
    }
}
