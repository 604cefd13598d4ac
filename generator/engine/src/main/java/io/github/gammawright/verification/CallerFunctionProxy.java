package io.github.gammawright.verification;

import io.github.gammawright.verification.KernelUnderTest.RequestedFunction;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.lang.reflect.InvocationHandler;
import java.lang.reflect.Method;
import java.lang.reflect.Proxy;
import java.util.Arrays;
import java.util.List;

/**
 * Stands in for the caller's functions: implements the interface that a kernel class asks for, by the samples that the
 * definition gives, evaluated in high precision and rounded once.
 */
final class CallerFunctionProxy implements InvocationHandler {

    private final ReferenceEvaluator evaluator;
    private final double[] parameters;
    private final List<RequestedFunction> functions;

    private CallerFunctionProxy(ReferenceEvaluator evaluator, double[] parameters, List<RequestedFunction> functions) {
        this.evaluator = evaluator;
        this.parameters = parameters;
        this.functions = functions;
    }

    /** An object of the interface. */
    static Object of(
            Class<?> type, ReferenceEvaluator evaluator, double[] parameters, List<RequestedFunction> functions) {
        return Proxy.newProxyInstance(
                type.getClassLoader(),
                new Class<?>[] {type},
                new CallerFunctionProxy(evaluator, parameters, functions));
    }

    @Override
    public Object invoke(Object proxy, Method method, Object[] arguments) {
        for (RequestedFunction function : functions) {
            if (function.method().equals(method.getName())) {
                fill(function, arguments);
                return null;
            }
        }
        return switch (method.getName()) {
            case "toString" -> "the samples of " + evaluator.definition().name();
            case "hashCode" -> System.identityHashCode(proxy);
            case "equals" -> proxy == arguments[0];
            default -> throw new IllegalStateException("the kernel asks for an unknown function " + method.getName());
        };
    }

    private void fill(RequestedFunction function, Object[] arguments) {
        double[] values = (double[]) arguments[arguments.length - 1];
        double[] at = new double[arguments.length - 1];
        for (int i = 0; i < at.length; i++) {
            at[i] = (double) arguments[i];
        }
        Arrays.fill(values, Double.NaN);
        List<Real> derivatives = evaluator.functionDerivatives(function.name(), parameters, at, function.orders());
        for (int i = 0; i < derivatives.size(); i++) {
            values[i] = derivatives.get(i).toDouble();
        }
    }
}
