package io.github.gammawright.verification;

import java.util.Random;
import org.hipparchus.random.SobolSequenceGenerator;

/**
 * A low-discrepancy sequence in the unit cube: that of Sobol (1967) with the direction numbers of Joe &amp; Kuo (2008), each
 * coordinate with a digital shift by a number that follows from the seed (L'Ecuyer &amp; Lemieux 2002).
 */
final class PointSequence {

    private static final int BITS = 52;

    private final SobolSequenceGenerator generator;
    private final long[] shifts;

    PointSequence(int dimension, long seed) {
        generator = new SobolSequenceGenerator(dimension);
        // The generator of java.util.Random is specified to the last bit: the same points on every machine.
        Random random = new Random(seed);
        shifts = new long[dimension];
        for (int i = 0; i < dimension; i++) {
            shifts[i] = random.nextLong() >>> (Long.SIZE - BITS);
        }
    }

    /** The next point; its coordinates are in [0, 1). */
    double[] next() {
        double[] point = generator.nextVector();
        for (int i = 0; i < point.length; i++) {
            long digits = (long) Math.scalb(point[i], BITS) ^ shifts[i];
            point[i] = Math.scalb((double) digits, -BITS);
        }
        return point;
    }
}
