package io.github.gammawright.verification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class CompilerTest {

    private static CompiledClasses compile(String body) {
        return InMemoryCompiler.ofThisJdk().compile("trial.T", "package trial; public class T {" + body + "}");
    }

    @Test
    void classesAreLoaded() throws ReflectiveOperationException {
        CompiledClasses classes = compile("public interface I {} public static int f() { return 42; }");
        assertThat(classes.names()).containsExactly("trial.T", "trial.T$I");
        assertThat(classes.warnings()).isEmpty();
        Class<?> type = classes.load();
        assertThat(type.getMethod("f").invoke(null)).isEqualTo(42);
        assertThat(type.getClassLoader()).isNotEqualTo(CompilerTest.class.getClassLoader());
    }

    @Test
    void nothingButTheJdkIsVisibleAtRunTime() {
        Class<?> type = compile("").load();
        assertThatThrownBy(() -> type.getClassLoader().loadClass("org.hipparchus.util.FastMath"))
                .isInstanceOf(ClassNotFoundException.class);
    }

    @Test
    void warningsAreReportedWithTheirLines() {
        CompiledClasses classes =
                compile("\n int f(int x) { switch (x) { case 1: x = 2; \n case 2: x = 3; } return x; }");
        assertThat(classes.warnings()).singleElement().asString().startsWith("line 3: possible fall-through");
    }

    @Test
    void errorsAreReportedWithTheirLines() {
        assertThatThrownBy(() -> compile("\n int f() { return 0.5; }"))
                .isInstanceOfSatisfying(
                        CompilationFailure.class,
                        failure -> assertThat(failure.errors())
                                .singleElement()
                                .asString()
                                .startsWith("line 2: incompatible types"));
    }

    /** Instruction lengths from the Java Virtual Machine Specification, chapter 6. */
    @Test
    void methodSizesAreThoseOfTheirInstructions() {
        CompiledClasses classes = compile("static double f(double a, double b) { return a * b; }"
                + " static double g() { return 0.1; } static int h() { return 1000; }");
        // aload_0, invokespecial (3), return
        assertThat(size(classes, "<init>")).isEqualTo(5);
        // dload_0, dload_2, dmul, dreturn
        assertThat(size(classes, "f")).isEqualTo(4);
        // ldc2_w (3), dreturn
        assertThat(size(classes, "g")).isEqualTo(4);
        // sipush (3), ireturn
        assertThat(size(classes, "h")).isEqualTo(4);
    }

    @Test
    void longMethodsWithManyConstants() {
        String statements = IntStream.range(0, 600)
                .mapToObj(i -> "x[0] += 0." + (1000 + i) + ";")
                .collect(Collectors.joining());
        CompiledClasses classes = compile("static void f(double[] x) {" + statements + "}");
        // aload_0, iconst_0, dup2, daload, ldc2_w (3), dadd, dastore for each, then return
        assertThat(size(classes, "f")).isEqualTo(600 * 9 + 1);
    }

    private static int size(CompiledClasses classes, String method) {
        List<MethodSize> sizes = classes.methodSizes().stream()
                .filter(size -> size.method().equals(method))
                .toList();
        assertThat(sizes).hasSize(1);
        assertThat(sizes.get(0).className()).isEqualTo("trial.T");
        return sizes.get(0).bytecodes();
    }
}
