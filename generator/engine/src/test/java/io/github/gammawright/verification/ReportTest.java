package io.github.gammawright.verification;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class ReportTest {

    private static final Deviation WORST = new Deviation(
            List.of(1, 2, 2), List.of(1.0, 0.5), List.of(0.0, 3.25), List.of(List.of(0.25)), 2.0, 2.5, 1.1e15, 4e14);

    private static final KernelReport FAILED = new KernelReport(
            "kernels.Trial",
            "a \"quoted\" \\ name\n\u03a3",
            CheckSettings.DEFAULT,
            70,
            10,
            List.of(
                    new QuantityReport(
                            "christoffel",
                            4480,
                            12,
                            0.25,
                            Optional.of(WORST),
                            0.125,
                            Optional.of(WORST),
                            0,
                            3,
                            Optional.of(WORST)),
                    new QuantityReport(
                            "metric",
                            700,
                            0,
                            0,
                            Optional.empty(),
                            Double.NaN,
                            Optional.empty(),
                            0,
                            0,
                            Optional.empty())),
            List.of("evaluate changes its inputs"),
            List.of(),
            Optional.empty(),
            List.of("line 3: [cast] redundant"),
            Optional.of(new MethodSize("kernels.Trial", "compute", 812)));

    private static final KernelReport NOT_CHECKED = new KernelReport(
            "kernels.Other",
            "other",
            CheckSettings.DEFAULT,
            0,
            0,
            List.of(),
            List.of(),
            List.of(),
            Optional.of("there is no point"),
            List.of(),
            Optional.empty());

    @Test
    void table() {
        assertThat(ReportTable.of(List.of(FAILED, NOT_CHECKED))).isEqualTo("""
                        kernels.Trial: failed, 70 points (10 at edges), largest method compute 812 bytecodes
                          quantity     compared  median ulp  worst ulp  median limit  worst limit  verdict
                          christoffel      4480        0.25    1.1e+15          0.13      4.0e+14  failed
                          metric            700        0.00          -             -            -  passed
                          worst by ulp: 1.1e+15 ulp, 4.0e+14 conditioning limits, christoffel[1, 2, 2] at [0.0, 3.25] with parameters [1.0, 0.5] and [0.25]
                          12 values of christoffel are undefined and not compared
                          3 values out of bounds, worst christoffel[1, 2, 2] at [0.0, 3.25] with parameters [1.0, 0.5] and [0.25]: 2.5 instead of 2.0
                          defect: evaluate changes its inputs
                          compiler warning, line 3: [cast] redundant

                        kernels.Other: not checked
                          not checked: there is no point
                        """);
    }

    @Test
    void json() {
        String worst =
                "{\"indices\": [1, 2, 2], \"parameters\": [1.0, 0.5], \"point\": [0.0, 3.25], \"inputs\": [[0.25]],"
                        + " \"expected\": 2.0, \"actual\": 2.5, \"ulps\": 1.1E15, \"limits\": 4.0E14}";
        assertThat(ReportJson.of(List.of(FAILED, NOT_CHECKED), List.of()))
                .isEqualTo("{\"passed\": false, \"kernels\": [{\"class\": \"kernels.Trial\","
                        + " \"definition\": \"a \\\"quoted\\\" \\\\ name\\u000a\\u03a3\", \"verdict\": \"failed\","
                        + " \"points\": 70, \"edgePoints\": 10, \"seed\": 1, \"digits\": 50,"
                        + " \"relativeBound\": 1.0E-11, \"limitMultiple\": 1000.0, \"notChecked\": null,"
                        + " \"defects\": [\"evaluate changes its inputs\"], \"notes\": [],"
                        + " \"warnings\": [\"line 3: [cast] redundant\"],"
                        + " \"largestMethod\": {\"name\": \"compute\", \"bytecodes\": 812},"
                        + " \"quantities\": [{\"quantity\": \"christoffel\", \"passed\": false, \"compared\": 4480,"
                        + " \"undefined\": 12, \"medianUlps\": 0.25, \"medianLimits\": 0.125, \"worstZero\": 0.0,"
                        + " \"violations\": 3, \"worstByUlps\": " + worst + ", \"worstByLimits\": " + worst
                        + ", \"worstViolation\": " + worst + "},"
                        + " {\"quantity\": \"metric\", \"passed\": true, \"compared\": 700, \"undefined\": 0,"
                        + " \"medianUlps\": 0.0, \"medianLimits\": null, \"worstZero\": 0.0, \"violations\": 0,"
                        + " \"worstByUlps\": null, \"worstByLimits\": null, \"worstViolation\": null}]},"
                        + " {\"class\": \"kernels.Other\", \"definition\": \"other\", \"verdict\": \"not checked\","
                        + " \"points\": 0, \"edgePoints\": 0, \"seed\": 1, \"digits\": 50,"
                        + " \"relativeBound\": 1.0E-11, \"limitMultiple\": 1000.0,"
                        + " \"notChecked\": \"there is no point\", \"defects\": [], \"notes\": [], \"warnings\": [],"
                        + " \"largestMethod\": null, \"quantities\": []}], \"definitions\": []}\n");
    }
}
