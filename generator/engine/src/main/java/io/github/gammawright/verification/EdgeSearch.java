package io.github.gammawright.verification;

import io.github.gammawright.definition.MetricDefinition.Range;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.util.ArrayList;
import java.util.List;

/**
 * Finds points just inside the edges of a domain (horizons, axes, throats): from a point inside along each coordinate, in
 * both directions and beyond the sample box, to where a condition begins to fail, then back by a small part of the way.
 */
final class EdgeSearch {

    /** How far from the edge the points are, as parts of the way to it. */
    private static final double[] DISTANCES = {1e-8, 1e-6, 1e-4, 1e-2};

    /** A coordinate along which no condition fails within so many widths of its range has no edge there. */
    private static final double FARTHEST = 4;

    /** Steps in which the way out is searched, so that a domain beyond a gap isn't mistaken for the same. */
    private static final int STEPS = 64;

    private final ReferenceEvaluator evaluator;
    private final SampleBox box;

    EdgeSearch(ReferenceEvaluator evaluator, SampleBox box) {
        this.evaluator = evaluator;
        this.box = box;
    }

    /** At most so many points at edges, starting out from the given ones in turn. */
    List<SamplePoint> press(List<SamplePoint> inside, int wanted) {
        List<SamplePoint> pressed = new ArrayList<>();
        int fruitless = 0;
        for (SamplePoint start : inside) {
            int before = pressed.size();
            for (int i = 0; i < start.coordinates().length; i++) {
                for (int direction = -1; direction <= 1; direction += 2) {
                    pressed.addAll(along(start, i, direction));
                    if (pressed.size() >= wanted) {
                        return pressed.subList(0, wanted);
                    }
                }
            }
            fruitless = pressed.size() > before ? 0 : fruitless + 1;
            if (fruitless == 3) {
                break;
            }
        }
        return pressed;
    }

    private List<SamplePoint> along(SamplePoint start, int coordinate, int direction) {
        double from = start.coordinates()[coordinate];
        Range range = box.coordinate(coordinate);
        double width = Math.max(range.to() - range.from(), 1e-3 * Math.abs(from));
        double in = from;
        double out = Double.NaN;
        for (int step = 1; step <= STEPS && Double.isNaN(out); step++) {
            // Quadratic steps: fine near the point, and far in the end.
            double there = from + direction * width * FARTHEST * step * step / (STEPS * STEPS);
            if (isInside(start, coordinate, there)) {
                in = there;
            } else {
                out = there;
            }
        }
        if (Double.isNaN(out) || width == 0) {
            return List.of();
        }
        double edge = bisect(start, coordinate, in, out);
        List<SamplePoint> points = new ArrayList<>();
        for (double distance : DISTANCES) {
            double there = edge + distance * (from - edge);
            if (there != edge && isInside(start, coordinate, there)) {
                points.add(new SamplePoint(start.parameters(), moved(start, coordinate, there), true));
            }
        }
        return points;
    }

    /** The last double inside. */
    private double bisect(SamplePoint start, int coordinate, double inside, double outside) {
        double in = inside;
        double out = outside;
        while (true) {
            double middle = in + (out - in) / 2;
            if (middle == in || middle == out) {
                return in;
            }
            if (isInside(start, coordinate, middle)) {
                in = middle;
            } else {
                out = middle;
            }
        }
    }

    private boolean isInside(SamplePoint start, int coordinate, double value) {
        return evaluator.inDomain(start.parameters(), moved(start, coordinate, value));
    }

    private static double[] moved(SamplePoint start, int coordinate, double value) {
        double[] coordinates = start.coordinates();
        coordinates[coordinate] = value;
        return coordinates;
    }
}
