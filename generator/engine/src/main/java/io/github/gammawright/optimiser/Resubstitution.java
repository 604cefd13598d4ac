package io.github.gammawright.optimiser;

import io.github.gammawright.graph.PrimeField;
import java.util.Arrays;
import java.util.SplittableRandom;

/**
 * Replaces the way in which one value at a time is computed by a cheaper one, or an equally cheap one, made of one or
 * two operations on other values: the step known from logic synthesis as resubstitution, with equality of functions
 * decided by residues in a prime field and candidates found by hashing. Steps that cost nothing change the network
 * without end, and make the way free for steps that save.
 */
final class Resubstitution {

    private static final PrimeField P = PrimeField.VALUES;
    private static final int NONE = -1;
    private static final double MOST_NOISE = 5;
    /** Where the temperature starts, in units of the modelled cost, and to what share of that it falls. */
    private static final double HOT = 1.5;

    private static final double COLD = 0.05;

    private final Network network;
    private final NumericGuard guard;
    private final SplittableRandom random;
    private final PairTable pairs;
    private final int mostMembers;

    private int[] stamp;
    private boolean[] depends;
    private int now;

    // the best candidate of a step so far
    private double best;
    private double temperature;
    private int outerKind;
    private int outerOther;
    private int innerKind;
    private int innerFirst;
    private int innerSecond;

    /**
     * A search.
     *
     * @param window the values that are replaced and that replacements are made of
     * @param mostMembers up to how many values the window may grow
     */
    Resubstitution(Network network, NumericGuard guard, long seed, int[] window, int mostMembers) {
        this.network = network;
        this.guard = guard;
        this.random = new SplittableRandom(seed);
        this.pairs = new PairTable(network);
        this.mostMembers = mostMembers;
        this.stamp = new int[network.size];
        this.depends = new boolean[network.size];
        for (int v : window) {
            pairs.add(v);
        }
    }

    /** Tries so many steps and tells how many changed the network. */
    int run(int steps) {
        int changes = 0;
        int[] targets = new int[0];
        for (int step = 0, at = 0; step < steps; step++, at++) {
            if (at >= targets.length) {
                targets = shuffledTargets();
                at = 0;
                if (targets.length == 0) {
                    return changes;
                }
            }
            int target = targets[at];
            temperature = HOT * Math.pow(COLD, (double) step / steps);
            if (network.uses[target] > 0 && tryToReplace(target)) {
                changes++;
            }
        }
        return changes;
    }

    private int[] shuffledTargets() {
        int[] targets = new int[pairs.members()];
        int count = 0;
        for (int i = 0; i < targets.length; i++) {
            int v = pairs.member(i);
            if (network.uses[v] > 0 && network.operation[v] >= Network.ADD) {
                targets[count++] = v;
            }
        }
        targets = Arrays.copyOf(targets, count);
        for (int i = count - 1; i > 0; i--) {
            int j = random.nextInt(i + 1);
            int swap = targets[i];
            targets[i] = targets[j];
            targets[j] = swap;
        }
        return targets;
    }

    private boolean tryToReplace(int t) {
        startStep(t);
        int freed = network.cost(t) + network.releaseOperands(t);
        best = Double.POSITIVE_INFINITY;
        long residue = network.residues[0][t];
        for (int i = 0; i < pairs.members(); i++) {
            int w = pairs.member(i);
            long other = network.residues[0][w];
            long inverse = network.inverse[w];
            lookUp(t, freed, PairTable.DIFFERENCE, w, P.subtract(residue, other));
            lookUp(t, freed, PairTable.SUM, w, P.add(residue, other));
            if (other != 0) {
                lookUp(t, freed, PairTable.PRODUCT, w, P.multiply(residue, inverse));
                if (network.divisor[w]) {
                    lookUp(t, freed, PairTable.QUOTIENT, w, P.multiply(residue, other));
                }
                lookUp(t, freed, PairTable.INVERSE_QUOTIENT, w, P.multiply(other, network.inverse[t]));
            }
        }
        boolean changed = best < Double.POSITIVE_INFINITY && replace(t);
        if (!changed) {
            network.acquireOperands(t);
        }
        return changed;
    }

    /**
     * Considers target = w ∘ x for one w and all x of a given residue, known ones and results of one operation.
     *
     * @param kind {@code DIFFERENCE} and {@code SUM}: a sum of w and x with some signs; {@code PRODUCT}: w·x;
     *     {@code QUOTIENT}: x/w; {@code INVERSE_QUOTIENT}: w/x
     */
    private void lookUp(int t, int freed, int kind, int w, long residue) {
        if (residue == 0) {
            return;
        }
        long key = Network.unsigned(residue);
        int outerCost = costOf(kind);
        int known = network.find(key);
        if (known >= 0) {
            boolean possible = kind != PairTable.INVERSE_QUOTIENT || network.divisor[known];
            if (possible && known != t && !dependsOnTarget(known) && !dependsOnTarget(w)) {
                consider(freed, outerCost, kind, w, NONE, known, NONE);
            }
            return;
        }
        if (outerCost + Network.COST_ADD - freed > best + MOST_NOISE * temperature) {
            return;
        }
        // t − w, t + w and t·w are in the table as what they are
        boolean several = kind != PairTable.PRODUCT && kind != PairTable.INVERSE_QUOTIENT;
        for (int place = pairs.first(key, several); place >= 0; place = pairs.next(key, place)) {
            int u = pairs.firstOf(place);
            int v = pairs.secondOf(place);
            boolean possible =
                    kind != PairTable.INVERSE_QUOTIENT || Divisors.isDivisor(network, pairs.kind(place), u, v);
            if (possible && !dependsOnTarget(u) && !dependsOnTarget(v) && !dependsOnTarget(w)) {
                consider(freed, outerCost + costOf(pairs.kind(place)), kind, w, pairs.kind(place), u, v);
            }
        }
    }

    private static int costOf(int kind) {
        return switch (kind) {
            case PairTable.SUM, PairTable.DIFFERENCE -> Network.COST_ADD;
            case PairTable.PRODUCT -> Network.COST_MULTIPLY;
            default -> Network.COST_DIVIDE;
        };
    }

    private void consider(int freed, int operations, int kind, int w, int inner, int u, int v) {
        if (operations - freed > best + MOST_NOISE * temperature) {
            return;
        }
        int added = operations + network.acquire(w) + network.acquire(u);
        if (v >= 0) {
            added += network.acquire(v);
            network.release(v);
        }
        network.release(u);
        network.release(w);
        // the least of costs with Gumbel noise is a draw from the Boltzmann distribution
        double noisy = added - freed - temperature * -Math.log(-Math.log(random.nextDouble()));
        if (noisy < best) {
            best = noisy;
            outerKind = kind;
            outerOther = w;
            innerKind = inner;
            innerFirst = u;
            innerSecond = v;
        }
    }

    /** Rewires the target as the best candidate says, if that holds at all points and loses no digits. */
    private boolean replace(int t) {
        byte oldOperation = network.operation[t];
        int oldLeft = network.left[t];
        int oldRight = network.right[t];
        boolean oldLeftMinus = network.leftMinus[t];
        boolean oldRightMinus = network.rightMinus[t];
        int x = innerFirst;
        boolean fresh = innerKind != NONE;
        if (fresh) {
            x = Wiring.append(network, innerKind, innerFirst, innerSecond);
            if (x < 0) {
                return false;
            }
            ensureCapacity();
        }
        boolean unchanged =
                !fresh && sameOperands(oldLeft, oldRight, outerOther, x) && Wiring.operation(outerKind) == oldOperation;
        if (unchanged || !Wiring.rewire(network, t, outerKind, outerOther, x)) {
            return false;
        }
        network.acquireOperands(t);
        if (!guard.accepts(network, this::dependsOnTarget, temperature * -Math.log(random.nextDouble()))) {
            network.releaseOperands(t);
            network.operation[t] = oldOperation;
            network.left[t] = oldLeft;
            network.right[t] = oldRight;
            network.leftMinus[t] = oldLeftMinus;
            network.rightMinus[t] = oldRightMinus;
            return false;
        }
        if (fresh && pairs.members() < mostMembers) {
            pairs.add(x);
        }
        return true;
    }

    private static boolean sameOperands(int a, int b, int c, int d) {
        return (a == c && b == d) || (a == d && b == c);
    }

    private void startStep(int t) {
        ensureCapacity();
        now++;
        stamp[t] = now;
        depends[t] = true;
    }

    private void ensureCapacity() {
        if (stamp.length < network.size) {
            stamp = Arrays.copyOf(stamp, 2 * network.size);
            depends = Arrays.copyOf(depends, 2 * network.size);
        }
    }

    /** Whether a value is computed, perhaps indirectly, from the target of the present step. */
    private boolean dependsOnTarget(int v) {
        if (stamp[v] == now) {
            return depends[v];
        }
        boolean result = false;
        if (network.operation[v] >= Network.ADD) {
            result = dependsOnTarget(network.left[v]) || dependsOnTarget(network.right[v]);
        } else if (network.operation[v] == Network.ATOM) {
            for (int argument : network.arguments[v]) {
                result |= dependsOnTarget(argument);
            }
        }
        stamp[v] = now;
        depends[v] = result;
        return result;
    }
}
