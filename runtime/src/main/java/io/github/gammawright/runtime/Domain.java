package io.github.gammawright.runtime;

/** Where a kernel may be evaluated; {@code kernel::inDomain} of a generated class is one. */
@FunctionalInterface
public interface Domain {

    /** Everywhere. */
    Domain ALL = point -> true;

    /**
     * Whether a point lies inside.
     *
     * @param point the coordinates, one for each dimension; only read
     */
    boolean contains(double[] point);
}
