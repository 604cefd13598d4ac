package io.github.gammawright.catalogue;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The metrics in the catalogue are those of the literature: its closed forms, each row of the table with its source. */
class PublishedValuesOfCatalogueTest {

    /** A value that the closed form gives as 0 must vanish to this. */
    private static final BigDecimal NOTHING = new BigDecimal("1e-25");

    /**
     * How many of the independent Γ^k_ij differ from zero. Schwarzschild: Misner, Thorne &amp; Wheeler (1973) ch. 31; Kerr:
     * Boyer &amp; Lindquist (1967); Friedmann-Lemaître-Robertson-Walker: Weinberg (1972) ch. 14; Gödel (1949); sphere: do
     * Carmo (1976). The counts are from memory.
     */
    private static final Map<String, Integer> NON_ZERO = Map.ofEntries(
            Map.entry("minkowski", 0),
            Map.entry("polar-plane", 2),
            Map.entry("sphere", 2),
            Map.entry("ellipsoid-of-revolution", 3),
            Map.entry("schwarzschild", 9),
            Map.entry("kerr", 20),
            Map.entry("kerr-carter-frame", 20),
            Map.entry("kerr-three-plus-one", 20),
            Map.entry("flrw-flat", 6),
            Map.entry("flrw-flat-spherical", 12),
            Map.entry("flrw-open", 13),
            Map.entry("flrw-closed", 13),
            Map.entry("godel", 5),
            Map.entry("plane-wave", 5),
            Map.entry("dense-eight", 288));

    private record Row(
            String id,
            String definition,
            double[] parameters,
            double[] point,
            ReferenceQuantity quantity,
            int[] component,
            BigDecimal value,
            int digits,
            String formula) {}

    @Test
    void tableIsComplete() throws IOException {
        assertThat(rows()).hasSize(395);
        assertThat(rows().stream().map(Row::definition).distinct()).hasSize(28);
    }

    @TestFactory
    Stream<DynamicTest> catalogueAgreesWithClosedForms() throws IOException {
        return rows().stream()
                .map(row -> DynamicTest.dynamicTest(
                        row.id + " " + row.definition + " " + row.quantity.symbol() + ": " + row.formula,
                        () -> check(row)));
    }

    private static void check(Row row) {
        MetricDefinition definition = Definitions.builtIn(row.definition);
        List<Real> values =
                new ReferenceEvaluator(definition).at(row.parameters, row.point).values(row.quantity);
        List<Integer> extents = row.quantity.extents(definition.dimension());
        assertThat(row.component).hasSize(extents.size());
        int index = 0;
        for (int i = 0; i < row.component.length; i++) {
            index = index * extents.get(i) + row.component[i];
        }
        BigDecimal difference = values.get(index).toBigDecimal(40).subtract(row.value);
        BigDecimal allowed = row.value.signum() == 0
                ? NOTHING
                : row.value.abs().scaleByPowerOfTen(-row.digits).round(new MathContext(3));
        assertThat(difference.abs()).isLessThan(allowed);
    }

    @TestFactory
    Stream<DynamicTest> asManyChristoffelSymbolsDifferFromZeroAsTheLiteratureSays() {
        return NON_ZERO.entrySet().stream()
                .sorted(Map.Entry.comparingByKey())
                .map(entry -> DynamicTest.dynamicTest(
                        entry.getKey(),
                        () -> assertThat(nonZero(Definitions.builtIn(entry.getKey())))
                                .isEqualTo(entry.getValue())));
    }

    /** The number of Γ^k_ij with i ≥ j that are not zero at some point of three. */
    private static int nonZero(MetricDefinition definition) {
        int n = definition.dimension();
        boolean[] found = new boolean[n * n * n];
        SamplePoints.visit(definition, 3, point -> {
            List<Real> values = point.values(ReferenceQuantity.CHRISTOFFEL);
            for (int index = 0; index < found.length; index++) {
                found[index] |= Math.abs(values.get(index).toDouble()) > 1e-40;
            }
        });
        int count = 0;
        for (int index = 0; index < found.length; index++) {
            boolean independent = index / n % n >= index % n;
            count += independent && found[index] ? 1 : 0;
        }
        return count;
    }

    private static List<Row> rows() throws IOException {
        try (InputStream stream = PublishedValuesOfCatalogueTest.class.getResourceAsStream("published-values.tsv")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .map(line -> line.split("\t"))
                    .map(PublishedValuesOfCatalogueTest::row)
                    .toList();
        }
    }

    private static Row row(String[] cells) {
        assertThat(cells).as("cells, of which the last is the source").hasSize(10);
        assertThat(cells[9]).isNotBlank();
        return new Row(
                cells[0],
                cells[1],
                numbers(cells[2]),
                numbers(cells[3]),
                ReferenceQuantity.named(cells[4]).orElseThrow(),
                Arrays.stream(numbers(cells[5]))
                        .mapToInt(number -> (int) number)
                        .toArray(),
                new BigDecimal(cells[6]),
                Integer.parseInt(cells[7]),
                cells[8]);
    }

    private static double[] numbers(String cell) {
        return cell.isBlank()
                ? new double[0]
                : Stream.of(cell.split(" ")).mapToDouble(Double::parseDouble).toArray();
    }
}
