package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.VisibleText;
import java.util.Locale;

/** Characters that people write in formulas but that expressions do not have, and what to write in their place. */
final class Lookalikes {

    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final String SUBSCRIPTS = "₀₁₂₃₄₅₆₇₈₉";

    private Lookalikes() {}

    /** The character in quotes; of one that may not be recognised also its number. */
    static String describe(int c) {
        String shown = "'" + VisibleText.of(Character.toString(c)) + "'";
        return c < 0x7f ? shown : shown + String.format(Locale.ROOT, " (U+%04X)", c);
    }

    /** What to write instead; a general word where there is nothing better. */
    static String remedy(int c) {
        int superscript = SUPERSCRIPTS.indexOf(c);
        if (superscript >= 0) {
            return "Write ^" + superscript + ".";
        }
        int subscript = SUBSCRIPTS.indexOf(c);
        if (subscript >= 0) {
            return "In a name write " + subscript + " or _" + subscript + ".";
        }
        return switch (c) {
            case '−', '–', '—', '‐', '‑', '﹣', '－' -> "Write the ASCII sign -.";
            case '·', '×', '⋅', '∙', '∗', '•', '⨯', '✕' -> "Write *.";
            case '÷', '∕', '⁄', '⧸', '／', ':' -> "Write /.";
            case '＋' -> "Write the ASCII sign +.";
            case '（', '）', '[', ']', '{', '}', '⟨', '⟩' -> "Group with round parentheses ( ).";
            case '√' -> "Write sqrt(…).";
            case '∛' -> "Write (…)^(1/3).";
            case '|', '‖' -> "For an absolute value write abs(…).";
            case '\'', '′', '″', '’', '‘' -> "A name has no primes: write for example r_prime.";
            case '½' -> "Write (1/2).";
            case '¼' -> "Write (1/4).";
            case '¾' -> "Write (3/4).";
            case '°' -> "Angles are in radians: write *pi/180.";
            case '%' -> "Write *0.01.";
            case '≤', '⩽' -> "Write <=.";
            case '≥', '⩾' -> "Write >=.";
            case '=', '≠', '!' -> "Comparisons are <, <=, > and >=, in conditions only.";
            case '&', '∧', '∨' -> "Write two conditions instead.";
            case '∂' -> "Derivatives are taken for you: write the metric alone.";
            case '∞' -> "Only finite numbers are known.";
            case '.' -> "A number needs a digit: 0.5 or .5.";
            default ->
                "Known are names, numbers, + - * / ^, parentheses, commas between arguments, and in conditions < <="
                        + " > >=.";
        };
    }
}
