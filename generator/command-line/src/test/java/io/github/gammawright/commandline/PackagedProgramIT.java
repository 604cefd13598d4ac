package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** The program as the build packaged it, started by the launcher from another folder. */
@EnabledOnOs({OS.LINUX, OS.MAC})
class PackagedProgramIT {

    @TempDir
    private Path folder;

    @Test
    void tellsItsVersion() throws IOException, InterruptedException {
        Path output = folder.resolve("output");
        ProcessBuilder builder = new ProcessBuilder(List.of(
                        Path.of("..", "bin", "gammawright").toAbsolutePath().toString(), "--version"))
                .directory(folder.toFile())
                .redirectErrorStream(true)
                .redirectOutput(output.toFile());
        builder.environment().put("GAMMAWRIGHT_BUILD", "never");
        builder.environment().put("JAVA_HOME", System.getProperty("java.home"));
        builder.environment().remove("JAVA_TOOL_OPTIONS");
        Process process = builder.start();

        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        assertThat(Files.readString(output)).matches("gammawright \\d+\\.\\d+\\.\\d+(-SNAPSHOT)?\\n");
        assertThat(process.exitValue()).isZero();
    }
}
