package io.github.gammawright.emission;

import io.github.gammawright.definition.MetricDefinition.Comparison;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.Arrays;
import java.util.List;

/** The Christoffel symbols of the Schwarzschild metric as a kernel model made by hand. */
final class Schwarzschild {

    private Schwarzschild() {}

    static KernelModel christoffel(Layout layout) {
        TestModel model = new TestModel();
        model.name = "schwarzschild";
        model.title = "Schwarzschild's vacuum outside a spherical mass";
        model.reference = "Schwarzschild (1916)";
        model.className = "SchwarzschildChristoffel";
        model.layout = layout;
        model.coordinates = List.of("t", "r", "theta", "phi");
        model.parameter("M", TestModel.number("1.0"));
        TestProgram p = model.program;
        int r = p.coordinate("r", 1);
        int theta = p.coordinate("theta", 2);
        int mass = p.parameter("M", 0);
        int rs = p.multiply(p.constant(2), mass);
        int f = p.named("f", p.subtract(p.constant(1), p.divide(rs, r)));
        int force = p.divide(mass, p.multiply(r, r));
        int trt = p.divide(force, f);
        int rtt = p.multiply(force, f);
        int inverse = p.divide(p.constant(1), r);
        int sin = p.call(RealFunction.SIN, theta);
        int cos = p.call(RealFunction.COS, theta);
        int rthth = p.negate(p.multiply(r, f));
        int rphph = p.multiply(rthth, p.multiply(sin, sin));
        int thphph = p.negate(p.multiply(sin, cos));
        int phthph = p.divide(cos, sin);
        int[] all = new int[64];
        Arrays.fill(all, -1);
        set(all, 0, 0, 1, trt);
        set(all, 1, 0, 0, rtt);
        set(all, 1, 1, 1, p.negate(trt));
        set(all, 1, 2, 2, rthth);
        set(all, 1, 3, 3, rphph);
        set(all, 2, 1, 2, inverse);
        set(all, 2, 3, 3, thphph);
        set(all, 3, 1, 3, inverse);
        set(all, 3, 2, 3, phthph);
        model.result(Quantity.CHRISTOFFEL, all);
        TestProgram d = model.domain;
        model.condition(d.parameter("M", 0), Comparison.GREATER, d.constant(0), "M > 0");
        model.condition(
                d.coordinate("r", 1), Comparison.GREATER, d.multiply(d.constant(2), d.parameter("M", 0)), "r > 2*M");
        model.conditions.add(new KernelModel.Condition(
                List.of(d.constant(0), d.coordinate("theta", 2), d.pi()),
                List.of(Comparison.LESS, Comparison.LESS),
                "0 < theta < pi"));
        return model.build();
    }

    private static void set(int[] all, int k, int i, int j, int value) {
        all[(k * 4 + i) * 4 + j] = value;
        all[(k * 4 + j) * 4 + i] = value;
    }

    static double[] values(StraightLineProgram program, double mass, double... point) {
        return DoubleInterpreter.run(
                program, symbol -> symbol.kind() == Symbol.Kind.PARAMETER ? mass : point[symbol.index()]);
    }
}
