package io.github.gammawright.emission;

/** A step of a method's body. */
sealed interface Statement {

    /** Computes a value and keeps it in a variable. */
    record Define(int value) implements Statement {}

    /** Writes a value into an entry of an array. */
    record Store(int array, int slot, int value) implements Statement {}

    /** Writes zeros into the entries {@code from ≤ slot < to} of an array. */
    record Zero(int array, int from, int to) implements Statement {}
}
