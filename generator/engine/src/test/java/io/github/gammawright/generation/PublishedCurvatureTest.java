package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.io.IOException;
import java.io.InputStream;
import java.lang.reflect.InvocationHandler;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/**
 * Generated kernels against closed forms from the literature, each with its source in the table: Kretschmann's scalar of
 * Schwarzschild, Reissner–Nordström, Kerr and others (Henry 2000, ApJ 535, 350), 4Λ for de Sitter, Friedmann's equations
 * and the Ricci scalar of the expanding universes (Weinberg 1972, ch. 15), twice Gauss's curvature of torus and ellipsoids
 * (do Carmo 1976), Gödel's universe and the wormhole.
 */
class PublishedCurvatureTest {

    private static final List<Quantity> CURVATURE =
            List.of(Quantity.RICCI, Quantity.RICCI_SCALAR, Quantity.EINSTEIN, Quantity.KRETSCHMANN);

    private record Row(
            String id,
            String definition,
            double[] parameters,
            double[] point,
            Quantity quantity,
            int[] component,
            double value,
            String formula) {

        String kernel() {
            return definition + " " + quantity.symbol();
        }
    }

    /** a = t^(2/3), as the samples of the expanding universes have it. */
    private static final InvocationHandler DUST = (proxy, method, arguments) -> {
        double t = (double) arguments[0];
        double[] result = (double[]) arguments[1];
        double[] jet = {
            StrictMath.pow(t, 2.0 / 3), 2.0 / 3 * StrictMath.pow(t, -1.0 / 3), -2.0 / 9 * StrictMath.pow(t, -4.0 / 3)
        };
        System.arraycopy(jet, 0, result, 0, Math.min(jet.length, result.length));
        return null;
    };

    @Test
    void theTableIsThere() throws IOException {
        assertThat(rows()).hasSizeGreaterThanOrEqualTo(90);
        assertThat(rows().stream().map(Row::definition).distinct()).hasSizeGreaterThanOrEqualTo(20);
    }

    @TestFactory
    Stream<DynamicTest> kernelsAgreeWithClosedForms() throws IOException {
        Map<String, List<Row>> byKernel =
                rows().stream().collect(Collectors.groupingBy(Row::kernel, TreeMap::new, Collectors.toList()));
        return byKernel.entrySet().stream()
                .map(entry -> DynamicTest.dynamicTest(entry.getKey(), () -> check(entry.getValue())));
    }

    private static void check(List<Row> rows) {
        Row first = rows.get(0);
        InvocationHandler functions = first.definition.startsWith("flrw") ? DUST : null;
        TrialKernel kernel = TrialKernel.of(first.definition, first.quantity, Layout.FULL, functions);
        for (Row row : rows) {
            double[] values = kernel.values(row.parameters, row.point);
            int n = row.point.length;
            int index = row.component.length == 0 ? 0 : row.component[0] * n + row.component[1];
            double scale = Math.max(Math.abs(row.value), row.value == 0 ? 1e-2 : 0);
            assertThat(values[index]).as(row.id + " " + row.formula).isEqualTo(row.value, within(1e-11 * scale));
        }
    }

    private static List<Row> rows() throws IOException {
        try (InputStream stream = PublishedCurvatureTest.class.getResourceAsStream(
                "/io/github/gammawright/catalogue/published-values.tsv")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .map(line -> line.split("\t"))
                    .filter(cells ->
                            Quantity.named(cells[4]).filter(CURVATURE::contains).isPresent())
                    // profiles of waves and of wormholes are functions of their own, which other tests have
                    .filter(cells ->
                            !List.of("plane-wave", "morris-thorne-wormhole").contains(cells[1]))
                    .map(cells -> new Row(
                            cells[0],
                            cells[1],
                            numbers(cells[2]),
                            numbers(cells[3]),
                            Quantity.named(cells[4]).orElseThrow(),
                            Arrays.stream(numbers(cells[5]))
                                    .mapToInt(x -> (int) x)
                                    .toArray(),
                            Double.parseDouble(cells[6]),
                            cells[8]))
                    .toList();
        }
    }

    private static double[] numbers(String cell) {
        return cell.isBlank()
                ? new double[0]
                : Stream.of(cell.split(" ")).mapToDouble(Double::parseDouble).toArray();
    }
}
