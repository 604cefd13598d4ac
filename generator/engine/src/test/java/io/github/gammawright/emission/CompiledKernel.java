package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.verification.CompiledClasses;
import io.github.gammawright.verification.InMemoryCompiler;
import io.github.gammawright.verification.MethodSize;
import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.util.Arrays;
import java.util.List;

/** An emitted class, compiled in memory and called by reflection. */
final class CompiledKernel {

    final String source;
    final CompiledClasses classes;
    final Class<?> type;

    private CompiledKernel(String source, CompiledClasses classes) {
        this.source = source;
        this.classes = classes;
        this.type = classes.load();
    }

    static CompiledKernel of(KernelModel model) {
        String source = KernelEmitter.emit(model);
        String name = model.packageName().isEmpty() ? model.className() : model.packageName() + "." + model.className();
        CompiledClasses classes = InMemoryCompiler.ofThisJdk().compile(name, source);
        assertThat(classes.warnings()).isEmpty();
        for (MethodSize size : classes.methodSizes()) {
            assertThat(size.bytecodes()).as(size.toString()).isLessThanOrEqualTo(7000);
        }
        return new CompiledKernel(source, classes);
    }

    Object create(Object... arguments) {
        for (Constructor<?> constructor : type.getConstructors()) {
            if (constructor.getParameterCount() == arguments.length) {
                try {
                    return constructor.newInstance(arguments);
                } catch (InvocationTargetException e) {
                    throw unchecked(e.getCause());
                } catch (ReflectiveOperationException e) {
                    throw new LinkageError(e.getMessage(), e);
                }
            }
        }
        throw new AssertionError("no constructor takes " + arguments.length + " arguments");
    }

    Object call(Object kernel, String name, Object... arguments) {
        List<Method> methods = Arrays.stream(type.getMethods())
                .filter(m -> m.getName().equals(name) && m.getDeclaringClass() == type)
                .toList();
        if (methods.size() != 1) {
            throw new AssertionError(methods.size() + " methods " + name);
        }
        try {
            return methods.get(0).invoke(kernel, arguments);
        } catch (InvocationTargetException e) {
            throw unchecked(e.getCause());
        } catch (IllegalAccessException e) {
            throw new LinkageError(e.getMessage(), e);
        }
    }

    int constant(String name) {
        try {
            return type.getField(name).getInt(null);
        } catch (ReflectiveOperationException e) {
            throw new LinkageError(e.getMessage(), e);
        }
    }

    private static RuntimeException unchecked(Throwable cause) {
        if (cause instanceof RuntimeException e) {
            return e;
        }
        throw new AssertionError(cause);
    }
}
