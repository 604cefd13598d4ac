package io.github.gammawright.runtime;

/** The roots of a x² + 2 b x + c. */
final class QuadraticRoots {

    private QuadraticRoots() {}

    /** One root, from the formula that subtracts no nearly equal numbers; NaN or infinite where there is none. */
    static double solve(double a, double b, double c, Root root) {
        if (a == 0) {
            return -c / (2 * b);
        }
        double q = -(b + Math.copySign(Math.sqrt(b * b - a * c), b));
        double first = q / a;
        // Both are zero when q is, and c then as well.
        double second = q == 0 ? first : c / q;
        return root == Root.LARGER ? Math.max(first, second) : Math.min(first, second);
    }
}
