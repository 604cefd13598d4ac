package io.github.gammawright.runtime;

/** Which sign the square of a timelike vector has; Euclidean metrics are {@link #MOSTLY_PLUS} with spacelike vectors. */
public enum Signature {
    /** −+++, the convention of Misner, Thorne &amp; Wheeler (1973). */
    MOSTLY_PLUS,
    /** +−−−, the convention of Landau &amp; Lifshitz (1975). */
    MOSTLY_MINUS;

    /** The square g_ij u^i u^j of a normalised vector: −1, 0 or 1. */
    public int square(Causality causality) {
        int mostlyPlus = switch (causality) {
            case TIMELIKE -> -1;
            case NULL -> 0;
            case SPACELIKE -> 1;
        };
        return this == MOSTLY_PLUS ? mostlyPlus : -mostlyPlus;
    }
}
