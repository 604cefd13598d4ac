package io.github.gammawright.verification.reference;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The monomials of up to a total degree in several variables, in graded order, and the tables by which series over them
 * are multiplied and differentiated. The monomials of a lower degree are a prefix, so series of different order share one
 * basis.
 */
final class TaylorBasis {

    private final int variables;
    private final int order;
    /** How many monomials there are of degree at most d. */
    private final int[] counts;

    private final int[] degrees;
    /** products[a][b] is the monomial a · b, for those b that keep it within the order. */
    private final int[][] products;
    /** raised[v][a] is the monomial x_v · a, for those a that keep it within the order. */
    private final int[][] raised;
    /** exponents[a][v] is the exponent of x_v in the monomial a. */
    private final int[][] exponents;

    TaylorBasis(int variables, int order) {
        this.variables = variables;
        this.order = order;
        List<int[]> monomials = new ArrayList<>();
        counts = new int[order + 1];
        for (int degree = 0; degree <= order; degree++) {
            collect(new int[variables], 0, degree, monomials);
            counts[degree] = monomials.size();
        }
        exponents = monomials.toArray(int[][]::new);
        degrees = monomials.stream().mapToInt(e -> Arrays.stream(e).sum()).toArray();
        Map<List<Integer>, Integer> positions = new HashMap<>();
        for (int a = 0; a < exponents.length; a++) {
            positions.put(key(exponents[a]), a);
        }
        products = new int[exponents.length][];
        raised = new int[variables][order == 0 ? 0 : counts[order - 1]];
        for (int a = 0; a < exponents.length; a++) {
            products[a] = new int[counts[order - degrees[a]]];
            for (int b = 0; b < products[a].length; b++) {
                products[a][b] = positions.get(key(sum(exponents[a], exponents[b])));
                if (degrees[a] == 1) {
                    raised[variableOf(a)][b] = products[a][b];
                }
            }
        }
    }

    private static int[] sum(int[] left, int[] right) {
        int[] sum = new int[left.length];
        Arrays.setAll(sum, v -> left[v] + right[v]);
        return sum;
    }

    private static List<Integer> key(int[] exponents) {
        return Arrays.stream(exponents).boxed().toList();
    }

    private static void collect(int[] exponents, int variable, int rest, List<int[]> monomials) {
        if (variable == exponents.length - 1) {
            exponents[variable] = rest;
            monomials.add(exponents.clone());
            return;
        }
        for (int power = rest; power >= 0; power--) {
            exponents[variable] = power;
            collect(exponents, variable + 1, rest - power, monomials);
        }
    }

    private int variableOf(int linearMonomial) {
        int variable = 0;
        while (exponents[linearMonomial][variable] == 0) {
            variable++;
        }
        return variable;
    }

    /** How many variables there are. */
    int variables() {
        return variables;
    }

    /** The greatest total degree. */
    int order() {
        return order;
    }

    /** How many monomials there are of at most the given degree. */
    int count(int degree) {
        return counts[degree];
    }

    /** The total degree of a monomial. */
    int degree(int monomial) {
        return degrees[monomial];
    }

    /** The number of the monomial a · b, whose degree must not exceed the order. */
    int product(int a, int b) {
        return products[a][b];
    }

    /** The number of the monomial x_variable · a, whose degree must not exceed the order. */
    int raised(int variable, int a) {
        return raised[variable][a];
    }

    /** The exponent of a variable in a monomial. */
    int exponent(int monomial, int variable) {
        return exponents[monomial][variable];
    }
}
