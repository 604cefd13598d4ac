package io.github.gammawright.optimiser;

import io.github.gammawright.graph.PrimeField;

/** Sets operations with the signs that make them true. */
final class Wiring {

    private static final PrimeField P = PrimeField.VALUES;

    private Wiring() {}

    static byte operation(int kind) {
        return switch (kind) {
            case PairTable.SUM, PairTable.DIFFERENCE -> Network.ADD;
            case PairTable.PRODUCT -> Network.MULTIPLY;
            default -> Network.DIVIDE;
        };
    }

    /** Adds the value that an operation on two others gives, or finds it; −1 if it vanishes. */
    static int append(Network network, int kind, int u, int v) {
        long[] value = new long[Network.POINTS];
        for (int k = 0; k < value.length; k++) {
            long a = network.residues[k][u];
            long b = network.residues[k][v];
            if ((kind == PairTable.QUOTIENT && b == 0) || (kind == PairTable.INVERSE_QUOTIENT && a == 0)) {
                return -1;
            }
            value[k] = switch (kind) {
                case PairTable.SUM -> P.add(a, b);
                case PairTable.DIFFERENCE -> P.subtract(a, b);
                case PairTable.PRODUCT -> P.multiply(a, b);
                case PairTable.QUOTIENT -> P.multiply(a, P.inverse(b));
                default -> P.multiply(b, P.inverse(a));
            };
        }
        if (value[0] == 0) {
            return -1;
        }
        boolean minus = Network.isMinus(value[0]);
        if (minus) {
            Network.negate(value);
        }
        int known = network.find(value);
        if (known >= 0) {
            return known;
        }
        int x = kind == PairTable.INVERSE_QUOTIENT ? v : u;
        int y = kind == PairTable.INVERSE_QUOTIENT ? u : v;
        byte operation = operation(kind);
        boolean second = operation == Network.ADD && (kind == PairTable.DIFFERENCE ^ minus);
        int fresh = network.append(operation, x, y, minus, second, value, -1);
        network.divisor[fresh] = Divisors.isDivisor(network, kind, u, v);
        return fresh;
    }

    /** Lets a target be computed from w and x; false, and nothing done, if that is not true at all points. */
    static boolean rewire(Network network, int t, int kind, int w, int x) {
        byte operation = operation(kind);
        int a = kind == PairTable.QUOTIENT ? x : w;
        int b = kind == PairTable.QUOTIENT ? w : x;
        for (int signs = 0; signs < (operation == Network.ADD ? 4 : 2); signs++) {
            boolean minusA = (signs & 1) != 0;
            boolean minusB = (signs & 2) != 0;
            if (holds(network, t, operation, a, b, minusA, minusB)) {
                network.operation[t] = operation;
                network.left[t] = a;
                network.right[t] = b;
                network.leftMinus[t] = minusA;
                network.rightMinus[t] = minusB;
                return true;
            }
        }
        return false;
    }

    private static boolean holds(Network network, int t, byte operation, int a, int b, boolean minusA, boolean minusB) {
        for (int k = 0; k < Network.POINTS; k++) {
            long x = network.residues[k][a];
            long y = network.residues[k][b];
            long value;
            if (operation == Network.ADD) {
                value = P.add(minusA ? P.negate(x) : x, minusB ? P.negate(y) : y);
            } else if (operation == Network.MULTIPLY) {
                value = P.multiply(minusA ? P.negate(x) : x, y);
            } else {
                if (y == 0) {
                    return false;
                }
                value = P.multiply(minusA ? P.negate(x) : x, P.inverse(y));
            }
            if (value != network.residues[k][t]) {
                return false;
            }
        }
        return true;
    }
}
