package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.ExpVector;
import edu.jas.poly.GenPolynomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.hipparchus.fraction.BigFraction;

/** Finds the cheapest way to write a factor: in sines or in cosines, with the author's abbreviations or without. */
final class Shapes {

    private static final int ROUNDS = 3;
    private static final int KEPT = 6;
    private static final int LONGEST_ABBREVIATION = 12;
    private static final int REPLACEMENTS = 200;

    private final Conversion conversion;
    private final Polynomials polynomials;
    private final FormStyle style;
    private final Horner horner;
    private final List<Rule> rules = new ArrayList<>();
    private final Map<GenPolynomial<BigInteger>, Shape> found = new HashMap<>();

    /** polynomial = coefficient · formula. */
    record Shape(BigFraction coefficient, Formula formula) {}

    /** scale · monomial may be replaced by a polynomial in which an abbreviation occurs. */
    private record Rule(ExpVector monomial, java.math.BigInteger scale, GenPolynomial<BigInteger> by) {}

    /** A polynomial that a number must be taken out of. */
    private record Scaled(BigFraction coefficient, GenPolynomial<BigInteger> polynomial) {}

    Shapes(Conversion conversion, List<Abbreviation> abbreviations, FormStyle style) {
        this.conversion = conversion;
        this.style = style;
        this.polynomials = conversion.field().polynomials();
        this.horner = new Horner(polynomials);
        for (Abbreviation abbreviation : abbreviations) {
            for (GenPolynomial<BigInteger> variant : representations(abbreviation.polynomial())) {
                addRules(abbreviation, variant);
            }
        }
    }

    /** The abbreviation solved for each of its terms that is in none of the others. */
    private void addRules(Abbreviation abbreviation, GenPolynomial<BigInteger> polynomial) {
        if (polynomial.length() < 2 || polynomial.length() > LONGEST_ABBREVIATION) {
            return;
        }
        // numerator · polynomial − denominator · variable = 0
        GenPolynomial<BigInteger> equation = polynomials.add(
                polynomials.scale(polynomial, abbreviation.coefficient().getNumerator()),
                polynomials.scale(
                        polynomials.variable(abbreviation.variable(), 1),
                        abbreviation.coefficient().getDenominator().negate()));
        for (ExpVector term : polynomial.getMap().keySet()) {
            boolean alone = polynomial.getMap().keySet().stream()
                    .noneMatch(other -> !other.equals(term) && other.multipleOf(term));
            if (alone && !term.isZERO()) {
                BigInteger coefficient = equation.coefficient(term);
                GenPolynomial<BigInteger> rest =
                        equation.subtract(coefficient, term).negate();
                rules.add(
                        coefficient.signum() > 0
                                ? new Rule(term, coefficient.val, rest)
                                : new Rule(term, coefficient.val.negate(), rest.negate()));
            }
        }
    }

    /** The cheapest way found. */
    Shape best(GenPolynomial<BigInteger> factor) {
        Shape known = found.get(factor);
        if (known == null) {
            known = search(factor);
            found.put(factor, known);
        }
        return known;
    }

    private Shape search(GenPolynomial<BigInteger> factor) {
        Set<Scaled> seen = new LinkedHashSet<>();
        List<Scaled> frontier = new ArrayList<>();
        for (GenPolynomial<BigInteger> variant : representations(factor)) {
            frontier.add(normal(BigFraction.ONE, variant));
        }
        seen.addAll(frontier);
        for (int round = 0; round < ROUNDS && factor.length() > 2; round++) {
            List<Scaled> next = new ArrayList<>();
            for (Scaled scaled : frontier) {
                for (Rule rule : rules) {
                    apply(rule, scaled).filter(seen::add).ifPresent(next::add);
                }
            }
            // a stable sort, so that ties fall to what was found first
            next.sort(Comparator.comparingInt(scaled -> scaled.polynomial().length()));
            frontier = next.size() > KEPT ? next.subList(0, KEPT) : next;
        }
        Scaled best = null;
        long bestCost = Long.MAX_VALUE;
        Formula bestFormula = null;
        for (Scaled scaled : seen) {
            if (scaled.polynomial().length() > factor.length()) {
                continue;
            }
            Formula formula = horner.write(scaled.polynomial());
            long cost = cost(scaled.polynomial(), formula);
            if (cost < bestCost) {
                best = scaled;
                bestCost = cost;
                bestFormula = formula;
            }
        }
        return new Shape(best.coefficient(), bestFormula);
    }

    private long cost(GenPolynomial<BigInteger> polynomial, Formula formula) {
        long operations = Formula.cost(List.of(formula));
        if (style == FormStyle.CHEAP) {
            return operations;
        }
        long named = polynomial.getMap().keySet().stream().filter(this::isNamed).count();
        return ((long) polynomial.length() << 40) + (named << 20) + operations;
    }

    private boolean isNamed(ExpVector exponents) {
        for (int i = conversion.generators().size(); i < exponents.length(); i++) {
            if (exponents.getVal(i) > 0) {
                return true;
            }
        }
        return false;
    }

    private Scaled normal(BigFraction coefficient, GenPolynomial<BigInteger> polynomial) {
        java.math.BigInteger content = Polynomials.content(polynomial);
        if (polynomial.signum() < 0) {
            content = content.negate();
        }
        return new Scaled(coefficient.multiply(content), polynomials.divideExactly(polynomial, content));
    }

    /** A polynomial with a rule used as often as possible. */
    private Optional<Scaled> apply(Rule rule, Scaled scaled) {
        GenPolynomial<BigInteger> p = scaled.polynomial();
        java.math.BigInteger denominator = java.math.BigInteger.ONE;
        boolean changed = false;
        for (int count = 0; count < REPLACEMENTS; count++) {
            Map.Entry<ExpVector, BigInteger> term = null;
            for (Map.Entry<ExpVector, BigInteger> candidate : p.getMap().entrySet()) {
                if (candidate.getKey().multipleOf(rule.monomial())) {
                    term = candidate;
                    break;
                }
            }
            if (term == null) {
                return changed ? Optional.of(normal(scaled.coefficient().divide(denominator), p)) : Optional.empty();
            }
            changed = true;
            java.math.BigInteger coefficient = term.getValue().val;
            java.math.BigInteger common = coefficient.gcd(rule.scale());
            java.math.BigInteger multiplier = rule.scale().divide(common);
            GenPolynomial<BigInteger> rest = p.subtract(term.getValue(), term.getKey());
            GenPolynomial<BigInteger> replacement = polynomials.multiply(
                    polynomials.scale(rule.by(), coefficient.divide(common)),
                    polynomials.monomial(term.getKey().subtract(rule.monomial())));
            p = polynomials.add(polynomials.scale(rest, multiplier), replacement);
            denominator = denominator.multiply(multiplier);
            if (p.length() > 4 * scaled.polynomial().length() + 8 || p.isZERO()) {
                return Optional.empty();
            }
        }
        return Optional.empty();
    }

    /** A polynomial with s² replaced by 1 − c² for one pair, or by c² − 1 for a hyperbolic one. */
    GenPolynomial<BigInteger> otherRepresentation(GenPolynomial<BigInteger> p, int paired) {
        Generator.Paired pair = (Generator.Paired) conversion.generators().all().get(paired);
        GenPolynomial<BigInteger> square = polynomials.variable(paired, 2);
        GenPolynomial<BigInteger> by = pair.hyperbolic()
                ? polynomials.add(square, polynomials.one().negate())
                : polynomials.add(polynomials.one(), square.negate());
        return polynomials.replacePower(p, pair.partner(), 2, by);
    }

    /** A polynomial in sines, and for each pair where that is no longer, in cosines. */
    private List<GenPolynomial<BigInteger>> representations(GenPolynomial<BigInteger> p) {
        List<GenPolynomial<BigInteger>> all = new ArrayList<>(List.of(p));
        for (int i = 0; i < conversion.generators().size(); i++) {
            if (conversion.generators().all().get(i) instanceof Generator.Paired pair
                    && Polynomials.degree(p, pair.partner()) >= 2) {
                for (GenPolynomial<BigInteger> variant : List.copyOf(all)) {
                    GenPolynomial<BigInteger> other = otherRepresentation(variant, i);
                    if (all.size() < 8 && other.length() <= variant.length() + 2 && !other.isZERO()) {
                        all.add(other);
                    }
                }
            }
        }
        return all;
    }
}
