package io.github.gammawright.emission;

import java.io.ByteArrayOutputStream;
import java.io.OutputStream;
import java.net.URI;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import javax.tools.DiagnosticCollector;
import javax.tools.FileObject;
import javax.tools.ForwardingJavaFileManager;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileManager;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.StandardLocation;
import javax.tools.ToolProvider;

/** Compiles one class with javac alone: every warning but those on serialisation's doc comments is an error. */
final class MemoryCompiler {

    private MemoryCompiler() {}

    static Map<String, byte[]> compile(String qualifiedName, String source) {
        JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
        DiagnosticCollector<JavaFileObject> diagnostics = new DiagnosticCollector<>();
        Map<String, ByteArrayOutputStream> outputs = new TreeMap<>();
        JavaFileManager files =
                new ForwardingJavaFileManager<>(compiler.getStandardFileManager(diagnostics, null, null)) {
                    @Override
                    public JavaFileObject getJavaFileForOutput(
                            Location location, String name, JavaFileObject.Kind kind, FileObject sibling) {
                        return new SimpleJavaFileObject(URI.create("memory:///" + outputs.size()), kind) {
                            @Override
                            public OutputStream openOutputStream() {
                                ByteArrayOutputStream bytes = new ByteArrayOutputStream();
                                outputs.put(name, bytes);
                                return bytes;
                            }
                        };
                    }

                    @Override
                    public Iterable<JavaFileObject> list(
                            Location location, String pack, java.util.Set<JavaFileObject.Kind> kinds, boolean deep)
                            throws java.io.IOException {
                        // generated classes need nothing but the JDK
                        return location == StandardLocation.CLASS_PATH
                                ? List.of()
                                : super.list(location, pack, kinds, deep);
                    }
                };
        String simpleName = qualifiedName.substring(qualifiedName.lastIndexOf('.') + 1);
        JavaFileObject unit =
                new SimpleJavaFileObject(
                        URI.create("memory:///" + encoded(simpleName) + ".java"), JavaFileObject.Kind.SOURCE) {
                    @Override
                    public CharSequence getCharContent(boolean ignoreEncodingErrors) {
                        return source;
                    }

                    @Override
                    public boolean isNameCompatible(String simple, JavaFileObject.Kind kind) {
                        return simple.equals(simpleName) && kind == JavaFileObject.Kind.SOURCE;
                    }
                };
        boolean done = compiler.getTask(
                        null,
                        files,
                        diagnostics,
                        List.of("--release", "17", "-Xlint:all", "-Xdoclint:all,-missing", "-Werror", "-proc:none"),
                        null,
                        List.of(unit))
                .call();
        if (!done) {
            throw new AssertionError(diagnostics.getDiagnostics() + "\n" + source);
        }
        Map<String, byte[]> classes = new LinkedHashMap<>();
        outputs.forEach((name, bytes) -> classes.put(name, bytes.toByteArray()));
        return classes;
    }

    private static String encoded(String name) {
        return java.net.URLEncoder.encode(name, java.nio.charset.StandardCharsets.UTF_8);
    }

    static Class<?> load(Map<String, byte[]> classes, String name) {
        ClassLoader loader = new ClassLoader(MemoryCompiler.class.getClassLoader()) {
            @Override
            protected Class<?> findClass(String wanted) throws ClassNotFoundException {
                byte[] bytes = classes.get(wanted);
                if (bytes == null) {
                    throw new ClassNotFoundException(wanted);
                }
                return defineClass(wanted, bytes, 0, bytes.length);
            }
        };
        try {
            return Class.forName(name, true, loader);
        } catch (ClassNotFoundException e) {
            throw new LinkageError(e.getMessage(), e);
        }
    }
}
