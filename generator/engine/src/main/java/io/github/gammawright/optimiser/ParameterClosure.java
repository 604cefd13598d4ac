package io.github.gammawright.optimiser;

import io.github.gammawright.graph.PrimeField;

/** Offers further values that depend on parameters alone: products, quotients, sums and differences of those there. */
final class ParameterClosure {

    private static final PrimeField P = PrimeField.VALUES;

    private ParameterClosure() {}

    /** Adds values until the network has so many free ones, simple combinations first. */
    static void extend(Network network, int most) {
        int first = network.size;
        int free = 0;
        int[] known = new int[first];
        for (int v = 0; v < first; v++) {
            if (network.operation[v] == Network.FREE) {
                known[free++] = v;
            }
        }
        int total = free;
        for (int reach = 0; reach < 2 * free && total < most; reach++) {
            for (int i = 0; i <= reach && total < most; i++) {
                int j = reach - i;
                if (i >= free || j >= free || j < i) {
                    continue;
                }
                total += combine(network, PairTable.PRODUCT, known[i], known[j]);
                total += combine(network, PairTable.SUM, known[i], known[j]);
                total += combine(network, PairTable.DIFFERENCE, known[i], known[j]);
            }
        }
    }

    private static int combine(Network network, int kind, int u, int v) {
        long a = network.residues[0][u];
        long b = network.residues[0][v];
        long value =
                kind == PairTable.PRODUCT ? P.multiply(a, b) : kind == PairTable.SUM ? P.add(a, b) : P.subtract(a, b);
        if (value == 0 || network.find(Network.unsigned(value)) >= 0) {
            return 0;
        }
        int x = Wiring.append(network, kind, u, v);
        network.freeOperation[x] = network.operation[x];
        network.operation[x] = Network.FREE;
        return 1;
    }
}
