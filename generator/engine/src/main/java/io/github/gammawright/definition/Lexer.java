package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceText;

/** Splits an expression into tokens, one after the other. */
final class Lexer {

    private final SourceText source;
    private final LocatedText text;
    private int at;

    Lexer(SourceText source, LocatedText text) {
        this.source = source;
        this.text = text;
    }

    /** The next token; at the end of the text the end, however often it is asked for. */
    Token next() {
        while (isBlank(text.at(at))) {
            at++;
        }
        int c = text.at(at);
        if (c < 0) {
            return new Token(Token.Kind.END, "", at, at);
        }
        if (isDigit(c) || (c == '.' && isDigit(text.at(at + 1)))) {
            return number();
        }
        if (Names.isStart(c)) {
            return name();
        }
        return switch (c) {
            case '+', '-', '*', '/', '^' -> token(Token.Kind.OPERATOR, 1);
            case '(' -> token(Token.Kind.OPEN, 1);
            case ')' -> token(Token.Kind.CLOSE, 1);
            case ',' -> token(Token.Kind.COMMA, 1);
            case '<', '>' -> token(Token.Kind.COMPARISON, text.at(at + 1) == '=' ? 2 : 1);
            default ->
                throw mistake(
                        DiagnosticCode.CHARACTER_UNEXPECTED, at, at + 1, Lookalikes.remedy(c), Lookalikes.describe(c));
        };
    }

    private Token token(Token.Kind kind, int length) {
        Token token = new Token(kind, text.text(at, at + length), at, at + length);
        at += length;
        return token;
    }

    private Token name() {
        int from = at;
        while (Names.isPart(text.at(at))) {
            at++;
        }
        String name = Names.normalised(text.text(from, at));
        if (at - from > Names.LONGEST) {
            throw mistake(DiagnosticCode.NAME_INVALID, from, at, null, name, Names.LONGEST);
        }
        return new Token(Token.Kind.NAME, name, from, at);
    }

    private Token number() {
        int from = at;
        skipDigits();
        if (text.at(at) == '.') {
            at++;
            skipDigits();
        }
        int afterMark = at + 1;
        boolean signed = text.at(afterMark) == '+' || text.at(afterMark) == '-';
        if ((text.at(at) == 'e' || text.at(at) == 'E') && isDigit(text.at(signed ? afterMark + 1 : afterMark))) {
            at = signed ? afterMark + 1 : afterMark;
            skipDigits();
        }
        if (text.at(at) == '.' || text.at(at) == '_') {
            while (isDigit(text.at(at)) || text.at(at) == '.' || text.at(at) == '_') {
                at++;
            }
            throw mistake(DiagnosticCode.NUMBER_MALFORMED, from, at, null, text.text(from, at));
        }
        return new Token(Token.Kind.NUMBER, text.text(from, at), from, at);
    }

    private void skipDigits() {
        while (isDigit(text.at(at))) {
            at++;
        }
    }

    private static boolean isDigit(int c) {
        return '0' <= c && c <= '9';
    }

    private static boolean isBlank(int c) {
        return c == ' ' || c == '\t' || c == '\n' || c == '\r' || (c > 0 && Character.isSpaceChar(c));
    }

    private SyntaxMistake mistake(DiagnosticCode code, int from, int to, String remedy, Object... arguments) {
        Diagnostic general = Diagnostic.of(code, source, text.position(from, to), arguments);
        return new SyntaxMistake(
                remedy == null ? general : new Diagnostic(code, source, general.position(), general.message(), remedy));
    }
}
