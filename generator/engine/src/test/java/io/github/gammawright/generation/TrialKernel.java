package io.github.gammawright.generation;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.InMemoryCompiler;
import java.lang.reflect.InvocationHandler;
import java.lang.reflect.Method;
import java.lang.reflect.Proxy;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A kernel of one quantity, made, compiled in memory and called as its users call it. */
final class TrialKernel {

    private final Class<?> type;
    private final InvocationHandler functions;

    private TrialKernel(Class<?> type, InvocationHandler functions) {
        this.type = type;
        this.functions = functions;
    }

    /** A kernel of a definition of the catalogue, made with little effort. */
    static TrialKernel of(String definition, Quantity quantity, Layout layout) {
        return of(definition, quantity, layout, null);
    }

    /**
     * The same for a definition with functions of the caller.
     *
     * @param functions implements the nested interface
     */
    static TrialKernel of(String definition, Quantity quantity, Layout layout, InvocationHandler functions) {
        return of(
                DefinitionReader.read(Catalogue.standard().find(definition).orElseThrow()),
                quantity,
                layout,
                functions);
    }

    static TrialKernel of(MetricDefinition definition, Quantity quantity, Layout layout, InvocationHandler functions) {
        KernelSpecification specification = new KernelSpecification(
                "trial",
                "Trial",
                List.of(quantity),
                layout,
                new GenerationOptions(
                        GenerationOptions.Effort.QUICK,
                        GenerationOptions.Trigonometry.MATH,
                        false,
                        GenerationOptions.Preference.SPEED));
        GeneratedClass made = new KernelGenerator().generate(definition, specification);
        return new TrialKernel(
                InMemoryCompiler.ofThisJdk()
                        .compile(specification.qualifiedName(), made.source())
                        .load(),
                functions);
    }

    /** A new array with the values at a point. */
    double[] values(double[] parameters, double[]... inputs) {
        List<Object> arguments = new ArrayList<>();
        for (double parameter : parameters) {
            arguments.add(parameter);
        }
        try {
            if (functions != null) {
                Class<?> asked = type.getConstructors()[0].getParameterTypes()[parameters.length];
                arguments.add(Proxy.newProxyInstance(asked.getClassLoader(), new Class<?>[] {asked}, functions));
            }
            Object kernel = Arrays.stream(type.getConstructors())
                    .filter(constructor -> constructor.getParameterCount() == arguments.size())
                    .findFirst()
                    .orElseThrow()
                    .newInstance(arguments.toArray());
            Method method = Arrays.stream(type.getMethods())
                    .filter(candidate -> candidate.getName().equals("valuesAt"))
                    .findFirst()
                    .orElseThrow();
            return (double[]) method.invoke(kernel, (Object[]) inputs);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("the kernel cannot be called", e);
        }
    }

    /** What a static method of the class gives for some indices. */
    int index(String method, int... indices) {
        Class<?>[] types = new Class<?>[indices.length];
        Arrays.fill(types, int.class);
        try {
            return (int) type.getMethod(method, types)
                    .invoke(null, Arrays.stream(indices).boxed().toArray());
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("no method " + method, e);
        }
    }
}
