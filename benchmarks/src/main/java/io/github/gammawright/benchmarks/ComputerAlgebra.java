package io.github.gammawright.benchmarks;

import io.github.gammawright.algebra.NumericFormulas;
import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.ExpressionParser;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceText;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * The twenty closed forms of Kerr's connection, parsed once and then evaluated by the computer algebra system's numeric
 * evaluator. Stored as in {@link ExpertNonZero}.
 */
public final class ComputerAlgebra {

    private final NumericFormulas formulas = new NumericFormulas(List.of("M", "a", "r", "theta"), closedForms());
    private final double[] values = new double[4];

    /** Takes the mass and the angular momentum per mass. */
    public ComputerAlgebra(double mass, double spin) {
        values[0] = mass;
        values[1] = spin;
    }

    /**
     * Evaluates all twenty.
     *
     * @param point t, r, θ, φ
     * @param gamma receives the symbols in index order
     */
    public void evaluate(double[] point, double[] gamma) {
        values[2] = point[1];
        values[3] = point[2];
        formulas.evaluate(values, gamma);
    }

    private static List<Expression> closedForms() {
        try (InputStream stream = ComputerAlgebra.class.getResourceAsStream("kerr-closed-forms.txt")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .map(ComputerAlgebra::parsed)
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Expression parsed(String line) {
        SourceText source = new SourceText("kerr-closed-forms.txt", line);
        Diagnostics diagnostics = new Diagnostics(source);
        return new ExpressionParser(diagnostics)
                .parse(LocatedText.whole(source))
                .orElseThrow(() -> new IllegalStateException(line));
    }
}
