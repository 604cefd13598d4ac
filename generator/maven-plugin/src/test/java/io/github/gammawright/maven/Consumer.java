package io.github.gammawright.maven;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/** A small project below {@code src/it}, copied to a place of its own and built by a real Maven in a fresh process. */
final class Consumer {

    private static final Pattern PLACEHOLDER = Pattern.compile("@([a-z.A-Z-]+)@");
    private static final long TIMEOUT_SECONDS = 300;

    private final Path folder;
    private final Path repository;

    private Consumer(Path folder, Path repository) {
        this.folder = folder;
        this.repository = repository;
    }

    /** What a build said, and how it ended. */
    record Build(int status, String log) {}

    /** Copies the project of that name; versions in its pom are filled in. */
    static Consumer copy(String project, Path to, Path repository) throws IOException {
        Path from = Path.of("src", "it", project);
        try (Stream<Path> files = Files.walk(from)) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                Path copy = to.resolve(from.relativize(file).toString());
                Files.createDirectories(copy.getParent());
                Files.writeString(copy, fillIn(Files.readString(file)));
            }
        }
        // Else Maven would take the outer project's settings for its JVM.
        Files.createDirectories(to.resolve(".mvn"));
        return new Consumer(to, repository);
    }

    /** Runs Maven; {@code -o}, settings and the local repository are those of the outer build. */
    Build maven(String... arguments) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("it.maven.home"), "bin", "mvn").toString());
        command.addAll(List.of("-B", "-ntp", "-Dstyle.color=never", "-Dmaven.repo.local=" + repository));
        addSettings(command, "-s", "it.userSettings");
        addSettings(command, "-gs", "it.globalSettings");
        if (System.getProperty("it.offline").equals("offline:true")) {
            command.add("-o");
        }
        command.addAll(List.of(arguments));
        return run(command);
    }

    /** Runs a class of the project on the java.base module and the project's own classes, and nothing else. */
    Build java(String mainClass) throws IOException, InterruptedException {
        return run(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "--limit-modules",
                "java.base",
                "-cp",
                path("target/classes").toString(),
                mainClass));
    }

    Path path(String below) {
        return folder.resolve(below);
    }

    /** The bytes of all files in a folder, each as one character, by their paths below it. */
    SortedMap<String, String> contents(String below) throws IOException {
        SortedMap<String, String> contents = new TreeMap<>();
        for (Path file : files(below)) {
            contents.put(name(below, file), Files.readString(file, StandardCharsets.ISO_8859_1));
        }
        return contents;
    }

    /** When each file in a folder was last written, by its path below the folder. */
    SortedMap<String, FileTime> times(String below) throws IOException {
        SortedMap<String, FileTime> times = new TreeMap<>();
        for (Path file : files(below)) {
            times.put(name(below, file), Files.getLastModifiedTime(file));
        }
        return times;
    }

    private List<Path> files(String below) throws IOException {
        if (!Files.isDirectory(path(below))) {
            return List.of();
        }
        try (Stream<Path> files = Files.walk(path(below))) {
            return files.filter(Files::isRegularFile).toList();
        }
    }

    private String name(String below, Path file) {
        return path(below).relativize(file).toString().replace('\\', '/');
    }

    private Build run(List<String> command) throws IOException, InterruptedException {
        Path log = Files.createTempFile("gammawright-it", ".log");
        try {
            ProcessBuilder builder = new ProcessBuilder(command)
                    .directory(folder.toFile())
                    .redirectErrorStream(true)
                    .redirectOutput(log.toFile());
            Map<String, String> environment = builder.environment();
            environment.put("MAVEN_OPTS", "-Xmx512m -XX:+UseSerialGC -XX:TieredStopAtLevel=1");
            environment.put("JAVA_HOME", System.getProperty("java.home"));
            environment.put("LC_ALL", "C.UTF-8");
            environment.remove("JAVA_TOOL_OPTIONS");
            environment.remove("MAVEN_ARGS");
            Process process = builder.start();
            if (!process.waitFor(TIMEOUT_SECONDS, TimeUnit.SECONDS)) {
                process.destroyForcibly();
                throw new IOException(command + " did not end; so far it said " + Files.readString(log));
            }
            return new Build(process.exitValue(), Files.readString(log, StandardCharsets.UTF_8));
        } finally {
            Files.deleteIfExists(log);
        }
    }

    private static void addSettings(List<String> command, String option, String property) {
        Path file = Path.of(System.getProperty(property).substring("file:".length()));
        if (Files.isRegularFile(file)) {
            command.addAll(List.of(option, file.toString()));
        }
    }

    private static String fillIn(String text) {
        Matcher matcher = PLACEHOLDER.matcher(text);
        return matcher.replaceAll(found -> {
            String value = System.getProperty(found.group(1));
            if (value == null) {
                throw new IllegalStateException("no system property " + found.group(1));
            }
            return Matcher.quoteReplacement(value);
        });
    }
}
