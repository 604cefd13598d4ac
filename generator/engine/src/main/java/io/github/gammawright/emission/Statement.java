package io.github.gammawright.emission;

/** A step of a method's body. */
sealed interface Statement {

    /** Computes a value and keeps it in a variable. */
    record Define(int value) implements Statement {}

    /** Writes a value into an entry of an array. */
    record Store(int array, int slot, int value) implements Statement {}

    /** Writes into an entry what an earlier statement wrote for good into another one. */
    record Copy(int array, int slot, int fromArray, int fromSlot) implements Statement {}

    /** Writes zeros into the entries {@code from ≤ slot < to} of an array. */
    record Zero(int array, int from, int to) implements Statement {}
}
