package io.github.gammawright.optimiser;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;
import java.util.SplittableRandom;

/** Chooses which values of a network are looked at together: all of a small one, a neighbourhood in a large one. */
final class Windows {

    private Windows() {}

    /** The free values and others up to the given number, grown from a random needed value along uses and operands. */
    static int[] choose(Network network, SplittableRandom random, int most) {
        int[] window = new int[network.size];
        int count = 0;
        boolean[] taken = new boolean[network.size];
        if (network.size <= most) {
            for (int v = 0; v < network.size; v++) {
                window[count++] = v;
            }
            return window;
        }
        for (int v = 0; v < network.size; v++) {
            if (network.operation[v] == Network.FREE && count < most / 4) {
                taken[v] = true;
                window[count++] = v;
            }
        }
        List<List<Integer>> neighbours = neighbours(network);
        Deque<Integer> border = new ArrayDeque<>();
        while (count < most) {
            if (border.isEmpty()) {
                int start = random.nextInt(network.size);
                if (!taken[start] && network.uses[start] > 0) {
                    taken[start] = true;
                    border.add(start);
                }
                continue;
            }
            int v = border.poll();
            window[count++] = v;
            for (int neighbour : neighbours.get(v)) {
                if (!taken[neighbour]) {
                    taken[neighbour] = true;
                    border.add(neighbour);
                }
            }
        }
        return Arrays.copyOf(window, count);
    }

    private static List<List<Integer>> neighbours(Network network) {
        List<List<Integer>> neighbours = new ArrayList<>();
        for (int v = 0; v < network.size; v++) {
            neighbours.add(new ArrayList<>());
        }
        for (int v = 0; v < network.size; v++) {
            if (network.uses[v] > 0 && network.operation[v] >= Network.ADD) {
                link(neighbours, v, network.left[v]);
                link(neighbours, v, network.right[v]);
            }
        }
        return neighbours;
    }

    private static void link(List<List<Integer>> neighbours, int a, int b) {
        neighbours.get(a).add(b);
        neighbours.get(b).add(a);
    }
}
