package io.github.gammawright.verification;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;

/** Classes of the promised shape, written by hand, on which checks are tried. */
final class HandWrittenKernels {

    /** Schwarzschild's symbols in closed form (Misner, Thorne &amp; Wheeler 1973, chapter 31; equation number not checked). */
    private static final String SCHWARZSCHILD = """
            package trial;

            public final class Schwarzschild {
                public static final int DIMENSION = 4;
                public static final int LENGTH = 64;
                private final double M;

                public Schwarzschild(double M) {
                    if (!(M > 0)) {
                        throw new IllegalArgumentException("M");
                    }
                    this.M = M;
                }

                public static int index(int k, int i, int j) {
                    return (k * 4 + i) * 4 + j;
                }

                public boolean inDomain(double[] point) {
                    return point[1] > 2 * M && 0 < point[2] && point[2] < Math.PI;
                }

                public void evaluate(double[] point, double[] result) {
                    double r = point[1];
                    double s = Math.sin(point[2]);
                    double c = Math.cos(point[2]);
                    java.util.Arrays.fill(result, 0);
                    double d = r - 2 * M;
                    set(result, 0, 0, 1, M / (r * d));
                    set(result, 1, 0, 0, M * d / (r * r * r));
                    set(result, 1, 1, 1, -M / (r * d));
                    set(result, 1, 2, 2, -d);
                    set(result, 1, 3, 3, -d * s * s);
                    set(result, 2, 1, 2, 1 / r);
                    set(result, 2, 3, 3, -s * c);
                    set(result, 3, 1, 3, 1 / r);
                    set(result, 3, 2, 3, c / s);
                }

                private static void set(double[] result, int k, int i, int j, double value) {
                    result[index(k, i, j)] = value;
                    result[index(k, j, i)] = value;
                }
            }
            """;

    /** Several quantities, packed, on the sphere; the acceleration takes a velocity. */
    private static final String SPHERE = """
            package trial;

            public final class Sphere {
                public static final int METRIC_LENGTH = 3;
                public static final int CHRISTOFFEL_LENGTH = 6;
                public static final int GEODESIC_ACCELERATION_LENGTH = 2;

                public static int metricIndex(int i, int j) {
                    return Math.max(i, j) * (Math.max(i, j) + 1) / 2 + Math.min(i, j);
                }

                public static int christoffelIndex(int k, int i, int j) {
                    return 3 * k + metricIndex(i, j);
                }

                public static int geodesicAccelerationIndex(int k) {
                    return k;
                }

                public boolean inDomain(double[] point) {
                    return 0 < point[0] && point[0] < Math.PI;
                }

                public void evaluate(
                        double[] point,
                        double[] velocity,
                        double[] metric,
                        double[] christoffel,
                        double[] geodesicAcceleration) {
                    double s = Math.sin(point[0]);
                    double c = Math.cos(point[0]);
                    double u = velocity[0];
                    double v = velocity[1];
                    metric[0] = 1;
                    metric[1] = 0;
                    metric[2] = s * s;
                    java.util.Arrays.fill(christoffel, 0);
                    christoffel[2] = -s * c;
                    christoffel[4] = c / s;
                    geodesicAcceleration[0] = s * c * v * v;
                    geodesicAcceleration[1] = -2 * c / s * u * v;
                }
            }
            """;

    /** The two symbols of the sphere that do not vanish. */
    private static final String SPHERE_NON_ZERO = """
            package trial;

            public final class SphereNonZero {
                public static final int LENGTH = 2;

                public static int index(int k, int i, int j) {
                    if (k == 0 && i == 1 && j == 1) {
                        return 0;
                    }
                    return k == 1 && i + j == 1 ? 1 : -1;
                }

                public boolean inDomain(double[] point) {
                    return 0 < point[0] && point[0] < Math.PI;
                }

                public void evaluate(double[] point, double[] result) {
                    double s = Math.sin(point[0]);
                    double c = Math.cos(point[0]);
                    result[0] = -s * c;
                    result[1] = c / s;
                }
            }
            """;

    private HandWrittenKernels() {}

    static KernelUnderTest schwarzschild() {
        return new KernelUnderTest("trial.Schwarzschild", SCHWARZSCHILD, List.of(Quantity.CHRISTOFFEL), Layout.FULL);
    }

    static KernelUnderTest sphere() {
        return new KernelUnderTest(
                "trial.Sphere",
                SPHERE,
                List.of(Quantity.METRIC, Quantity.CHRISTOFFEL, Quantity.GEODESIC_ACCELERATION),
                Layout.PACKED);
    }

    static KernelUnderTest sphereNonZero() {
        return new KernelUnderTest(
                "trial.SphereNonZero", SPHERE_NON_ZERO, List.of(Quantity.CHRISTOFFEL), Layout.NON_ZERO);
    }

    /** The kernel with a part of its text replaced, which must occur. */
    static KernelUnderTest changed(KernelUnderTest kernel, String from, String to) {
        if (!kernel.source().contains(from)) {
            throw new IllegalArgumentException("there is no " + from);
        }
        return new KernelUnderTest(
                kernel.qualifiedName(),
                kernel.source().replace(from, to),
                kernel.quantities(),
                kernel.layout(),
                kernel.functions());
    }
}
