package io.github.gammawright.samples;

import java.awt.BasicStroke;
import java.awt.Color;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.knowm.xchart.BitmapEncoder;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYChartBuilder;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.markers.None;

/** The look that the scenarios' plots share. */
final class Plots {

    static final Color INK = new Color(0x2B, 0x3A, 0x55);
    static final Color MOSS = new Color(0x4F, 0x7F, 0x5B);
    static final Color PLUM = new Color(0x84, 0x4B, 0x7A);

    private Plots() {}

    /** An empty plot; axes are named with their units. */
    static XYChart plot(String title, String x, String y, int width, int height) {
        XYChart chart = new XYChartBuilder()
                .title(title)
                .xAxisTitle(x)
                .yAxisTitle(y)
                .width(width)
                .height(height)
                .build();
        chart.getStyler().setPlotGridLinesColor(new Color(0xDD, 0xE1, 0xE6));
        chart.getStyler()
                .setChartBackgroundColor(Color.WHITE)
                .setPlotBackgroundColor(Color.WHITE)
                .setSeriesColors(new Color[] {INK, MOSS, PLUM})
                .setLegendVisible(true);
        return chart;
    }

    /** Adds a thin line. */
    static void line(XYChart chart, String name, double[] x, double[] y) {
        XYSeries series = chart.addSeries(name, x, y);
        series.setMarker(new None());
        series.setLineStyle(new BasicStroke(1.4f));
    }

    /** Writes a plot as PNG. */
    static void save(XYChart chart, Path file) {
        try {
            Files.createDirectories(file.toAbsolutePath().getParent());
            BitmapEncoder.saveBitmap(chart, file.toString(), BitmapEncoder.BitmapFormat.PNG);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }
}
