package io.github.gammawright.verification;

import java.util.Locale;

/** How the examination of a claim can end. */
public enum ClaimVerdict {
    /** It follows from normal forms, from the structure of the definition, or from the value at one point. */
    PROVED,
    /**
     * What must vanish does so in exact arithmetic at random points of a prime field, which a function that is not zero
     * does with a probability below 10⁻⁴⁰; and it was found true at points of the domain.
     */
    CERTIFIED,
    /** It is true at all points where it was tried; that is all that is known. */
    TESTED,
    /** It is false. */
    REFUTED,
    /** There was no way to try it. */
    NOT_TESTED;

    /** The verdict in words. */
    public String text() {
        return name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
