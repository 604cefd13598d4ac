package io.github.gammawright.definition.toml;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourceIndex;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.tomlj.TomlParseError;

/** Puts the TOML parser's messages into our words. */
final class TomlMistakes {

    private static final Pattern UNEXPECTED = Pattern.compile("Unexpected (.+?), expected (.*)", Pattern.DOTALL);
    private static final Pattern DEFINED_BEFORE = Pattern.compile(
            "(.+?) (?:previously|already|is not an? (?:table|array) \\(previously).*line (\\d+).*", Pattern.DOTALL);
    private static final Pattern ESCAPE = Pattern.compile("Invalid escape sequence '(.*)'", Pattern.DOTALL);
    private static final Pattern WORD = Pattern.compile("[A-Za-z(.].*", Pattern.DOTALL);

    private final SourceIndex index;
    private final Diagnostics diagnostics;

    TomlMistakes(SourceIndex index, Diagnostics diagnostics) {
        this.index = index;
        this.diagnostics = diagnostics;
    }

    /** Reports all of them; whether they are only keys given twice, so that the rest can still be looked at. */
    boolean report(List<TomlParseError> errors) {
        boolean onlyDuplicates = true;
        for (TomlParseError error : errors) {
            onlyDuplicates &= report(error);
        }
        return onlyDuplicates;
    }

    private boolean report(TomlParseError error) {
        int offset = index.offset(error.position().line(), error.position().column());
        SourcePosition position = index.position(offset, 1);
        String message = String.valueOf(error.getMessage());
        Matcher before = DEFINED_BEFORE.matcher(message);
        if (before.matches()) {
            diagnostics.report(DiagnosticCode.KEY_DUPLICATE, position, before.group(1), before.group(2));
            return true;
        }
        Matcher escape = ESCAPE.matcher(message);
        Matcher unexpected = UNEXPECTED.matcher(message);
        if (escape.matches()) {
            diagnostics.report(DiagnosticCode.ESCAPE_INVALID, position, escape.group(1));
        } else if (message.startsWith("Invalid unicode escape")) {
            diagnostics.reportWithRemedy(
                    DiagnosticCode.ESCAPE_INVALID,
                    position,
                    "Write \\u and four or \\U and eight hexadecimal digits of a character, or the character itself.",
                    escapeAt(offset));
        } else if (message.contains("is too large") || message.contains("is too small")) {
            diagnostics.report(DiagnosticCode.NUMBER_OUT_OF_RANGE, position);
        } else if (message.startsWith("Empty table key")) {
            diagnostics.reportWithRemedy(
                    DiagnosticCode.TOML_SYNTAX,
                    position,
                    "Put the table's name between the brackets.",
                    "a table without name");
        } else if (unexpected.matches()) {
            diagnostics.reportWithRemedy(
                    DiagnosticCode.TOML_SYNTAX,
                    position,
                    remedy(offset, unexpected.group(2)),
                    found(offset, unexpected.group(1)) + " has no place here");
        } else if (message.startsWith("Invalid")) {
            diagnostics.reportWithRemedy(
                    DiagnosticCode.TOML_SYNTAX,
                    position,
                    "If text is meant, put it in quotes.",
                    "a date or time that does not exist");
        } else {
            diagnostics.reportWithRemedy(
                    DiagnosticCode.TOML_SYNTAX,
                    position,
                    "Compare the line with the TOML 1.0 specification.",
                    "this cannot be read");
        }
        return false;
    }

    private String escapeAt(int offset) {
        int to = offset;
        while (to < offset + 10 && (index.at(to) == '\\' || Character.isLetterOrDigit(Math.max(0, index.at(to))))) {
            to++;
        }
        return index.text(offset, to);
    }

    /** The parser names one character only; people read words. */
    private String found(int offset, String token) {
        if (token.startsWith("end of")) {
            return "the " + token;
        }
        int to = offset;
        while (Character.isLetterOrDigit(Math.max(0, index.at(to))) && to < offset + 40) {
            to++;
        }
        return "'" + index.text(offset, Math.min(index.length(), Math.max(to, offset + 1))) + "'";
    }

    /** What was probably meant, judged by what stands before and what the parser expected. */
    private String remedy(int offset, String expected) {
        String ahead = index.text(offset, Math.min(index.length(), offset + 1));
        if (expected.contains("a boolean")) {
            if (ahead.equals("=")) {
                return "One '=' is enough.";
            }
            if (WORD.matcher(ahead).matches()) {
                return "Put text and expressions in quotes; write truth values as true or false, numbers as 0.5.";
            }
            return "Put a value after the '='.";
        }
        if (expected.equals("=")) {
            return "A key is followed by '=' and its value; a key of several words needs quotes.";
        }
        if (expected.startsWith("a newline")) {
            return "One key and its value to a line; comments begin with '#'.";
        }
        if (expected.contains("a comma")) {
            return "Separate the entries by commas and close the brackets.";
        }
        if (expected.contains("a-z")) {
            return "Here begins a key: letters, digits, '-' and '_', or anything in quotes.";
        }
        return "Expected is " + expected + ".";
    }
}
