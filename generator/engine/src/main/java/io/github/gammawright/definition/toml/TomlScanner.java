package io.github.gammawright.definition.toml;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourceIndex;
import java.util.ArrayDeque;
import java.util.Deque;

/**
 * Walks over a file before the TOML parser does, for two purposes: nesting that would exhaust the parser's stack is
 * refused, and the mistakes that people make most in a definition (letters beyond ASCII without quotes, a string or
 * bracket left open) are reported where they begin instead of where a parser stumbles over them.
 */
final class TomlScanner {

    /** Of brackets within brackets, and of parts in a dotted key; a definition has four. */
    static final int DEEPEST = 32;

    private static final String TYPOGRAPHIC_QUOTES = "“”„‟‘’‚‛«»";

    private final SourceIndex index;
    private final Diagnostics diagnostics;
    private final Deque<Integer> openBrackets = new ArrayDeque<>();
    private int dots;
    private int arrays;
    private int equalsSign = -1;
    private boolean tooDeep;

    TomlScanner(SourceIndex index, Diagnostics diagnostics) {
        this.index = index;
        this.diagnostics = diagnostics;
    }

    /** Reports what is wrong; whether the parser may have the file. */
    boolean scan() {
        int before = diagnostics.size();
        int offset = 0;
        while (offset < index.length() && !tooDeep) {
            offset = step(offset);
        }
        Integer open = openBrackets.peekLast();
        if (open != null && !tooDeep) {
            boolean square = index.at(open) == '[';
            diagnostics.report(
                    DiagnosticCode.BRACKET_NOT_CLOSED, index.position(open, 1), square ? "[" : "{", square ? "]" : "}");
        }
        return diagnostics.size() == before;
    }

    /** Deals with what stands at the offset and returns where to go on. */
    private int step(int offset) {
        int c = index.at(offset);
        switch (c) {
            case '#' -> {
                return endOfLine(offset);
            }
            case '"', '\'' -> {
                return string(offset, c);
            }
            case '[' -> {
                open(offset);
                arrays += equalsSign >= 0 || arrays > 0 ? 1 : 0;
            }
            case '{' -> {
                open(offset);
                equalsSign = -1;
            }
            case ']' -> {
                openBrackets.pollLast();
                arrays = Math.max(0, arrays - 1);
            }
            case '}' -> openBrackets.pollLast();
            case '.' -> limit(++dots, offset);
            case '=', ',', '\n' -> {
                dots = 0;
                equalsSign = c == '=' ? offset : -1;
            }
            default -> {
                if (c > 0x7f) {
                    return beyondAscii(offset);
                }
            }
        }
        return offset + 1;
    }

    private void open(int offset) {
        openBrackets.addLast(offset);
        limit(openBrackets.size(), offset);
    }

    private void limit(int depth, int offset) {
        if (depth > DEEPEST) {
            tooDeep = true;
            diagnostics.report(DiagnosticCode.TOML_TOO_DEEP, index.position(offset, 1), DEEPEST);
        }
    }

    private int endOfLine(int offset) {
        int end = offset;
        while (end < index.length() && index.at(end) != '\n') {
            end++;
        }
        return end;
    }

    private int string(int start, int quote) {
        boolean multiLine = index.at(start + 1) == quote && index.at(start + 2) == quote;
        int offset = start + (multiLine ? 3 : 1);
        while (offset < index.length()) {
            int c = index.at(offset);
            if (c == '\\' && quote == '"') {
                offset++;
            } else if (c == quote) {
                if (!multiLine) {
                    return offset + 1;
                }
                if (index.at(offset + 1) == quote && index.at(offset + 2) == quote) {
                    return afterQuotes(offset, quote);
                }
            } else if (c == '\n' && !multiLine) {
                break;
            }
            offset++;
        }
        String closing = Character.toString(quote).repeat(multiLine ? 3 : 1);
        diagnostics.report(DiagnosticCode.STRING_NOT_CLOSED, index.position(start, 1), closing);
        return offset;
    }

    /** Two quotes of the text may stand before the three that close it. */
    private int afterQuotes(int offset, int quote) {
        int end = offset + 3;
        while (end < offset + 5 && index.at(end) == quote) {
            end++;
        }
        return end;
    }

    private int beyondAscii(int offset) {
        int c = index.at(offset);
        if (TYPOGRAPHIC_QUOTES.indexOf(c) >= 0) {
            diagnostics.reportWithRemedy(
                    DiagnosticCode.TOML_SYNTAX,
                    index.position(offset, 1),
                    "Use straight quotes: \" or '.",
                    "a typographic quote " + Character.toString(c));
            return endOfLine(offset);
        }
        int from = offset;
        while (isWord(index.at(from - 1))) {
            from--;
        }
        int to = offset + 1;
        while (isWord(index.at(to))) {
            to++;
        }
        diagnostics.report(
                DiagnosticCode.KEY_NOT_QUOTED,
                index.position(from, to - from),
                equalsSign >= 0 || arrays > 0 ? "text" : "key",
                index.text(from, to));
        return to;
    }

    private static boolean isWord(int c) {
        return c == '_'
                || c == '-'
                || (c >= 0
                        && (Character.isLetterOrDigit(c)
                                || Character.getType(c) == Character.NON_SPACING_MARK
                                || Character.getType(c) == Character.COMBINING_SPACING_MARK));
    }
}
