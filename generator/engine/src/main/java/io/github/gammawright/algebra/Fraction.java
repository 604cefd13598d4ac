package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.GenPolynomial;
import java.util.SortedMap;
import org.hipparchus.fraction.BigFraction;

/**
 * coefficient · numerator / Π atom^exponent: an element of a {@link FunctionField}.
 *
 * @param coefficient 0 for zero
 * @param numerator of integer content 1 with a positive leading coefficient; 1 for zero
 * @param denominator positive exponents by the numbers of the field's atoms
 */
record Fraction(BigFraction coefficient, GenPolynomial<BigInteger> numerator, SortedMap<Integer, Integer> denominator) {

    boolean isZero() {
        return coefficient.signum() == 0;
    }
}
