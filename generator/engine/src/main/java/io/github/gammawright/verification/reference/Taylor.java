package io.github.gammawright.verification.reference;

import java.util.Arrays;

/**
 * A truncated power series around a point. Immutable.
 *
 * <p>A coefficient that is absent (null) is zero by the structure of the expression: its product with anything, even an
 * undefined number, is absent too, just as the generated code never computes it. A coefficient that merely came out as
 * 0 makes an undefined product with an undefined one.
 */
final class Taylor {

    private final TaylorRing ring;
    private final Real[] coefficients;
    private final int order;
    /** The monomials whose coefficient is present, in graded order. */
    private final int[] present;

    /** The series with these coefficients, absent ones null; the array is kept. */
    Taylor(TaylorRing ring, Real[] coefficients, int order) {
        this.ring = ring;
        this.coefficients = coefficients;
        this.order = order;
        int count = 0;
        for (Real coefficient : coefficients) {
            count += coefficient == null ? 0 : 1;
        }
        this.present = new int[count];
        for (int i = 0, next = 0; i < coefficients.length; i++) {
            if (coefficients[i] != null) {
                present[next++] = i;
            }
        }
    }

    TaylorRing ring() {
        return ring;
    }

    /** The total degree up to which the series is known. */
    int order() {
        return order;
    }

    /** The value at the point of expansion. */
    Real value() {
        return coefficient(0);
    }

    /** The coefficient of a monomial of the basis. */
    Real coefficient(int monomial) {
        return coefficients[monomial] == null ? Real.ZERO : coefficients[monomial];
    }

    /** Whether the series has no term at all. */
    boolean isAbsent() {
        return present.length == 0;
    }

    /** Whether only the constant term is present. */
    boolean isConstant() {
        return present.length == 0 || (present.length == 1 && present[0] == 0);
    }

    /** Whether no term but those in parameters and further inputs is present. */
    boolean isFreeOfCoordinates() {
        for (int monomial : present) {
            if (ring.hasCoordinate(monomial)) {
                return false;
            }
        }
        return true;
    }

    /** The series cut off behind a lower order. */
    Taylor truncated(int lower) {
        if (lower >= order) {
            return this;
        }
        return new Taylor(ring, Arrays.copyOf(coefficients, ring.basis().count(lower)), lower);
    }

    Taylor plus(Taylor other) {
        return combine(other, false);
    }

    Taylor minus(Taylor other) {
        return combine(other, true);
    }

    private Taylor combine(Taylor other, boolean negated) {
        int common = Math.min(order, other.order);
        Real[] sum = Arrays.copyOf(coefficients, ring.basis().count(common));
        for (int monomial : other.present) {
            if (monomial >= sum.length) {
                break;
            }
            Real term = negated ? other.coefficients[monomial].negate() : other.coefficients[monomial];
            sum[monomial] = sum[monomial] == null ? term : ring.arithmetic().add(sum[monomial], term);
        }
        return new Taylor(ring, sum, common);
    }

    Taylor negate() {
        Real[] negated = new Real[coefficients.length];
        for (int monomial : present) {
            negated[monomial] = coefficients[monomial].negate();
        }
        return new Taylor(ring, negated, order);
    }

    Taylor times(Taylor other) {
        TaylorBasis basis = ring.basis();
        RealArithmetic arithmetic = ring.arithmetic();
        int common = Math.min(order, other.order);
        Real[] product = new Real[basis.count(common)];
        for (int a : present) {
            if (a >= product.length) {
                break;
            }
            int end = basis.count(common - basis.degree(a));
            for (int b : other.present) {
                if (b >= end) {
                    break;
                }
                int c = basis.product(a, b);
                Real term = arithmetic.multiply(coefficients[a], other.coefficients[b]);
                product[c] = product[c] == null ? term : arithmetic.add(product[c], term);
            }
        }
        return new Taylor(ring, product, common);
    }

    Taylor times(long factor) {
        Real[] scaled = new Real[coefficients.length];
        for (int monomial : present) {
            scaled[monomial] = ring.arithmetic().multiply(coefficients[monomial], factor);
        }
        return new Taylor(ring, scaled, order);
    }

    Taylor dividedBy(long divisor) {
        Real[] scaled = new Real[coefficients.length];
        for (int monomial : present) {
            scaled[monomial] = ring.arithmetic().divide(coefficients[monomial], divisor);
        }
        return new Taylor(ring, scaled, order);
    }

    /** Half of the series. */
    Taylor half() {
        Real[] halves = new Real[coefficients.length];
        for (int monomial : present) {
            halves[monomial] = coefficients[monomial].scaled(-1);
        }
        return new Taylor(ring, halves, order);
    }

    Taylor dividedBy(Taylor divisor) {
        return times(divisor.reciprocal());
    }

    /** 1 / this. */
    Taylor reciprocal() {
        return TaylorFunctions.power(this, Real.of(-1));
    }

    Taylor sqrt() {
        return TaylorFunctions.power(this, Real.of(0.5));
    }

    /** The partial derivative by a variable; known to one order less. */
    Taylor derivative(int variable) {
        TaylorBasis basis = ring.basis();
        Real[] derivative = new Real[basis.count(order - 1)];
        for (int monomial = 0; monomial < derivative.length; monomial++) {
            int raised = basis.raised(variable, monomial);
            if (coefficients[raised] != null) {
                derivative[monomial] =
                        ring.arithmetic().multiply(coefficients[raised], basis.exponent(raised, variable));
            }
        }
        return new Taylor(ring, derivative, order - 1);
    }

    /**
     * f of this series, by Horner's rule.
     *
     * @param outer f_0, f_1, … in f(a + h) = Σ f_k h^k, a the value of this series, at least up to its order
     */
    Taylor composed(Real[] outer) {
        if (isConstant()) {
            return constant(outer[0]);
        }
        Real[] shift = coefficients.clone();
        shift[0] = null;
        Taylor h = new Taylor(ring, shift, order);
        Taylor result = constant(outer[order]);
        for (int k = order - 1; k >= 0; k--) {
            result = result.times(h).plus(constant(outer[k]));
        }
        return result;
    }

    /** The series with another constant term. */
    Taylor withValue(Real value) {
        Real[] changed = coefficients.clone();
        changed[0] = value;
        return new Taylor(ring, changed, order);
    }

    /** A constant, known to the order of this series. */
    private Taylor constant(Real value) {
        Real[] constant = new Real[coefficients.length];
        constant[0] = value;
        return new Taylor(ring, constant, order);
    }
}
