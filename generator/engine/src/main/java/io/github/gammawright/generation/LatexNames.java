package io.github.gammawright.generation;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;

/** Turns a definition's names into LaTeX: Greek letters, upright words, subscripts; nothing in a name is a command. */
final class LatexNames {

    private static final String[] GREEK = {
        "alpha", "beta", "gamma", "delta", "epsilon", "zeta", "eta", "theta", "iota", "kappa", "lambda", "mu", "nu",
        "xi", "omicron", "pi", "rho", "", "sigma", "tau", "upsilon", "phi", "chi", "psi", "omega"
    };

    /** Capitals that look like Latin ones have no command of their own. */
    private static final String LIKE_LATIN = "ABEZHIKMNOPTX";

    private static final Map<String, String> COMMANDS = commands();

    private LatexNames() {}

    private static Map<String, String> commands() {
        Map<String, String> commands = new HashMap<>();
        for (int i = 0; i < GREEK.length; i++) {
            String small = GREEK[i];
            if (small.isEmpty()) {
                continue;
            }
            String smallCommand = small.equals("omicron") ? "o" : "\\" + small;
            commands.put(small, smallCommand);
            commands.put(Character.toString(0x3B1 + i), smallCommand);
            String capital = Character.toUpperCase(small.charAt(0)) + small.substring(1);
            int codePoint = 0x391 + i;
            String capitalCommand = "\\" + capital;
            int latin = Arrays.asList(
                            "Alpha", "Beta", "Epsilon", "Zeta", "Eta", "Iota", "Kappa", "Mu", "Nu", "Omicron", "Rho",
                            "Tau", "Chi")
                    .indexOf(capital);
            if (latin >= 0) {
                capitalCommand = "\\mathrm{" + LIKE_LATIN.charAt(latin) + "}";
            }
            commands.put(capital, capitalCommand);
            commands.put(Character.toString(codePoint), capitalCommand);
        }
        commands.put("varsigma", "\\varsigma");
        commands.put(Character.toString(0x3C2), "\\varsigma");
        return Map.copyOf(commands);
    }

    /** A name in mathematics mode: {@code Sigma} is Σ, {@code r_plus} has a subscript, {@code mass} is upright. */
    static String of(String name) {
        int mark = name.indexOf('_');
        if (mark > 0 && mark < name.length() - 1) {
            return word(name.substring(0, mark)) + "_{" + subscripts(name.substring(mark + 1)) + "}";
        }
        return word(name);
    }

    private static String subscripts(String rest) {
        StringBuilder text = new StringBuilder();
        for (String part : rest.split("_", -1)) {
            if (!part.isEmpty()) {
                text.append(text.length() == 0 ? "" : "\\,").append(word(part));
            }
        }
        return text.length() == 0 ? escape(rest) : text.toString();
    }

    private static String word(String word) {
        if (COMMANDS.containsKey(word)) {
            return COMMANDS.get(word);
        }
        int digits = word.length();
        while (digits > 0 && Character.isDigit(word.charAt(digits - 1))) {
            digits--;
        }
        if (digits > 0 && digits < word.length()) {
            return word(word.substring(0, digits)) + "_{" + word.substring(digits) + "}";
        }
        boolean plain = word.codePointCount(0, word.length()) == 1 && Character.isLetterOrDigit(word.codePointAt(0));
        return plain || digits == 0 ? escape(word) : "\\mathrm{" + escape(word) + "}";
    }

    /** Text in which no character is special; what is neither letter nor digit stands for itself. */
    private static String escape(String text) {
        StringBuilder escaped = new StringBuilder();
        text.codePoints().forEach(c -> {
            if (Character.isLetterOrDigit(c)) {
                escaped.appendCodePoint(c);
            } else if (c == '_') {
                escaped.append("\\_");
            } else {
                escaped.append("\\mathtt{").append(Integer.toHexString(c)).append('}');
            }
        });
        return escaped.toString();
    }
}
