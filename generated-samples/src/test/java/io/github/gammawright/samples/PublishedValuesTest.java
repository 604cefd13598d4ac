package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.samples.kernels.EllipsoidOfRevolutionChristoffel;
import io.github.gammawright.samples.kernels.FlrwFlatChristoffel;
import io.github.gammawright.samples.kernels.FlrwFlatSphericalChristoffel;
import io.github.gammawright.samples.kernels.KerrChristoffel;
import io.github.gammawright.samples.kernels.SchwarzschildChristoffel;
import io.github.gammawright.samples.kernels.SphereChristoffel;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;

/** Compares kernels with values of closed forms from the literature; the file that holds them names each source. */
class PublishedValuesTest {

    /**
     * Twice the worst error that the closed forms themselves show in double precision off the horizon, rounded up, and
     * what the rounded flattening of the ellipsoid may change.
     */
    private static final double TOLERANCE = 1e-13;

    private static final Map<String, UnaryOperator<double[]>> KERNELS = Map.of(
            "sphere 2.5", new SphereChristoffel(2.5)::valuesAt,
            "schwarzschild 1", new SchwarzschildChristoffel(1)::valuesAt,
            "kerr 1 0.5", new KerrChristoffel(1, 0.5)::valuesAt,
            "ellipsoid-of-revolution", new EllipsoidOfRevolutionChristoffel()::valuesAt,
            "flrw-flat dust", new FlrwFlatChristoffel(ScaleFactors::dust)::valuesAt,
            "flrw-flat radiation", new FlrwFlatChristoffel(ScaleFactors::radiation)::valuesAt,
            "flrw-flat exponential 0.25", new FlrwFlatChristoffel(ScaleFactors::exponential)::valuesAt,
            "flrw-flat-spherical dust", new FlrwFlatSphericalChristoffel(ScaleFactors::dust)::valuesAt);

    @Test
    void kernelsGiveThePublishedValues() throws IOException {
        Map<String, Integer> compared = new HashMap<>();
        for (String line : lines()) {
            String[] columns = line.split("\t");
            double[] point = numbers(columns[2]);
            int[] index = Arrays.stream(columns[3].split(" "))
                    .mapToInt(Integer::parseInt)
                    .toArray();
            double published = Double.parseDouble(columns[4]);
            double[] values = KERNELS.get(columns[1]).apply(point);
            int n = point.length;
            for (int position : new int[] {
                (index[0] * n + index[1]) * n + index[2], (index[0] * n + index[2]) * n + index[1],
            }) {
                assertThat(values[position])
                        .as("%s: %s at %s, %s, %s", columns[0], columns[1], columns[2], columns[3], columns[5])
                        .isCloseTo(published, within(TOLERANCE * Math.abs(published)));
            }
            compared.merge(columns[1], 1, Integer::sum);
        }
        assertThat(compared)
                .isEqualTo(Map.of(
                        "sphere 2.5", 8,
                        "schwarzschild 1", 27,
                        "kerr 1 0.5", 20,
                        "ellipsoid-of-revolution", 12,
                        "flrw-flat dust", 6,
                        "flrw-flat radiation", 6,
                        "flrw-flat exponential 0.25", 6,
                        "flrw-flat-spherical dust", 12));
    }

    private static double[] numbers(String text) {
        return Arrays.stream(text.split(" ")).mapToDouble(Double::parseDouble).toArray();
    }

    private static List<String> lines() throws IOException {
        try (InputStream stream = PublishedValuesTest.class.getResourceAsStream("published-values.tsv")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .toList();
        }
    }
}
