package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.lang.reflect.Method;
import java.lang.reflect.Proxy;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Classes with functions of the caller, and with a workspace. */
class CallerFunctionTest {

    private final CompiledKernel kernel = CompiledKernel.of(BreathingSphere.model());

    /** radius = time + 2θ + 3 time θ, with derivatives 1 + 3θ by time and 3 by both. */
    private Object kernel() {
        Class<?> type = kernel.type.getDeclaredClasses()[0];
        Object functions = Proxy.newProxyInstance(type.getClassLoader(), new Class<?>[] {type}, (self, method, a) -> {
            double time = (double) a[0];
            double theta = (double) a[1];
            double[] result = (double[]) a[2];
            result[0] = time + 2 * theta + 3 * time * theta;
            result[1] = 1 + 3 * theta;
            result[2] = 3;
            return null;
        });
        return kernel.create(2.5, functions);
    }

    @Test
    void interfaceAsksForTheValueAndJustTheDerivativesNeeded() {
        Class<?> type = kernel.type.getDeclaredClasses()[0];
        assertThat(type.getSimpleName()).isEqualTo("Functions");
        assertThat(java.io.Serializable.class).isAssignableFrom(type);
        Method method = type.getMethods()[0];
        assertThat(method.getName()).isEqualTo("radius");
        assertThat(method.getParameterTypes()).containsExactly(double.class, double.class, double[].class);
        assertThat(KernelEmitter.functions(BreathingSphere.model()))
                .containsExactly(
                        new EmittedFunction("radius", "radius", List.of(List.of(0, 0), List.of(1, 0), List.of(1, 1))));
    }

    @Test
    void everyFormOfEvaluationGivesTheSame() {
        double[] metric = new double[4];
        double[] acceleration = new double[2];
        double[] point = {0.5, 0.25};
        double[] velocity = {2, 3};
        kernel.call(kernel(), "evaluate", point, velocity, metric, acceleration);
        double radius = 0.5 + 0.5 + 0.375;
        double slope = 1.75 * 3 * Math.sin(0.25);
        assertThat(metric).containsExactly(-1, slope, slope, 2.5 * (radius * radius));
        assertThat(acceleration[0]).isEqualTo(slope * 6);
        assertThat(acceleration[1]).isCloseTo(1.8184464592320668, org.assertj.core.data.Offset.offset(1e-15));

        double[] workspace = new double[kernel.constant("WORKSPACE_LENGTH") + 5];
        double[] again = new double[4];
        double[] againAcceleration = new double[2];
        kernel.call(kernel(), "evaluateWith", workspace, point, velocity, again, againAcceleration);
        assertThat(again).isEqualTo(metric);
        assertThat(againAcceleration).isEqualTo(acceleration);

        double[] one = {9, 0.5, 0.25, 2, 3, 0, 0, 0, 0, 0, 0, 0};
        kernel.call(kernel(), "evaluateAt", one, 1, one, 3, one, 5, one, 10);
        assertThat(java.util.Arrays.copyOfRange(one, 5, 9)).isEqualTo(metric);
        assertThat(java.util.Arrays.copyOfRange(one, 10, 12)).isEqualTo(acceleration);

        kernel.call(kernel(), "evaluateScalars", 0.5, 0.25, 2.0, 3.0, again, againAcceleration);
        assertThat(again).isEqualTo(metric);
    }

    @Test
    void domainCallsTheFunctionToo() {
        assertThat(kernel.call(kernel(), "inDomain", (Object) new double[] {0.5, 0.25}))
                .isEqualTo(true);
        assertThat(kernel.call(kernel(), "inDomain", (Object) new double[] {-0.5, 0.25}))
                .isEqualTo(false);
    }

    @Test
    void classHasNoOtherConstructorAndNoSingleValuedForms() {
        assertThat(kernel.type.getConstructors()).hasSize(1);
        assertThat(kernel.type.getConstructors()[0].getParameterCount()).isEqualTo(2);
        assertThat(kernel.type.getMethods()).extracting(Method::getName).doesNotContain("valuesAt", "index");
        assertThat(kernel.constant("METRIC_LENGTH")).isEqualTo(4);
        assertThat(kernel.call(null, "metricIndex", 1, 0)).isEqualTo(2);
        assertThat(kernel.call(null, "geodesicAccelerationIndex", 1)).isEqualTo(1);
        assertThatThrownBy(() -> kernel.create(2.5, null)).isInstanceOf(NullPointerException.class);
    }

    @Test
    void arraysThatWouldOverwriteEachOtherAreRefused() {
        double[] point = {0.5, 0.25};
        double[] both = new double[4];
        Object created = kernel();
        assertThatThrownBy(() -> kernel.call(created, "evaluateWith", both, point, point, both, new double[2]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("workspace and metric are one array, but each needs its own");
        assertThatThrownBy(() -> kernel.call(created, "evaluateWith", new double[2], point, point, both, new double[2]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("workspace has length 2, too short for 3 entries from 0");
        double[] all = new double[20];
        assertThatThrownBy(() -> kernel.call(created, "evaluateAt", all, 0, all, 0, all, 4, all, 3))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("metric and geodesicAcceleration overlap in one array");
        assertThatThrownBy(() -> kernel.call(created, "evaluateAt", all, 19, all, 0, all, 4, all, 10))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("points has length 20, too short for 2 entries from 19");
        assertThatThrownBy(() -> kernel.call(created, "evaluateAt", all, Integer.MAX_VALUE, all, 0, all, 4, all, 10))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
