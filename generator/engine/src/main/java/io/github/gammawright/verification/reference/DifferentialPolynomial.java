package io.github.gammawright.verification.reference;

import java.util.Arrays;

/**
 * A polynomial of degree at most two in the differentials of the coordinates, its coefficients power series in the
 * coordinates: what an expression of a definition amounts to at a point. Immutable.
 */
final class DifferentialPolynomial {

    private final int dimension;
    /** The terms of degree 0, 1 and 2; null where there are none. The quadratic ones, i ≥ j, are at i(i+1)/2 + j. */
    private final Taylor[][] terms;

    private DifferentialPolynomial(int dimension, Taylor[][] terms) {
        this.dimension = dimension;
        this.terms = terms;
    }

    /** A polynomial without differentials. */
    static DifferentialPolynomial scalar(int dimension, Taylor value) {
        return new DifferentialPolynomial(dimension, new Taylor[][] {{value}, null, null});
    }

    /** The differential of the coordinate with the given index. */
    static DifferentialPolynomial differential(int dimension, int index, TaylorRing ring) {
        Taylor[] linear = new Taylor[dimension];
        for (int i = 0; i < dimension; i++) {
            linear[i] = i == index ? ring.constant(Real.ONE) : ring.zero();
        }
        return new DifferentialPolynomial(dimension, new Taylor[][] {null, linear, null});
    }

    /** Whether no differential is in it. */
    boolean isScalar() {
        return terms[0] != null && isAbsent(1) && isAbsent(2);
    }

    /** The value of an expression that must not contain differentials. */
    Taylor asScalar() {
        if (!isScalar()) {
            throw new IllegalArgumentException("an expression without differentials is needed here");
        }
        return terms[0][0];
    }

    /** The coefficients a_i of a_i dx^i. */
    Taylor[] asLinearForm() {
        return homogeneous(1, "linear");
    }

    /** The symmetric g_ij of g_ij dx^i dx^j; a cross term c dx^i dx^j gives g_ij = g_ji = c/2. */
    Taylor[][] asQuadraticForm() {
        Taylor[] packed = homogeneous(2, "quadratic");
        Taylor[][] form = new Taylor[dimension][dimension];
        for (int i = 0; i < dimension; i++) {
            for (int j = 0; j <= i; j++) {
                Taylor term = packed[i * (i + 1) / 2 + j];
                form[i][j] = i == j ? term : term.half();
                form[j][i] = form[i][j];
            }
        }
        return form;
    }

    private Taylor[] homogeneous(int degree, String kind) {
        for (int other = 0; other <= 2; other++) {
            boolean wanted = other == degree;
            if (wanted ? terms[other] == null : !isAbsent(other)) {
                throw new IllegalArgumentException("the expression is not " + kind + " in the differentials");
            }
        }
        return terms[degree];
    }

    private boolean isAbsent(int degree) {
        return terms[degree] == null || Arrays.stream(terms[degree]).allMatch(Taylor::isAbsent);
    }

    DifferentialPolynomial plus(DifferentialPolynomial other) {
        Taylor[][] sum = terms.clone();
        for (int degree = 0; degree <= 2; degree++) {
            if (sum[degree] == null) {
                sum[degree] = other.terms[degree];
            } else if (other.terms[degree] != null) {
                sum[degree] = sum[degree].clone();
                for (int i = 0; i < sum[degree].length; i++) {
                    sum[degree][i] = sum[degree][i].plus(other.terms[degree][i]);
                }
            }
        }
        return new DifferentialPolynomial(dimension, sum);
    }

    DifferentialPolynomial negate() {
        Taylor[][] negated = new Taylor[3][];
        for (int degree = 0; degree <= 2; degree++) {
            if (terms[degree] != null) {
                negated[degree] = new Taylor[terms[degree].length];
                for (int i = 0; i < terms[degree].length; i++) {
                    negated[degree][i] = terms[degree][i].negate();
                }
            }
        }
        return new DifferentialPolynomial(dimension, negated);
    }

    DifferentialPolynomial times(DifferentialPolynomial other) {
        Taylor[][] product = new Taylor[3][];
        for (int left = 0; left <= 2; left++) {
            for (int right = 0; right <= 2; right++) {
                if (terms[left] == null || other.terms[right] == null) {
                    continue;
                }
                if (left + right > 2) {
                    throw new IllegalArgumentException("a term is of more than second degree in the differentials");
                }
                accumulate(product, left, right, other);
            }
        }
        return new DifferentialPolynomial(dimension, product);
    }

    private void accumulate(Taylor[][] product, int left, int right, DifferentialPolynomial other) {
        int degree = left + right;
        int size = degree == 0 ? 1 : degree == 1 ? dimension : dimension * (dimension + 1) / 2;
        if (product[degree] == null) {
            product[degree] = new Taylor[size];
        }
        for (int a = 0; a < terms[left].length; a++) {
            for (int b = 0; b < other.terms[right].length; b++) {
                int position = left == 1 && right == 1
                        ? Math.max(a, b) * (Math.max(a, b) + 1) / 2 + Math.min(a, b)
                        : left == 0 ? b : a;
                Taylor term = terms[left][a].times(other.terms[right][b]);
                Taylor before = product[degree][position];
                product[degree][position] = before == null ? term : before.plus(term);
            }
        }
    }

    DifferentialPolynomial dividedBy(Taylor divisor) {
        return times(scalar(dimension, divisor.reciprocal()));
    }
}
