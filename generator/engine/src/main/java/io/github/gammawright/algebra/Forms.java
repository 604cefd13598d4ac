package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.GenPolynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.hipparchus.fraction.BigFraction;

/** Finds a short factored form of an element of a function field. */
final class Forms {

    private final Conversion conversion;
    private final FunctionField field;
    private final Polynomials polynomials;
    private final List<Abbreviation> abbreviations;
    private final Shapes shapes;

    Forms(Conversion conversion, List<Abbreviation> abbreviations, FormStyle style) {
        this.conversion = conversion;
        this.field = conversion.field();
        this.polynomials = field.polynomials();
        this.abbreviations = abbreviations;
        this.shapes = new Shapes(conversion, abbreviations, style);
    }

    /** Factors with exponents of either sign, and a number. */
    private static final class Product {
        private BigFraction coefficient;
        private final TreeMap<GenPolynomial<BigInteger>, Integer> exponents = new TreeMap<>();

        Product(BigFraction coefficient) {
            this.coefficient = coefficient;
        }

        void multiplyBy(GenPolynomial<BigInteger> factor, int exponent) {
            exponents.merge(factor, exponent, Integer::sum);
            exponents.remove(factor, 0);
        }

        void multiplyBy(BigFraction number, int exponent) {
            coefficient = coefficient.multiply(number.pow(exponent));
        }

        int exponentOf(GenPolynomial<BigInteger> factor) {
            return exponents.getOrDefault(factor, 0);
        }
    }

    FactoredForm find(Fraction value) {
        Product product = new Product(value.coefficient());
        multiplyByFactors(product, value.numerator(), 1);
        value.denominator().forEach((atom, exponent) -> product.multiplyBy(field.atom(atom), -exponent));
        useRelations(product);
        splitMixed(product);
        useRelations(product);
        useAbbreviations(product);
        joinConjugates(product);
        List<FactoredForm.Factor> factors = new ArrayList<>();
        for (Map.Entry<GenPolynomial<BigInteger>, Integer> entry : product.exponents.entrySet()) {
            Shapes.Shape shape = shapes.best(entry.getKey());
            product.multiplyBy(shape.coefficient(), entry.getValue());
            factors.add(new FactoredForm.Factor(shape.formula(), entry.getValue()));
        }
        return new FactoredForm(product.coefficient, factors, conversion.generators(), abbreviations);
    }

    /** Multiplies by the factors of a polynomial and by the number that is missing. */
    private void multiplyByFactors(Product product, GenPolynomial<BigInteger> polynomial, int exponent) {
        SortedMap<GenPolynomial<BigInteger>, Integer> factors =
                field.factoring().factors(polynomial);
        java.math.BigInteger leading = java.math.BigInteger.ONE;
        for (Map.Entry<GenPolynomial<BigInteger>, Integer> factor : factors.entrySet()) {
            product.multiplyBy(factor.getKey(), factor.getValue() * exponent);
            leading = leading.multiply(
                    factor.getKey().leadingBaseCoefficient().val.pow(factor.getValue()));
        }
        product.multiplyBy(new BigFraction(polynomial.leadingBaseCoefficient().val, leading), exponent);
    }

    /** Where g^n = R and R is a factor: (1 − s)(1 + s) becomes c², and √R / R becomes 1/√R. */
    private void useRelations(Product product) {
        List<Generator> generators = conversion.generators().all();
        for (int i = 0; i < generators.size(); i++) {
            FunctionField.Relation relation = field.relationOf(i).orElse(null);
            if (relation == null
                    || !relation.value().denominator().isEmpty()
                    || relation.value().isZero()) {
                continue;
            }
            Product value = new Product(relation.value().coefficient());
            multiplyByFactors(value, relation.value().numerator(), 1);
            int times = timesContained(value, product);
            int own = product.exponentOf(polynomials.variable(i, 1));
            boolean cancels = own != 0 && Integer.signum(own) != Integer.signum(times);
            if (times != 0 && (cancels || generators.get(i) instanceof Generator.Paired)) {
                divide(product, value, times);
                product.multiplyBy(polynomials.variable(i, 1), relation.degree() * times);
            }
        }
    }

    /** How often the factors of one product occur together in another, negative for a denominator. */
    private static int timesContained(Product part, Product whole) {
        Integer times = null;
        for (Map.Entry<GenPolynomial<BigInteger>, Integer> factor : part.exponents.entrySet()) {
            int found = whole.exponentOf(factor.getKey()) / factor.getValue();
            if (times == null || (times > 0 && found > 0)) {
                times = times == null ? found : Math.min(times, found);
            } else {
                times = times < 0 && found < 0 ? Math.max(times, found) : 0;
            }
        }
        return times == null ? 0 : times;
    }

    private static void divide(Product product, Product by, int times) {
        by.exponents.forEach((factor, exponent) -> product.multiplyBy(factor, -exponent * times));
        product.multiplyBy(by.coefficient, -times);
    }

    /** Products that the author named. */
    private void useAbbreviations(Product product) {
        for (Abbreviation abbreviation : abbreviations) {
            if (abbreviation.polynomial().length() < 2) {
                continue;
            }
            Product value = new Product(abbreviation.coefficient());
            multiplyByFactors(value, abbreviation.polynomial(), 1);
            int times = timesContained(value, product);
            if (times != 0) {
                divide(product, value, times);
                product.multiplyBy(polynomials.variable(abbreviation.variable(), 1), times);
            }
        }
    }

    /** A factor with both s and c has factors in one of the two representations that it does not have in the other. */
    private void splitMixed(Product product) {
        for (int i = 0; i < conversion.generators().size(); i++) {
            if (!(conversion.generators().all().get(i) instanceof Generator.Paired)) {
                continue;
            }
            for (GenPolynomial<BigInteger> factor : List.copyOf(product.exponents.keySet())) {
                int exponent = product.exponentOf(factor);
                if (!Polynomials.contains(factor, i) || factor.length() < 2) {
                    continue;
                }
                GenPolynomial<BigInteger> other = shapes.otherRepresentation(factor, i);
                if (field.factoring().factors(other).values().stream()
                                .mapToInt(Integer::intValue)
                                .sum()
                        > 1) {
                    product.multiplyBy(factor, -exponent);
                    multiplyByFactors(product, other, exponent);
                }
            }
        }
    }

    /** Joins factors whose product is no longer than each of them: (r − ac)(r + ac) is r² − a²c². */
    private void joinConjugates(Product product) {
        boolean joined = true;
        while (joined) {
            joined = false;
            List<GenPolynomial<BigInteger>> factors = product.exponents.keySet().stream()
                    .filter(factor -> factor.length() > 1)
                    .toList();
            for (int i = 0; i < factors.size() && !joined; i++) {
                for (int j = 0; j < i && !joined; j++) {
                    joined = join(product, factors.get(i), factors.get(j));
                }
            }
        }
    }

    private boolean join(Product product, GenPolynomial<BigInteger> a, GenPolynomial<BigInteger> b) {
        int exponent = product.exponentOf(a);
        if (exponent != product.exponentOf(b) || a.length() > 8 || a.length() != b.length()) {
            return false;
        }
        GenPolynomial<BigInteger> together = polynomials.multiply(a, b);
        if (together.length() > a.length()) {
            return false;
        }
        product.multiplyBy(a, -exponent);
        product.multiplyBy(b, -exponent);
        product.multiplyBy(together, exponent);
        return true;
    }
}
