package io.github.gammawright.verification.reference;

import java.util.Arrays;

/**
 * Truncated power series around one point, all in the same variables and the same precision. The first variables are the
 * coordinates of the metric; parameters, velocities and momenta may follow.
 */
final class TaylorRing {

    private final RealArithmetic arithmetic;
    private final RealFunctions functions;
    private final TaylorBasis basis;
    private final int coordinates;

    TaylorRing(RealFunctions functions, TaylorBasis basis, int coordinates) {
        this.arithmetic = functions.arithmetic();
        this.functions = functions;
        this.basis = basis;
        this.coordinates = coordinates;
    }

    RealArithmetic arithmetic() {
        return arithmetic;
    }

    RealFunctions functions() {
        return functions;
    }

    TaylorBasis basis() {
        return basis;
    }

    int order() {
        return basis.order();
    }

    /** The series that has no term at all. */
    Taylor zero() {
        return new Taylor(this, new Real[basis.count(order())], order());
    }

    /** The series of a constant. */
    Taylor constant(Real value) {
        Real[] coefficients = new Real[basis.count(order())];
        coefficients[0] = value;
        return new Taylor(this, coefficients, order());
    }

    /** The series of a variable of which the point of expansion has the given value. */
    Taylor variable(int index, Real value) {
        Real[] coefficients = new Real[basis.count(order())];
        coefficients[0] = value;
        if (order() > 0) {
            coefficients[basis.raised(index, 0)] = Real.ONE;
        }
        return new Taylor(this, coefficients, order());
    }

    /** The series that is undefined in every term. */
    Taylor undefined() {
        Real[] coefficients = new Real[basis.count(order())];
        Arrays.fill(coefficients, Real.UNDEFINED);
        return new Taylor(this, coefficients, order());
    }

    /** Whether a monomial has a coordinate in it. */
    boolean hasCoordinate(int monomial) {
        for (int variable = 0; variable < coordinates; variable++) {
            if (basis.exponent(monomial, variable) != 0) {
                return true;
            }
        }
        return false;
    }
}
