package io.github.gammawright.emission;

import io.github.gammawright.definition.MetricDefinition.Comparison;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.RealFunction;
import java.util.List;

/**
 * A sphere whose radius is a function of time and latitude that the caller supplies, in several quantities: the model
 * of a class with everything that classes may have.
 */
final class BreathingSphere {

    private BreathingSphere() {}

    static KernelModel model() {
        TestModel model = new TestModel();
        model.name = "breathing-sphere";
        model.title = "A sphere that breathes";
        model.className = "BreathingSphereKernel";
        model.coordinates = List.of("time", "θ");
        model.parameter("size", TestModel.number("2.5")).function("radius", "time", "θ");
        TestProgram p = model.program;
        int radius = p.function("radius", 0, 0, 0);
        int rate = p.function("radius", 0, 1, 0);
        int mixed = p.function("radius", 0, 1, 1);
        int theta = p.coordinate("θ", 1);
        int area = p.named("area", p.multiply(p.parameter("size", 0), p.multiply(radius, radius)));
        int sin = p.call(RealFunction.SIN, theta);
        int slope = p.multiply(p.multiply(rate, mixed), sin);
        int u = p.load(io.github.gammawright.graph.Symbol.Kind.VELOCITY, "time", 0);
        int v = p.load(io.github.gammawright.graph.Symbol.Kind.VELOCITY, "θ", 1);
        model.result(Quantity.METRIC, p.negate(p.constant(1)), slope, slope, area);
        model.result(
                Quantity.GEODESIC_ACCELERATION, p.multiply(slope, p.multiply(u, v)), p.call(RealFunction.ASINH, v));
        TestProgram d = model.domain;
        model.condition(d.parameter("size", 0), Comparison.GREATER, d.constant(0), "size > 0");
        model.condition(
                d.function("radius", 0, 0, 0), Comparison.GREATER_OR_EQUAL, d.constant(1, 10), "radius >= 1/10");
        return model.build();
    }
}
