package io.github.gammawright.benchmarks;

import io.github.gammawright.benchmarks.kernels.KerrNonZero;
import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.ArrayList;
import java.util.List;

/** How far contenders are from the connection in 50 digits, at the inputs of the benchmarks. */
final class Accuracy {

    /** Errors of symbols that are small beside the largest at the point are seen against this part of the largest. */
    private static final double FLOOR = 1e-3;

    private static final int N = 4;

    private final List<double[]> points = new ArrayList<>();
    private final List<List<Real>> references = new ArrayList<>();

    /** Evaluates the reference at the given number of inputs. */
    Accuracy(int count) {
        ReferenceEvaluator evaluator = new ReferenceEvaluator(
                DefinitionReader.read(Catalogue.standard().find("kerr").orElseThrow()));
        KerrInputs inputs = new KerrInputs();
        for (int i = 0; i < count; i++) {
            inputs.advance();
            points.add(inputs.point());
            references.add(evaluator
                    .at(new double[] {KerrInputs.MASS, KerrInputs.SPIN}, inputs.point())
                    .values(ReferenceQuantity.CHRISTOFFEL));
        }
    }

    /** The worst error of a contender, relative to the symbol and to a thousandth of the largest at the point. */
    double worstError(Contender contender) {
        double worst = 0;
        double[] result = new double[contender.length()];
        for (int i = 0; i < points.size(); i++) {
            contender.kernel().evaluate(points.get(i), result);
            worst = Math.max(worst, worstError(references.get(i), result));
        }
        return worst;
    }

    private static double worstError(List<Real> reference, double[] result) {
        double largest = 0;
        for (Real symbol : reference) {
            largest = Math.max(largest, Math.abs(symbol.toDouble()));
        }
        double worst = 0;
        for (int k = 0; k < N; k++) {
            for (int i = 0; i < N; i++) {
                for (int j = 0; j < N; j++) {
                    int place = (k * N + i) * N + j;
                    int slot = result.length == reference.size() ? place : KerrNonZero.index(k, i, j);
                    double value = slot < 0 ? 0 : result[slot];
                    Real expected = reference.get(place);
                    double scale = Math.abs(expected.toDouble()) + FLOOR * largest;
                    worst = Math.max(worst, Math.abs(expected.distanceTo(value)) / scale);
                }
            }
        }
        return worst;
    }
}
