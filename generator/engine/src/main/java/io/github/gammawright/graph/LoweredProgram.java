package io.github.gammawright.graph;

import java.util.Map;

/**
 * A program and what is needed to recognise equal values in it.
 *
 * @param program the program
 * @param atoms the values in the prime field of all instructions that are no arithmetic and no rational constant, by
 *     instruction number; one value for each point
 */
public record LoweredProgram(StraightLineProgram program, Map<Integer, long[]> atoms) {

    public LoweredProgram {
        atoms = java.util.Collections.unmodifiableMap(new java.util.TreeMap<>(atoms));
    }
}
