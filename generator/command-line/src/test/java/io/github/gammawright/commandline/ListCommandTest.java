package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import java.util.List;
import org.junit.jupiter.api.Test;

class ListCommandTest {

    @Test
    void everyBuiltInDefinitionHasALine() {
        Program run = Program.run("list");

        List<String> lines = run.output().lines().toList();
        List<String> names = Catalogue.standard().names();
        assertThat(run.status()).isZero();
        assertThat(run.errors()).isEmpty();
        assertThat(lines.get(0)).matches("NAME +COORDINATES +PARAMETERS +TITLE");
        assertThat(lines.stream().skip(1).map(line -> line.substring(0, line.indexOf(' '))))
                .isEqualTo(names);
        assertThat(names).contains("schwarzschild", "kerr", "kerr-schild");
        assertThat(lines).anyMatch(line -> line.matches("kerr +t, r, theta, phi +M = 1, a = 0\\.6 +Rotating .*"));
    }
}
