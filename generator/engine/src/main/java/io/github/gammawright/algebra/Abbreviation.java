package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.GenPolynomial;
import io.github.gammawright.graph.Node;
import org.hipparchus.fraction.BigFraction;

/**
 * A value that the author named and that is a polynomial in the generators.
 *
 * @param variable the number of the variable that stands for it in formulas
 * @param coefficient node = coefficient · polynomial
 */
record Abbreviation(Node node, int variable, BigFraction coefficient, GenPolynomial<BigInteger> polynomial) {}
