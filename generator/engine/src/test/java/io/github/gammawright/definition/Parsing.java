package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceText;
import java.util.Optional;

/** Parses an expression that is a whole text of its own. */
final class Parsing {

    private Parsing() {}

    static Expression parse(String text) {
        return parse(text, Limits.DEFAULT);
    }

    static Expression parse(String text, Limits limits) {
        SourceText source = new SourceText("x", text);
        Diagnostics diagnostics = new Diagnostics(source);
        Optional<Expression> expression =
                new ExpressionParser(limits, diagnostics, name -> Optional.empty()).parse(LocatedText.whole(source));
        diagnostics.throwIfAny();
        return expression.orElseThrow();
    }

    /** What is reported of a wrong expression, in full. */
    static String mistake(String text) {
        try {
            return "parsed as " + ExpressionPrinter.print(parse(text));
        } catch (DefinitionException e) {
            return e.getMessage();
        }
    }
}
