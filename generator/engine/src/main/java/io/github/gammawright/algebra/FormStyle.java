package io.github.gammawright.algebra;

/** What a form is wanted for. */
public enum FormStyle {
    /** As few operations as possible, the author's abbreviations taken as computed already: 2r² − Σ. */
    CHEAP,
    /** As few terms as possible, and the author's abbreviations only where they save any: r² − a² cos²θ. */
    READABLE
}
