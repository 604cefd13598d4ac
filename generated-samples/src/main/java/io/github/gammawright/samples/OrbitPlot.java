package io.github.gammawright.samples;

import io.github.gammawright.runtime.orbit.Ending;
import io.github.gammawright.runtime.orbit.Run;
import io.github.gammawright.runtime.output.CsvWriter;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.knowm.xchart.XYChart;

/** Draws the probe Thistledown's way round the amber star: a rosette, since its periapsis turns from orbit to orbit. */
final class OrbitPlot {

    private static final double PROPER_TIME = 5000;
    private static final double INTERVAL = 2;

    private final ThistledownOrbit orbit = new ThistledownOrbit();

    /** Writes the picture, and the states beside it as CSV. */
    Ending draw(Path picture) throws IOException {
        List<Double> x = new ArrayList<>();
        List<Double> y = new ArrayList<>();
        Path table = picture.resolveSibling(picture.getFileName() + ".csv");
        Ending ending;
        try (CsvWriter csv = new CsvWriter(
                table,
                List.of("tau [M]", "t [M]", "r [M]", "theta [rad]", "phi [rad]", "u^t", "u^r", "u^theta", "u^phi"))) {
            ending = new Run(orbit.equation())
                    .recordSamples(INTERVAL, (properTime, state) -> {
                        csv.accept(properTime, state);
                        x.add(state[1] * Math.cos(state[3]));
                        y.add(state[1] * Math.sin(state[3]));
                    })
                    .follow(0, orbit.start(), PROPER_TIME);
        }
        XYChart chart = Plots.plot(
                "Thistledown round the amber star, its equatorial plane", "r cos φ [M]", "r sin φ [M]", 900, 900);
        Plots.line(chart, "Thistledown", array(x), array(y));
        chart.getStyler()
                .setXAxisMin(-42.0)
                .setXAxisMax(42.0)
                .setYAxisMin(-42.0)
                .setYAxisMax(42.0);
        Plots.save(chart, picture);
        return ending;
    }

    private static double[] array(List<Double> values) {
        return values.stream().mapToDouble(Double::doubleValue).toArray();
    }
}
