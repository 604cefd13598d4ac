package io.github.gammawright.verification.claims;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.verification.ClaimReport;
import io.github.gammawright.verification.ClaimVerdict;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ClaimCheckTest {

    /** Known solutions: Schwarzschild (1916), Kerr (1963), de Sitter (1917); names of sources from memory. */
    @ParameterizedTest
    @CsvSource({
        "schwarzschild, vacuum = true",
        "kerr, vacuum = true",
        "kerr, independent-of phi",
        "kerr-carter-frame, independent-of t",
    })
    void provesWhatTheCatalogueClaims(String name, String claim) {
        assertThat(reports(builtIn(name)))
                .filteredOn(report -> report.claim().equals(claim))
                .singleElement()
                .satisfies(report -> {
                    assertThat(report.verdict()).isEqualTo(ClaimVerdict.PROVED);
                    assertThat(report.points()).isGreaterThanOrEqualTo(16);
                    assertThat(report.witness()).isEmpty();
                });
    }

    @Test
    void whatOnlyPointsShowIsCalledTested() {
        assertThat(verdict(spherical("r^2", "signature = \"+++\""))).isEqualTo(ClaimVerdict.TESTED);
    }

    @Test
    void aPointProvesThatSomethingDoesNotVanish() {
        ClaimReport report = only(sphere("vacuum = false"));

        assertThat(report.verdict()).isEqualTo(ClaimVerdict.PROVED);
        assertThat(report.witness())
                .hasValueSatisfying(witness -> assertThat(witness.value()).isNotZero());
    }

    /** R_ij = g_ij on the unit sphere, so that Λ = 1 (any textbook of Riemannian geometry; from memory). */
    @Test
    void einsteinConstants() {
        assertThat(verdict(sphere("einstein-constant = 1"))).isEqualTo(ClaimVerdict.PROVED);

        ClaimReport wrong = only(sphere("einstein-constant = 2"));
        assertThat(wrong.verdict()).isEqualTo(ClaimVerdict.REFUTED);
        assertThat(wrong.witness()).hasValueSatisfying(witness -> {
            assertThat(witness.component()).isEqualTo("(R − Λ g)[0, 0]");
            assertThat(witness.value()).isEqualTo(-1);
        });
    }

    @Test
    void killingFields() {
        assertThat(verdict(sphere("killing = [[\"sin(phi)\", \"cos(theta)/sin(theta)*cos(phi)\"]]")))
                .isEqualTo(ClaimVerdict.PROVED);
        assertThat(verdict(sphere("killing = [[\"sin(phi)\", \"cos(theta)*cos(phi)\"]]")))
                .isEqualTo(ClaimVerdict.REFUTED);
    }

    @Test
    void falseClaimsHaveACounterExample() {
        for (String claim : List.of("vacuum = true", "independent-of = [\"r\"]", "signature = \"-++\"")) {
            ClaimReport report = only(spherical("r^2 + 1", claim));
            assertThat(report.verdict()).as(claim).isEqualTo(ClaimVerdict.REFUTED);
            assertThat(report.witness())
                    .as(claim)
                    .hasValueSatisfying(witness -> assertThat(witness.point()).hasSize(3));
        }
    }

    /** Flat space in spherical coordinates is a vacuum: to claim that it is none is wrong, though no point shows it. */
    @Test
    void aFalseNegationIsRefuted() {
        ClaimReport report = only(spherical("r^2", "vacuum = false"));

        assertThat(report.verdict()).isEqualTo(ClaimVerdict.REFUTED);
        assertThat(report.explanation()).isEqualTo("every component has the normal form 0");
    }

    /** Nil geometry is homogeneous and not conformally flat (Scott 1983, Bull. London Math. Soc. 15; from memory). */
    @Test
    void conformalFlatnessOfThreeDimensionsIsThatOfCotton() {
        assertThat(verdict(of("dx^2 + dy^2 + (dz - x*dy)^2", "conformally-flat = true")))
                .isEqualTo(ClaimVerdict.REFUTED);
        assertThat(verdict(of("exp(2*x*y + z)*(dx^2 + dy^2 + dz^2)", "conformally-flat = true")))
                .isEqualTo(ClaimVerdict.TESTED);
    }

    @Test
    void everySurfaceIsConformallyFlat() {
        assertThat(verdict(sphere("conformally-flat = true"))).isEqualTo(ClaimVerdict.PROVED);
        assertThat(verdict(sphere("conformally-flat = false"))).isEqualTo(ClaimVerdict.REFUTED);
    }

    @Test
    void conformalFlatnessOfFourDimensionsIsThatOfWeyl() {
        assertThat(reports(builtIn("flrw-closed")))
                .filteredOn(report -> report.claim().startsWith("conformally-flat"))
                .singleElement()
                .satisfies(report -> assertThat(report.verdict()).isEqualTo(ClaimVerdict.PROVED));
        MetricDefinition schwarzschild = changed("schwarzschild", "vacuum ", "conformally-flat = true\nvacuum ");
        assertThat(reports(schwarzschild))
                .filteredOn(report -> report.claim().startsWith("conformally-flat"))
                .singleElement()
                .satisfies(report -> assertThat(report.refuted()).isTrue());
    }

    /** The charge is 0 by default, and only then is the hole a vacuum; a claim is one for all parameters. */
    @Test
    void parametersVary() {
        MetricDefinition charged = DefinitionReader.read(new SourceText("charged.metric.toml", """
                name = "charged"
                coordinates = ["t", "r", "theta", "phi"]
                line-element = "-f*dt^2 + dr^2/f + r^2*(dtheta^2 + sin(theta)^2*dphi^2)"
                parameters.Q = 0
                abbreviations.f = "1 - 2/r + Q^2/r^2"
                [domain]
                conditions = ["r > 2", "0 < theta < pi"]
                sample = { r = [3, 9], theta = [0.1, 3] }
                [claims]
                vacuum = true
                """));

        assertThat(only(charged).verdict()).isEqualTo(ClaimVerdict.REFUTED);
    }

    @Test
    void cyclicCoordinatesAreFound() {
        assertThat(check(builtIn("kerr")).cyclicCoordinates()).containsExactly(0, 3);
        assertThat(check(of("cos(x)^2*dz^2 + dy^2 + sin(x)^2*dz^2 + (2 + sin(y))*dx^2", "vacuum = false"))
                        .cyclicCoordinates())
                .containsExactly(0, 2);
    }

    private static MetricDefinition sphere(String claim) {
        return DefinitionReader.read(new SourceText("ball.metric.toml", """
                name = "ball"
                coordinates = ["theta", "phi"]
                line-element = "dtheta^2 + sin(theta)^2*dphi^2"
                [domain]
                conditions = ["0 < theta < pi"]
                sample = { theta = [0.1, 3] }
                [claims]
                %s
                """.formatted(claim)));
    }

    private static MetricDefinition spherical(String area, String claim) {
        return DefinitionReader.read(new SourceText("room.metric.toml", """
                name = "room"
                coordinates = ["r", "theta", "phi"]
                line-element = "dr^2 + (%s)*(dtheta^2 + sin(theta)^2*dphi^2)"
                [domain]
                conditions = ["r > 0", "0 < theta < pi"]
                sample = { r = [0.5, 3], theta = [0.1, 3] }
                [claims]
                %s
                """.formatted(area, claim)));
    }

    private static MetricDefinition of(String lineElement, String claim) {
        return DefinitionReader.read(new SourceText("trial.metric.toml", """
                name = "trial"
                coordinates = ["x", "y", "z"]
                line-element = "%s"
                [claims]
                %s
                """.formatted(lineElement, claim)));
    }

    private static MetricDefinition builtIn(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    private static MetricDefinition changed(String name, String from, String to) {
        SourceText source = Catalogue.standard().find(name).orElseThrow();
        assertThat(source.text()).contains(from);
        return DefinitionReader.read(new SourceText(source.name(), source.text().replace(from, to)));
    }

    private static ClaimCheck check(MetricDefinition definition) {
        return new ClaimCheck(definition, ReferenceEvaluator.DEFAULT_DIGITS, 1);
    }

    private static List<ClaimReport> reports(MetricDefinition definition) {
        return check(definition).reports();
    }

    private static ClaimReport only(MetricDefinition definition) {
        List<ClaimReport> reports = reports(definition);
        assertThat(reports).hasSize(1);
        return reports.get(0);
    }

    private static ClaimVerdict verdict(MetricDefinition definition) {
        return only(definition).verdict();
    }
}
