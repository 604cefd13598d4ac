package io.github.gammawright.algebra;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.ExpressionParser;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceText;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The outside reference is {@link Math}, whose functions are specified to within two units in the last place. */
class NumericFormulasTest {

    private static Expression parsed(String text) {
        SourceText source = new SourceText("formula", text);
        return new ExpressionParser(new Diagnostics(source))
                .parse(LocatedText.whole(source))
                .orElseThrow();
    }

    @Test
    void givesWhatJavaGives() {
        NumericFormulas formulas = new NumericFormulas(
                List.of("E", "class"),
                List.of(
                        parsed("-E^2/class + 0.5"),
                        parsed("sin(E)*cos(class) - tan(E)"),
                        parsed("asin(E/3) + acos(E/3) + atan(class)"),
                        parsed("sinh(E) - cosh(E)*tanh(class)"),
                        parsed("exp(-E)*log(class)/sqrt(abs(-class))*pi")));
        double x = 1.25;
        double y = 2.5;
        double[] results = new double[5];
        formulas.evaluate(new double[] {x, y}, results);
        double[] expected = {
            -x * x / y + 0.5,
            Math.sin(x) * Math.cos(y) - Math.tan(x),
            Math.asin(x / 3) + Math.acos(x / 3) + Math.atan(y),
            Math.sinh(x) - Math.cosh(x) * Math.tanh(y),
            Math.exp(-x) * Math.log(y) / Math.sqrt(y) * Math.PI
        };
        for (int i = 0; i < expected.length; i++) {
            assertThat(results[i]).as("formula %d", i).isCloseTo(expected[i], within(1e-14));
        }
    }

    @Test
    void refusesWhatItDoesNotKnow() {
        assertThatThrownBy(() -> new NumericFormulas(List.of("x"), List.of(parsed("x + y"))))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("'y'");
        assertThatThrownBy(() -> new NumericFormulas(List.of("x"), List.of(parsed("atan2(x, x)"))))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("'atan2'");
    }
}
