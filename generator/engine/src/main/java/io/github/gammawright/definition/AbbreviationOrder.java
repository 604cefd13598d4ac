package io.github.gammawright.definition;

import io.github.gammawright.definition.MetricDefinition.Abbreviation;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Iterator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Sorts abbreviations so that each uses only earlier ones, changing the file's order no more than needed: depth-first
 * search (Tarjan 1972), without recursion, since a chain may be long.
 */
final class AbbreviationOrder {

    private static final int MOST_CYCLES = 20;

    private final Map<String, Abbreviation> abbreviations;
    private final List<Abbreviation> sorted = new ArrayList<>();
    private final List<List<String>> cycles = new ArrayList<>();
    private final Set<String> done = new HashSet<>();
    private final Set<String> onPath = new HashSet<>();

    AbbreviationOrder(Map<String, Abbreviation> abbreviations) {
        this.abbreviations = abbreviations;
        abbreviations.keySet().forEach(this::visit);
    }

    /** All abbreviations; if there is a cycle, its members stand in some order. */
    List<Abbreviation> sorted() {
        return sorted;
    }

    /** The first cycles that were met, each beginning with the member that stands first in the file. */
    List<List<String>> cycles() {
        return cycles;
    }

    private void visit(String root) {
        Deque<String> path = new ArrayDeque<>();
        Map<String, Iterator<String>> rest = new HashMap<>();
        enter(root, path, rest);
        while (!path.isEmpty()) {
            String name = path.getLast();
            if (rest.get(name).hasNext()) {
                String next = rest.get(name).next();
                if (onPath.contains(next)) {
                    addCycle(path, next);
                } else {
                    enter(next, path, rest);
                }
            } else {
                path.removeLast();
                onPath.remove(name);
                done.add(name);
                sorted.add(abbreviations.get(name));
            }
        }
    }

    private void enter(String name, Deque<String> path, Map<String, Iterator<String>> rest) {
        if (done.contains(name) || !abbreviations.containsKey(name)) {
            return;
        }
        Set<String> used = new LinkedHashSet<>();
        Expressions.forEachName(abbreviations.get(name).expression(), n -> {
            if (abbreviations.containsKey(n.name())) {
                used.add(n.name());
            }
        });
        path.addLast(name);
        onPath.add(name);
        rest.put(name, used.iterator());
    }

    private void addCycle(Deque<String> path, String first) {
        if (cycles.size() >= MOST_CYCLES) {
            return;
        }
        List<String> members = new ArrayList<>();
        boolean inside = false;
        for (String name : path) {
            inside |= name.equals(first);
            if (inside) {
                members.add(name);
            }
        }
        List<String> fileOrder = new ArrayList<>(abbreviations.keySet());
        int start = 0;
        for (int i = 1; i < members.size(); i++) {
            if (fileOrder.indexOf(members.get(i)) < fileOrder.indexOf(members.get(start))) {
                start = i;
            }
        }
        List<String> turned = new ArrayList<>(members.subList(start, members.size()));
        turned.addAll(members.subList(0, start));
        cycles.add(turned);
    }
}
