package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.jar.Attributes;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/**
 * The launcher, {@code generator/bin/gammawright}, in a source tree of its own: {@code mvn} there is a script that notes
 * that it was called and puts a small program in place, so that what is tested is when the launcher builds and how it
 * starts what was built.
 */
@EnabledOnOs({OS.LINUX, OS.MAC})
class LauncherTest {

    private static final Path LAUNCHER = Path.of("..", "bin", "gammawright").toAbsolutePath();

    @TempDir
    private Path temporary;

    private Path root;
    private Path launcher;
    private Path builds;

    /** What the built program is here: it prints what it was given. */
    static final class Echo {

        private Echo() {}

        public static void main(String[] arguments) {
            System.out.println(String.join("|", arguments));
            System.out.println(System.getProperty("user.dir"));
            System.out.println(System.getProperty("echo", "none"));
            System.exit(arguments.length);
        }
    }

    /** A run of the launcher. */
    private record Run(int status, List<String> output, List<String> errors) {}

    @BeforeEach
    void plantSourceTree() throws IOException {
        // A space and, where this JVM can name such files, letters beyond ASCII: home directories have them
        boolean beyondAscii = Charset.forName(System.getProperty("sun.jnu.encoding"))
                .newEncoder()
                .canEncode('Γ');
        root = Files.createDirectories(temporary.resolve(beyondAscii ? "Γ wright" : "gamma wright"));
        launcher = Files.createDirectories(root.resolve("generator/bin")).resolve("gammawright");
        Files.copy(LAUNCHER, launcher, StandardCopyOption.COPY_ATTRIBUTES);
        Files.createDirectories(root.resolve(".mvn"));
        Files.writeString(root.resolve("pom.xml"), "<project />");
        write("generator/command-line/src/main/java/Main.java", "class Main {}");

        builds = temporary.resolve("builds");
        Path jar = temporary.resolve("echo.jar");
        writeEchoJar(jar);
        shim("""
                echo "$PWD $*" >> '%s'
                cp '%s' generator/command-line/target/gammawright.jar
                """.formatted(builds, jar));
    }

    @Test
    void buildsOnFirstUseAndNotAgain() throws Exception {
        assertThat(run(Map.of(), "one", "two words").output()).startsWith("one|two words");
        assertThat(run(Map.of()).status()).isZero();

        assertThat(builds()).singleElement().asString().startsWith(root.toRealPath() + " ");
    }

    @Test
    void buildsAgainWhenASourceChangesButNotForATest() throws Exception {
        run(Map.of());
        write("generator/command-line/src/test/java/MainTest.java", "class MainTest {}");
        run(Map.of());
        assertThat(builds()).hasSize(1);

        write("generator/command-line/src/main/java/Main.java", "class Main { }");
        run(Map.of());
        assertThat(builds()).hasSize(2);

        Files.delete(root.resolve("generator/command-line/src/main/java/Main.java"));
        run(Map.of());
        assertThat(builds()).hasSize(3);
    }

    @Test
    void keepsWorkingDirectoryStatusAndOptions() throws Exception {
        Run run = run(Map.of("GAMMAWRIGHT_JAVA_OPTIONS", "-Decho=heard -Xmx64m"), "a", "b");

        assertThat(run.status()).isEqualTo(2);
        assertThat(run.output()).containsExactly("a|b", temporary.toRealPath().toString(), "heard");
        assertThat(run.errors()).isEmpty();
    }

    /** In the C locale of many containers too. */
    @Test
    void argumentsAndOutputAreUtf8() throws Exception {
        Path script = temporary.resolve("greek");
        script(script, "exec '%s' $'\\xce\\x93'\n".formatted(launcher));
        launcher = script;

        assertThat(run(Map.of("LC_ALL", "C", "LANG", "C")).output()).startsWith("Γ");
    }

    @Test
    void worksThroughAChainOfSymbolicLinks() throws Exception {
        Path first = Files.createSymbolicLink(temporary.resolve("first"), launcher);
        Files.createDirectories(temporary.resolve("bin"));
        launcher = Files.createSymbolicLink(
                temporary.resolve("bin/second"),
                Path.of("..", first.getFileName().toString()));

        assertThat(run(Map.of(), "x").output()).startsWith("x");
        assertThat(builds()).singleElement().asString().startsWith(root.toRealPath() + " ");
    }

    @Test
    void saysWhatTheBuildSaidWhenItFails() throws Exception {
        shim("""
                echo 'noise'
                echo '[ERROR] the disk is full'
                exit 1
                """);
        Run run = run(Map.of());

        assertThat(run.status()).isEqualTo(3);
        assertThat(run.output()).isEmpty();
        assertThat(run.errors()).hasSize(2).first().isEqualTo("[ERROR] the disk is full");
        assertThat(run.errors().get(1))
                .startsWith("gammawright: the build failed")
                .contains("launcher.log");
    }

    @Test
    void buildsAgainAfterAFailedBuild() throws Exception {
        run(Map.of());
        write("generator/command-line/src/main/java/Main.java", "class Main { int i; }");
        Path mvn = temporary.resolve("shims/mvn");
        String working = Files.readString(mvn);
        shim("exit 1\n");
        assertThat(run(Map.of()).status()).isEqualTo(3);
        assertThat(run(Map.of()).status()).isEqualTo(3);

        Files.writeString(mvn, working);
        assertThat(run(Map.of()).status()).isZero();
    }

    @Test
    void asksForAJdkThatIsThere() throws Exception {
        Run run = run(Map.of("JAVA_HOME", temporary.resolve("gone").toString()));

        assertThat(run.status()).isEqualTo(3);
        assertThat(run.errors())
                .singleElement()
                .asString()
                .contains("JAVA_HOME")
                .contains("JDK 17");
    }

    @Test
    void refusesAnOlderJava() throws Exception {
        Path old = Files.createDirectories(temporary.resolve("old/bin"));
        script(old.resolve("java"), """
                echo '    java.home = /opt/old'
                echo '    java.specification.version = 1.8'
                """);
        Run run = run(Map.of("JAVA_HOME", old.getParent().toString()));

        assertThat(run.status()).isEqualTo(3);
        assertThat(run.errors()).singleElement().asString().contains("is Java 1.8, and a JDK 17 or later is needed");
    }

    @Test
    void anUnusableArchiveOfClassesGoesUnnoticed() throws Exception {
        run(Map.of());
        Path archive = root.resolve("generator/command-line/target/launcher.jsa");
        Files.delete(archive);
        Files.writeString(archive, "made by another JDK");
        Run run = run(Map.of(), "x");

        assertThat(run.output()).startsWith("x");
        assertThat(run.errors()).isEmpty();
    }

    @Test
    void takesOverTheLockOfALauncherThatDied() throws Exception {
        Process dead = new ProcessBuilder("true").start();
        dead.waitFor();
        write("generator/command-line/target/launcher.lock/pid", dead.pid() + "\n");

        assertThat(run(Map.of()).status()).isZero();
        assertThat(root.resolve("generator/command-line/target/launcher.lock")).doesNotExist();
    }

    @Test
    void severalAtOnceBuildOnce() throws Exception {
        List<Process> processes = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            processes.add(start(Map.of(), temporary.resolve("output" + i), temporary.resolve("errors" + i)));
        }
        for (Process process : processes) {
            assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
            assertThat(process.exitValue()).isZero();
        }
        assertThat(builds()).hasSize(1);
    }

    @Test
    void buildsNothingWhenToldNotTo() throws Exception {
        Run run = run(Map.of("GAMMAWRIGHT_BUILD", "never"));

        assertThat(run.status()).isEqualTo(3);
        assertThat(run.errors()).singleElement().asString().contains("nothing has been built");
        assertThat(builds).doesNotExist();
    }

    private List<String> builds() throws IOException {
        return Files.readAllLines(builds);
    }

    private void write(String path, String text) throws IOException {
        Path file = root.resolve(path);
        Files.createDirectories(file.getParent());
        Files.writeString(file, text);
    }

    private void shim(String body) throws IOException {
        script(Files.createDirectories(temporary.resolve("shims")).resolve("mvn"), body);
    }

    private static void script(Path file, String body) throws IOException {
        Files.writeString(file, "#!/usr/bin/env bash\n" + body);
        assertThat(file.toFile().setExecutable(true)).isTrue();
    }

    private Run run(Map<String, String> environment, String... arguments) throws IOException, InterruptedException {
        Path output = temporary.resolve("output");
        Path errors = temporary.resolve("errors");
        Process process = start(environment, output, errors, arguments);
        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        return new Run(process.exitValue(), Files.readAllLines(output), Files.readAllLines(errors));
    }

    private Process start(Map<String, String> environment, Path output, Path errors, String... arguments)
            throws IOException {
        List<String> command = new ArrayList<>(List.of(launcher.toString()));
        command.addAll(List.of(arguments));
        ProcessBuilder builder = new ProcessBuilder(command)
                .directory(temporary.toFile())
                .redirectOutput(output.toFile())
                .redirectError(errors.toFile());
        builder.environment()
                .keySet()
                .removeIf(name -> name.startsWith("GAMMAWRIGHT_") || name.equals("JAVA_TOOL_OPTIONS"));
        builder.environment().put("JAVA_HOME", System.getProperty("java.home"));
        builder.environment().merge("PATH", temporary.resolve("shims").toString(), (path, shims) -> shims + ":" + path);
        builder.environment().putAll(environment);
        return builder.start();
    }

    private static void writeEchoJar(Path jar) throws IOException {
        String entry = Echo.class.getName().replace('.', '/') + ".class";
        Manifest manifest = new Manifest();
        manifest.getMainAttributes().put(Attributes.Name.MANIFEST_VERSION, "1.0");
        manifest.getMainAttributes().put(Attributes.Name.MAIN_CLASS, Echo.class.getName());
        try (OutputStream file = Files.newOutputStream(jar);
                JarOutputStream output = new JarOutputStream(file, manifest);
                var bytes = Echo.class.getResourceAsStream("/" + entry)) {
            output.putNextEntry(new JarEntry(entry));
            output.write(bytes.readAllBytes());
            output.closeEntry();
        }
    }
}
