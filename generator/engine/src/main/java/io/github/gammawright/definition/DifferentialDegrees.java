package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.hipparchus.fraction.BigFraction;

/**
 * Checks that an expression is a form in the differentials: that all of its terms have the same degree in them. Degrees
 * are read off the tree; nothing is multiplied out.
 *
 * <p>A set of degrees is a number whose bit k says whether there is a term of degree k; bit 3 stands for all above.
 */
final class DifferentialDegrees {

    private static final int HIGHEST = 3;
    private static final int DEGREE_0 = 1;

    private final Set<String> differentials;
    private final ConstantCheck constants;
    private final Diagnostics diagnostics;
    private final String remedy;
    private final IdentityHashMap<Expression, Integer> known = new IdentityHashMap<>();
    private boolean sound = true;

    private DifferentialDegrees(
            Set<String> differentials, ConstantCheck constants, Diagnostics diagnostics, String remedy) {
        this.differentials = differentials;
        this.constants = constants;
        this.diagnostics = diagnostics;
        this.remedy = remedy;
    }

    /** Whether the expression is a quadratic form; if not, each term that spoils it is reported. */
    static boolean isQuadratic(
            Expression expression, Set<String> differentials, ConstantCheck constants, Diagnostics diagnostics) {
        String remedy = "Each term is a product of two differentials, with any factor that has none.";
        return new DifferentialDegrees(differentials, constants, diagnostics, remedy).check(expression, 2);
    }

    /** Whether the expression is linear; if not, each term that spoils it is reported. */
    static boolean isLinear(
            Expression expression, Set<String> differentials, ConstantCheck constants, Diagnostics diagnostics) {
        String remedy = "Each term is one differential, with any factor that has none.";
        return new DifferentialDegrees(differentials, constants, diagnostics, remedy).check(expression, 1);
    }

    private boolean check(Expression expression, int degree) {
        degrees(expression);
        if (sound) {
            require(expression, degree);
        }
        return sound;
    }

    /** The set of degrees; reports differentials where they can't stand. */
    private int degrees(Expression expression) {
        Integer before = known.get(expression);
        if (before == null) {
            before = compute(expression);
            known.put(expression, before);
        }
        return before;
    }

    private int compute(Expression expression) {
        if (expression instanceof Expression.Name name) {
            return differentials.contains(name.name()) ? 1 << 1 : DEGREE_0;
        }
        if (expression instanceof Expression.Negation negation) {
            return degrees(negation.operand());
        }
        if (expression instanceof Expression.Call call) {
            call.arguments()
                    .forEach(a -> refuse(a, "the argument of " + call.function().symbol()));
            return DEGREE_0;
        }
        if (expression instanceof Expression.Binary binary) {
            int left = degrees(binary.left());
            return switch (binary.operator()) {
                case ADD, SUBTRACT -> left | degrees(binary.right());
                case MULTIPLY -> product(left, degrees(binary.right()));
                case DIVIDE -> {
                    refuse(binary.right(), "a denominator");
                    yield left;
                }
                case POWER -> {
                    refuse(binary.right(), "an exponent");
                    yield power(binary, left);
                }
            };
        }
        return DEGREE_0;
    }

    private static int product(int left, int right) {
        int product = 0;
        for (int i = 0; i <= HIGHEST; i++) {
            for (int j = 0; j <= HIGHEST; j++) {
                if ((left >> i & right >> j & 1) == 1) {
                    product |= 1 << Math.min(i + j, HIGHEST);
                }
            }
        }
        return product;
    }

    private int power(Expression.Binary binary, int base) {
        if (base == DEGREE_0) {
            return DEGREE_0;
        }
        Optional<Integer> exponent = wholeExponent(binary);
        if (exponent.isEmpty()) {
            refuse(binary.left(), "the base of a power whose exponent is no whole number");
            return DEGREE_0;
        }
        int power = DEGREE_0;
        for (int i = 0; i < Math.min(exponent.get(), HIGHEST); i++) {
            power = product(power, base);
        }
        return power;
    }

    private Optional<Integer> wholeExponent(Expression.Binary power) {
        return constants
                .check(power.right())
                .filter(ConstantCheck.Value::isConstant)
                .map(ConstantCheck.Value::constant)
                .filter(value -> value.getDenominatorAsLong() == 1 && value.compareTo(BigFraction.ZERO) >= 0)
                .map(BigFraction::getNumeratorAsInt);
    }

    private void refuse(Expression expression, String place) {
        Expressions.forEachName(expression, name -> {
            if (differentials.contains(name.name())) {
                sound = false;
                diagnostics.report(DiagnosticCode.DIFFERENTIAL_MISPLACED, name.position(), name.name(), place);
            }
        });
    }

    /** Goes down to the smallest part that is to blame. */
    private void require(Expression expression, int degree) {
        int degrees = degrees(expression);
        if (degrees == 1 << degree) {
            return;
        }
        boolean mixed = Integer.bitCount(degrees) > 1;
        if (mixed && expression instanceof Expression.Negation negation) {
            require(negation.operand(), degree);
        } else if (mixed && expression instanceof Expression.Binary binary) {
            requireOf(binary, degree);
        } else {
            wrong(expression, degree);
        }
    }

    private void requireOf(Expression.Binary binary, int degree) {
        switch (binary.operator()) {
            case ADD, SUBTRACT -> {
                require(binary.left(), degree);
                require(binary.right(), degree);
            }
            case MULTIPLY -> {
                int left = single(degrees(binary.left()));
                int right = single(degrees(binary.right()));
                if (left >= 0 && left <= degree) {
                    require(binary.right(), degree - left);
                } else if (right >= 0 && right <= degree) {
                    require(binary.left(), degree - right);
                } else {
                    wrong(binary, degree);
                }
            }
            case DIVIDE -> require(binary.left(), degree);
            case POWER -> {
                int exponent = wholeExponent(binary).orElse(0);
                if (exponent > 0 && degree % exponent == 0) {
                    require(binary.left(), degree / exponent);
                } else {
                    wrong(binary, degree);
                }
            }
        }
    }

    private static int single(int degrees) {
        return Integer.bitCount(degrees) == 1 ? Integer.numberOfTrailingZeros(degrees) : -1;
    }

    private void wrong(Expression expression, int degree) {
        sound = false;
        List<String> found = new ArrayList<>();
        for (int k = 0; k <= HIGHEST; k++) {
            if ((degrees(expression) >> k & 1) == 1) {
                found.add(k == HIGHEST ? HIGHEST + " or more" : String.valueOf(k));
            }
        }
        diagnostics.reportWithRemedy(
                DiagnosticCode.TERM_DEGREE_WRONG,
                Expressions.start(expression),
                remedy,
                String.join(" and ", found),
                degree);
    }
}
