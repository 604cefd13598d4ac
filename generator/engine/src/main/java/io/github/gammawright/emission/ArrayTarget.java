package io.github.gammawright.emission;

/**
 * An array as private methods see it.
 *
 * @param name the argument or field
 * @param offset the argument that says where the kernel's entries start, null where they start at 0
 */
record ArrayTarget(String name, String offset) {

    String element(int slot) {
        return name + "[" + position(slot) + "]";
    }

    String position(int slot) {
        if (offset == null) {
            return Integer.toString(slot);
        }
        return slot == 0 ? offset : offset + " + " + slot;
    }

    /** As it is passed to a method. */
    String argument() {
        return offset == null ? name : name + ", " + offset;
    }
}
