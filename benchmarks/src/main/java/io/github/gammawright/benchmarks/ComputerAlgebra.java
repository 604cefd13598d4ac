package io.github.gammawright.benchmarks;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import org.matheclipse.parser.client.ast.ASTNode;
import org.matheclipse.parser.client.eval.DoubleEvaluator;
import org.matheclipse.parser.client.eval.DoubleVariable;

/**
 * The twenty closed forms of Kerr's connection, parsed once and then evaluated by Symja's numeric evaluator, its fastest
 * way from a formula to a double. Stored as in {@link ExpertNonZero}.
 */
public final class ComputerAlgebra {

    private static final int SYMBOLS = 20;

    private final DoubleEvaluator evaluator = new DoubleEvaluator();
    private final DoubleVariable r = new DoubleVariable(0);
    private final DoubleVariable theta = new DoubleVariable(0);
    private final ASTNode[] formulas = new ASTNode[SYMBOLS];

    /** Takes the mass and the angular momentum per mass. */
    public ComputerAlgebra(double mass, double spin) {
        evaluator.defineVariable("M", new DoubleVariable(mass));
        evaluator.defineVariable("a", new DoubleVariable(spin));
        evaluator.defineVariable("r", r);
        evaluator.defineVariable("x", theta);
        String[] lines = closedForms().split("\n");
        for (int i = 0; i < SYMBOLS; i++) {
            formulas[i] = evaluator.parse(lines[i]);
        }
    }

    /**
     * Evaluates all twenty.
     *
     * @param point t, r, θ, φ
     * @param gamma receives the symbols in index order
     */
    public void evaluate(double[] point, double[] gamma) {
        r.setValue(point[1]);
        theta.setValue(point[2]);
        for (int i = 0; i < SYMBOLS; i++) {
            gamma[i] = evaluator.evaluateNode(formulas[i]);
        }
    }

    private static String closedForms() {
        try (InputStream stream = ComputerAlgebra.class.getResourceAsStream("kerr-closed-forms.txt")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
