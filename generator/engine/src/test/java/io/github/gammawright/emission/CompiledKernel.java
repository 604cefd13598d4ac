package io.github.gammawright.emission;

import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.objectweb.asm.ClassReader;

/** An emitted class, compiled in memory and called by reflection. */
final class CompiledKernel {

    final String source;
    final Map<String, byte[]> classFiles;
    final Class<?> type;

    private CompiledKernel(String source, Map<String, byte[]> classFiles, Class<?> type) {
        this.source = source;
        this.classFiles = classFiles;
        this.type = type;
    }

    static CompiledKernel of(KernelModel model) {
        String source = KernelEmitter.emit(model);
        String qualified =
                model.packageName().isEmpty() ? model.className() : model.packageName() + "." + model.className();
        Map<String, byte[]> files = MemoryCompiler.compile(qualified, source);
        return new CompiledKernel(source, files, MemoryCompiler.load(files, qualified));
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

    /** The bytes of code of every method in every class file. */
    Map<String, Integer> methodSizes() {
        Map<String, Integer> sizes = new TreeMap<>();
        classFiles.forEach((file, bytes) -> MethodSizes.read(new ClassReader(bytes), file, sizes));
        return sizes;
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
