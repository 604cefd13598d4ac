package io.github.gammawright.verification;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** A compiled class with those nested in it. */
public final class CompiledClasses {

    private final String mainName;
    private final Map<String, byte[]> classFiles;
    private final List<String> warnings;

    CompiledClasses(String mainName, Map<String, byte[]> classFiles, List<String> warnings) {
        this.mainName = mainName;
        this.classFiles = new TreeMap<>(classFiles);
        this.warnings = List.copyOf(warnings);
    }

    /** What the compiler warned of, each with its line. */
    public List<String> warnings() {
        return warnings;
    }

    /** The names of all classes, in order. */
    public List<String> names() {
        return List.copyOf(classFiles.keySet());
    }

    /** The class file of the class of that name. */
    public byte[] classFile(String name) {
        return classFiles.get(name).clone();
    }

    /** The sizes of all methods, in the order of the classes' names and of the methods in them. */
    public List<MethodSize> methodSizes() {
        return classFiles.values().stream()
                .flatMap(bytes -> MethodSize.all(bytes).stream())
                .toList();
    }

    /** Loads the main class in a class loader of its own, which sees nothing but the JDK. */
    public Class<?> load() {
        try {
            return new Loader(classFiles).loadClass(mainName);
        } catch (ClassNotFoundException e) {
            throw new IllegalStateException(mainName + " was compiled but is not there", e);
        }
    }

    private static final class Loader extends ClassLoader {

        private final Map<String, byte[]> classFiles;

        Loader(Map<String, byte[]> classFiles) {
            super(ClassLoader.getPlatformClassLoader());
            this.classFiles = classFiles;
        }

        @Override
        protected Class<?> findClass(String name) throws ClassNotFoundException {
            byte[] bytes = classFiles.get(name);
            if (bytes == null) {
                throw new ClassNotFoundException(name);
            }
            return defineClass(name, bytes, 0, bytes.length);
        }
    }
}
