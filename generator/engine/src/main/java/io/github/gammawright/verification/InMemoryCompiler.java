package io.github.gammawright.verification;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import javax.tools.Diagnostic;
import javax.tools.DiagnosticCollector;
import javax.tools.FileObject;
import javax.tools.ForwardingJavaFileManager;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileManager;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.ToolProvider;

/** Compiles source texts for Java 17 without touching the disk, and without annotation processing. */
public final class InMemoryCompiler {

    private static final List<String> OPTIONS = List.of("--release", "17", "-proc:none", "-Xlint:all");

    private final JavaCompiler compiler;

    private InMemoryCompiler(JavaCompiler compiler) {
        this.compiler = compiler;
    }

    /**
     * The compiler of the JDK that this program runs on.
     *
     * @throws CompilationFailure when it runs on an installation without a compiler
     */
    public static InMemoryCompiler ofThisJdk() {
        JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
        if (compiler == null) {
            throw new CompilationFailure(
                    "checking kernels needs the compiler of a JDK, but " + System.getProperty("java.home")
                            + " has none: point JAVA_HOME at a JDK of version 17 or later",
                    List.of());
        }
        return new InMemoryCompiler(compiler);
    }

    /**
     * Compiles one compilation unit, which may refer to nothing but the JDK.
     *
     * @param qualifiedName the name of its public class
     * @throws CompilationFailure with the compiler's messages when the text is wrong
     */
    public CompiledClasses compile(String qualifiedName, String source) {
        DiagnosticCollector<JavaFileObject> diagnostics = new DiagnosticCollector<>();
        StringWriter further = new StringWriter();
        try (Outputs outputs =
                new Outputs(compiler.getStandardFileManager(diagnostics, Locale.ROOT, StandardCharsets.UTF_8))) {
            boolean success = compiler.getTask(
                            further,
                            outputs,
                            diagnostics,
                            OPTIONS,
                            null,
                            List.of(new SourceText(qualifiedName, source)))
                    .call();
            List<String> messages = new ArrayList<>();
            for (Diagnostic<? extends JavaFileObject> diagnostic : diagnostics.getDiagnostics()) {
                if (!success == (diagnostic.getKind() == Diagnostic.Kind.ERROR)) {
                    messages.add("line " + diagnostic.getLineNumber() + ": " + diagnostic.getMessage(Locale.ROOT));
                }
            }
            if (!success) {
                String message = qualifiedName + " does not compile";
                throw new CompilationFailure(message, messages.isEmpty() ? List.of(further.toString()) : messages);
            }
            return new CompiledClasses(qualifiedName, outputs.bytes(), messages);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static final class SourceText extends SimpleJavaFileObject {

        private final String text;

        SourceText(String qualifiedName, String text) {
            super(URI.create("string:///" + qualifiedName.replace('.', '/') + Kind.SOURCE.extension), Kind.SOURCE);
            this.text = text;
        }

        @Override
        public CharSequence getCharContent(boolean ignoreEncodingErrors) {
            return text;
        }
    }

    private static final class Bytes extends SimpleJavaFileObject {

        private final ByteArrayOutputStream content = new ByteArrayOutputStream();

        Bytes(String name) {
            super(URI.create("bytes:///" + name.replace('.', '/') + Kind.CLASS.extension), Kind.CLASS);
        }

        @Override
        public OutputStream openOutputStream() {
            return content;
        }
    }

    /** Keeps what the compiler writes. */
    private static final class Outputs extends ForwardingJavaFileManager<JavaFileManager> {

        private final Map<String, Bytes> classes = new TreeMap<>();

        Outputs(JavaFileManager manager) {
            super(manager);
        }

        @Override
        public JavaFileObject getJavaFileForOutput(
                Location location, String className, JavaFileObject.Kind kind, FileObject sibling) {
            return classes.computeIfAbsent(className, Bytes::new);
        }

        Map<String, byte[]> bytes() {
            Map<String, byte[]> all = new TreeMap<>();
            classes.forEach((name, bytes) -> all.put(name, bytes.content.toByteArray()));
            return all;
        }
    }
}
