package io.github.gammawright.verification;

import io.github.gammawright.definition.MetricDefinition;
import java.util.List;

/** Well-known metrics for tests, under the names that the table of published values uses. */
public final class TestMetrics {

    private TestMetrics() {}

    public static MetricDefinition named(String name) {
        return switch (name) {
            case "sphere" ->
                TestDefinition.of(name, "theta", "phi")
                        .condition("0 < theta < pi")
                        .range("theta", 0.05, 3.09)
                        .lineElement("dtheta^2 + sin(theta)^2*dphi^2");
            case "polar-plane" -> TestDefinition.of(name, "r", "phi").matrix("1", "0; r^2");
            case "schwarzschild" -> schwarzschild();
            case "reissner-nordstroem" ->
                TestDefinition.of(name, "t", "r", "theta", "phi")
                        .parameter("M", "1")
                        .parameter("Q", "1/2")
                        .abbreviation("f", "1 - 2*M/r + Q^2/r^2")
                        .lineElement("-f*dt^2 + dr^2/f + r^2*(dtheta^2 + sin(theta)^2*dphi^2)");
            case "flrw" ->
                TestDefinition.of(name, "t", "x", "y", "z")
                        .function("a", "t^(2/3)", "t")
                        .lineElement("-dt^2 + a^2*(dx^2 + dy^2 + dz^2)");
            case "flrw-radiation" ->
                TestDefinition.of(name, "t", "x", "y", "z")
                        .function("a", "sqrt(t)", "t")
                        .lineElement("-dt^2 + a^2*(dx^2 + dy^2 + dz^2)");
            case "flrw-exponential" ->
                TestDefinition.of(name, "t", "x", "y", "z")
                        .parameter("H", "1/4")
                        .function("a", "exp(H*t)", "t")
                        .lineElement("-dt^2 + a^2*(dx^2 + dy^2 + dz^2)");
            case "flrw-spherical" ->
                TestDefinition.of(name, "t", "r", "theta", "phi")
                        .parameter("k", "0")
                        .function("a", "t^(2/3)", "t")
                        .coframe(
                                List.of(-1, 1, 1, 1),
                                "dt",
                                "a*dr/sqrt(1 - k*r^2)",
                                "a*r*dtheta",
                                "a*r*sin(theta)*dphi");
            case "wgs84" ->
                TestDefinition.of(name, "phi", "lambda")
                        .abbreviation("A", "6378137")
                        .abbreviation("f", "1/298.257223563")
                        .abbreviation("e2", "f*(2 - f)")
                        .abbreviation("W", "sqrt(1 - e2*sin(phi)^2)")
                        .lineElement("(A*(1 - e2)/W^3*dphi)^2 + (A/W*cos(phi)*dlambda)^2");
            case "kerr" -> kerr();
            case "kerr-schild" -> kerrSchild();
            case "goedel" ->
                TestDefinition.of(name, "t", "x", "y", "z")
                        .parameter("a", "3/2")
                        .lineElement("a^2*(-(dt + exp(x)*dy)^2 + dx^2 + exp(2*x)/2*dy^2 + dz^2)");
            case "painleve-gullstrand" ->
                TestDefinition.of(name, "T", "r", "theta", "phi")
                        .parameter("M", "1")
                        .threePlusOne(
                                "1", List.of("sqrt(2*M/r)", "0", "0"), "dr^2 + r^2*(dtheta^2 + sin(theta)^2*dphi^2)");
            case "isotropic" ->
                TestDefinition.of(name, "t", "x", "y", "z")
                        .parameter("M", "1")
                        .abbreviation("rho", "sqrt(x^2 + y^2 + z^2)")
                        .abbreviation("psi", "1 + M/(2*rho)")
                        .lineElement("-((1 - M/(2*rho))/psi)^2*dt^2 + psi^4*(dx^2 + dy^2 + dz^2)");
            case "wormhole" ->
                TestDefinition.of(name, "t", "l", "theta", "phi")
                        .parameter("b0", "5/4")
                        .lineElement("-dt^2 + dl^2 + (b0^2 + l^2)*(dtheta^2 + sin(theta)^2*dphi^2)");
            case "two-charges" ->
                TestDefinition.of(name, "t", "x", "y", "z")
                        .abbreviation("U", "1 + 1/sqrt(x^2 + y^2 + (z - 3/2)^2) + 1/2/sqrt(x^2 + y^2 + (z + 1)^2)")
                        .lineElement("-dt^2/U^2 + U^2*(dx^2 + dy^2 + dz^2)");
            case "plane-wave" ->
                TestDefinition.of(name, "u", "v", "x", "y")
                        .abbreviation("H", "(x^2 - y^2)*cos(u) + 2*x*y*sin(u)")
                        .lineElement("H*du^2 + 2*du*dv + dx^2 + dy^2");
            default -> throw new IllegalArgumentException(name);
        };
    }

    public static MetricDefinition schwarzschild() {
        return TestDefinition.of("schwarzschild", "t", "r", "theta", "phi")
                .parameter("M", "1")
                .abbreviation("f", "1 - 2*M/r")
                .condition("M > 0")
                .condition("r > 2*M")
                .condition("0 < theta < pi")
                .range("r", 2.5, 40)
                .range("theta", 0.05, 3.09)
                .lineElement("-f*dt^2 + dr^2/f + r^2*(dtheta^2 + sin(theta)^2*dphi^2)");
    }

    public static MetricDefinition kerr() {
        return TestDefinition.of("kerr", "t", "r", "theta", "phi")
                .parameter("M", "1")
                .parameter("a", "1/2")
                .abbreviation("Sigma", "r^2 + a^2*cos(theta)^2")
                .abbreviation("Delta", "r^2 - 2*M*r + a^2")
                .condition("abs(a) < M")
                .condition("r > M + sqrt(M^2 - a^2)")
                .condition("0 < theta < pi")
                .range("r", 2.5, 40)
                .range("theta", 0.05, 3.09)
                .lineElement("-(1 - 2*M*r/Sigma)*dt^2 - 4*M*a*r*sin(theta)^2/Sigma*dt*dphi + Sigma/Delta*dr^2"
                        + " + Sigma*dtheta^2"
                        + " + (r^2 + a^2 + 2*M*a^2*r*sin(theta)^2/Sigma)*sin(theta)^2*dphi^2");
    }

    private static MetricDefinition kerrSchild() {
        return TestDefinition.of("kerr-schild", "t", "x", "y", "z")
                .parameter("M", "1")
                .parameter("a", "1/2")
                .abbreviation("b", "x^2 + y^2 + z^2 - a^2")
                .abbreviation("r", "sqrt((b + sqrt(b^2 + 4*a^2*z^2))/2)")
                .abbreviation("H", "M*r^3/(r^4 + a^2*z^2)")
                .abbreviation("lx", "(r*x + a*y)/(r^2 + a^2)")
                .abbreviation("ly", "(r*y - a*x)/(r^2 + a^2)")
                .lineElement("-dt^2 + dx^2 + dy^2 + dz^2 + 2*H*(dt + lx*dx + ly*dy + z/r*dz)^2");
    }

    /** A metric of eight dimensions all of whose components vary and are different from zero; invented. */
    public static MetricDefinition denseEight() {
        String[] coordinates = {"q1", "q2", "q3", "q4", "q5", "q6", "q7", "q8"};
        String[] rows = new String[8];
        for (int i = 0; i < 8; i++) {
            StringBuilder row = new StringBuilder();
            for (int j = 0; j <= i; j++) {
                String term = "sin(" + coordinates[i] + " + " + (j + 2) + "*" + coordinates[j] + ")/" + (20 + i + j);
                row.append(j > 0 ? "; " : "").append(i == j ? (i == 0 ? "-2 + " : "2 + ") + term : term);
            }
            rows[i] = row.toString();
        }
        return TestDefinition.of("dense-eight", coordinates).matrix(rows);
    }
}
