package io.github.gammawright.benchmarks;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.emission.KernelEmitter;
import io.github.gammawright.emission.KernelModel;
import io.github.gammawright.geometry.Geometry;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.MetricGraph;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.geometry.Shape;
import io.github.gammawright.graph.Lowering;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.runtime.PointKernel;
import io.github.gammawright.verification.InMemoryCompiler;
import java.lang.invoke.LambdaMetafactory;
import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/**
 * Kerr's connection from the expression graph as it is built: equal values computed once and what depends on parameters
 * alone in the constructor, but no algebra and no optimiser. Made, compiled and loaded at run time.
 */
final class GraphAlone {

    private static final String PACKAGE = GraphAlone.class.getPackageName();
    private static final String NAME = "KerrGraphAlone";

    private final StraightLineProgram program;
    private final KernelModel model;

    GraphAlone() {
        MetricDefinition definition =
                DefinitionReader.read(Catalogue.standard().find("kerr").orElseThrow());
        MetricGraph metric = MetricGraphBuilder.build(definition);
        Route route = Route.candidates(metric, List.of(Quantity.CHRISTOFFEL)).get(0);
        List<Node> components = new Geometry(metric, route).components(Quantity.CHRISTOFFEL);
        program = Lowering.lower(metric.graph(), components);
        Shape shape = Quantity.CHRISTOFFEL.shape(definition.dimension());
        List<Integer> slots = new ArrayList<>();
        List<List<Integer>> tuples = new ArrayList<>();
        for (int[] tuple : shape.independentTuples()) {
            int component = shape.fullIndex(tuple);
            if (!components.get(component).isZero()) {
                slots.add(program.outputs().get(component));
                tuples.add(Arrays.stream(tuple).boxed().toList());
            }
        }
        model = new KernelModel(
                definition,
                PACKAGE,
                NAME,
                Layout.NON_ZERO,
                List.of(new KernelModel.Result(Quantity.CHRISTOFFEL, shape, slots, tuples)),
                program,
                new KernelModel.Domain(new StraightLineProgram(List.of(), Map.of(), List.of()), List.of()),
                "none");
    }

    /** Its operations, for a table. */
    String operations() {
        return program.count().operations() + " + cos, sin";
    }

    /** The kernel of a hole, bound as directly as one that is written out. */
    static PointKernel kernel(double mass, double spin) {
        MethodType signature = MethodType.methodType(void.class, double[].class, double[].class);
        try {
            MethodHandles.Lookup lookup = MethodHandles.lookup();
            Object kernel =
                    Compiled.TYPE.getConstructor(double.class, double.class).newInstance(mass, spin);
            MethodHandle evaluate = lookup.findVirtual(Compiled.TYPE, "evaluate", signature);
            return (PointKernel) LambdaMetafactory.metafactory(
                            lookup,
                            "evaluate",
                            MethodType.methodType(PointKernel.class, Compiled.TYPE),
                            signature,
                            evaluate,
                            signature)
                    .getTarget()
                    .invoke(kernel);
        } catch (Throwable e) {
            throw new LinkageError("the kernel of the graph alone cannot be bound", e);
        }
    }

    /** The class, which can be defined beside this one only once. */
    private static final class Compiled {

        static final Class<?> TYPE = define();

        private static Class<?> define() {
            String name = PACKAGE + "." + NAME;
            byte[] bytes = InMemoryCompiler.ofThisJdk()
                    .compile(name, KernelEmitter.emit(new GraphAlone().model))
                    .classFile(name);
            try {
                return MethodHandles.lookup().defineClass(bytes);
            } catch (IllegalAccessException e) {
                throw new LinkageError(e.getMessage(), e);
            }
        }
    }
}
