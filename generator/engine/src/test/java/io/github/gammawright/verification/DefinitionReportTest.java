package io.github.gammawright.verification;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class DefinitionReportTest {

    private static final IdentityReport HELD =
            new IdentityReport("inverse", "g_ik g^kj − δ_i^j", 16, 64, 2.5e-4, 0, Optional.empty());

    private static final IdentityReport BROKEN = new IdentityReport(
            "trace",
            "Γ^m_mk − ½ g^ij ∂_k g_ij",
            16,
            32,
            6.5e3,
            2,
            Optional.of(new IdentityReport.Residual(List.of(1), List.of(1.0), List.of(0.5, 3.25), 6.5e-9, 1e-12)));

    private static final ClaimReport PROVED = new ClaimReport(
            "vacuum = true", ClaimVerdict.PROVED, 24, "every component has the normal form 0", Optional.empty());

    private static final ClaimReport REFUTED = new ClaimReport(
            "independent-of x\u202e",
            ClaimVerdict.REFUTED,
            1,
            "at one point ∂_x g[0, 1] is 2.0 instead of 0",
            Optional.of(new ClaimReport.Witness(List.of(1.0), List.of(0.5, 3.25), "∂_x g[0, 1]", 2)));

    private static final DefinitionReport FAILED =
            new DefinitionReport("trial", List.of(HELD, BROKEN), List.of(PROVED, REFUTED), List.of("t", "phi"));

    @Test
    void passesWhenNothingIsBroken() {
        assertThat(FAILED.passed()).isFalse();
        assertThat(new DefinitionReport("trial", List.of(HELD), List.of(PROVED), List.of()).passed())
                .isTrue();
        assertThat(new DefinitionReport("trial", List.of(HELD), List.of(REFUTED), List.of()).passed())
                .isFalse();
        assertThat(new DefinitionReport("trial", List.of(BROKEN), List.of(), List.of()).passed())
                .isFalse();
    }

    @Test
    void table() {
        assertThat(DefinitionTable.of(FAILED)).isEqualTo("""
                trial: failed
                  identity  must vanish               compared  worst of allowed  verdict
                  inverse   g_ik g^kj − δ_i^j         64        2.5e-04           passed
                  trace     Γ^m_mk − ½ g^ij ∂_k g_ij  32        6.5e+03           failed
                  trace [1] leaves 6.5E-9 at [0.5, 3.25] with parameters [1.0], where at most 1.0E-12 is allowed
                  claim                   points  verdict  because
                  vacuum = true           24      proved   every component has the normal form 0
                  independent-of x\\u202e  1       refuted  at one point ∂_x g[0, 1] is 2.0 instead of 0
                  counter-example to independent-of x\\u202e: ∂_x g[0, 1] = 2.0 at [0.5, 3.25] with parameters [1.0]
                  the metric does not depend on t, phi
                """);
    }

    @Test
    void json() {
        assertThat(ReportJson.of(List.of(), List.of(FAILED)))
                .isEqualTo("{\"passed\": false, \"kernels\": [], \"definitions\": [{\"definition\": \"trial\","
                        + " \"passed\": false, \"identities\": [{\"identity\": \"inverse\","
                        + " \"formula\": \"g_ik g^kj \\u2212 \\u03b4_i^j\", \"points\": 16, \"compared\": 64,"
                        + " \"worstOfAllowed\": 2.5E-4, \"violations\": 0, \"worstViolation\": null},"
                        + " {\"identity\": \"trace\","
                        + " \"formula\": \"\\u0393^m_mk \\u2212 \\u00bd g^ij \\u2202_k g_ij\", \"points\": 16,"
                        + " \"compared\": 32, \"worstOfAllowed\": 6500.0, \"violations\": 2,"
                        + " \"worstViolation\": {\"indices\": [1], \"parameters\": [1.0], \"point\": [0.5, 3.25],"
                        + " \"value\": 6.5E-9, \"allowed\": 1.0E-12}}],"
                        + " \"claims\": [{\"claim\": \"vacuum = true\", \"verdict\": \"proved\", \"points\": 24,"
                        + " \"because\": \"every component has the normal form 0\", \"witness\": null},"
                        + " {\"claim\": \"independent-of x\\u202e\", \"verdict\": \"refuted\", \"points\": 1,"
                        + " \"because\": \"at one point \\u2202_x g[0, 1] is 2.0 instead of 0\","
                        + " \"witness\": {\"component\": \"\\u2202_x g[0, 1]\", \"parameters\": [1.0],"
                        + " \"point\": [0.5, 3.25], \"value\": 2.0}}],"
                        + " \"independentOf\": [\"t\", \"phi\"]}]}\n");
    }

    /** Names from a stranger's file are shown, never acted upon. */
    @Test
    void jsonEscapesEveryLetterBeyondAscii() {
        String json = ReportJson.of(List.of(), List.of(FAILED));

        assertThat(json.chars()).allMatch(c -> c == '\n' || (c >= ' ' && c <= '~'));
    }
}
