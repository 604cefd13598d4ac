package io.github.gammawright.verification;

/**
 * How thoroughly kernels are checked, and how large an error may be. An error is accepted when it keeps both bounds: the
 * relative one, which anything below {@code limitMultiple / 100} conditioning limits keeps too, and the one in
 * conditioning limits.
 *
 * @param points how many points are drawn from the domain
 * @param edgePoints how many more are pressed against its edges, at most
 * @param seed of the sequence of points
 * @param digits in which the reference computes
 * @param relativeBound the error may be at most this times (|component| + 10⁻³ · the largest component)
 * @param limitMultiple the error may be at most this many conditioning limits of the component
 */
public record CheckSettings(
        int points, int edgePoints, long seed, int digits, double relativeBound, double limitMultiple) {

    /** What is used where nothing else is said. */
    public static final CheckSettings DEFAULT = new CheckSettings(200, 60, 1, 50, 1e-11, 1000);

    public CheckSettings {
        if (points < 1 || edgePoints < 0) {
            throw new IllegalArgumentException("a check needs at least one point, not " + points);
        }
    }

    /** The same with another number of points. */
    public CheckSettings withPoints(int number) {
        return new CheckSettings(number, edgePoints, seed, digits, relativeBound, limitMultiple);
    }

    /** The same with another number of points at edges. */
    public CheckSettings withEdgePoints(int number) {
        return new CheckSettings(points, number, seed, digits, relativeBound, limitMultiple);
    }

    /** The same with another seed. */
    public CheckSettings withSeed(long number) {
        return new CheckSettings(points, edgePoints, number, digits, relativeBound, limitMultiple);
    }
}
