package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.TestMetrics;
import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/**
 * The reference against published closed forms of metrics that the catalogue does not have; each row of the table names
 * its source. {@code PublishedValuesOfCatalogueTest} has the others.
 */
class PublishedValuesTest {

    /** The values are printed with 25 significant digits. */
    private static final int DIGITS = 24;

    /** A value that the closed form gives as 0 must vanish to this. */
    private static final BigDecimal NOTHING = new BigDecimal("1e-25");

    private record Row(
            String id,
            String definition,
            double[] parameters,
            double[] point,
            ReferenceQuantity quantity,
            int[] component,
            BigDecimal value,
            String formula) {}

    @Test
    void tableIsComplete() throws IOException {
        assertThat(rows()).hasSize(23);
        assertThat(rows().stream().map(Row::quantity).distinct()).hasSize(5);
    }

    @TestFactory
    Stream<DynamicTest> referenceAgreesWithClosedForms() throws IOException {
        return rows().stream()
                .map(row -> DynamicTest.dynamicTest(
                        row.id + " " + row.definition + " " + row.quantity.symbol() + ": " + row.formula,
                        () -> check(row)));
    }

    private static void check(Row row) {
        MetricDefinition definition = TestMetrics.named(row.definition);
        List<Real> values =
                new ReferenceEvaluator(definition).at(row.parameters, row.point).values(row.quantity);
        List<Integer> extents = row.quantity.extents(definition.dimension());
        assertThat(row.component).hasSize(extents.size());
        int index = 0;
        for (int i = 0; i < row.component.length; i++) {
            index = index * extents.get(i) + row.component[i];
        }
        Reals.assertClose(values.get(index), row.value, DIGITS, NOTHING, row.id);
    }

    private static List<Row> rows() throws IOException {
        try (InputStream stream = PublishedValuesTest.class.getResourceAsStream("published-values.tsv")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .map(line -> line.split("\t"))
                    .map(cells -> new Row(
                            cells[0],
                            cells[1],
                            numbers(cells[2]),
                            numbers(cells[3]),
                            ReferenceQuantity.named(cells[4]).orElseThrow(),
                            Stream.of(numbers(cells[5]))
                                    .flatMapToInt(d -> Arrays.stream(d).mapToInt(x -> (int) x))
                                    .toArray(),
                            new BigDecimal(cells[6]),
                            cells[7]))
                    .toList();
        }
    }

    private static double[] numbers(String cell) {
        return cell.isBlank()
                ? new double[0]
                : Stream.of(cell.split(" ")).mapToDouble(Double::parseDouble).toArray();
    }
}
