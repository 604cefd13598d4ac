package io.github.gammawright.samples;

import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Signature;
import io.github.gammawright.runtime.frame.Camera;
import io.github.gammawright.runtime.frame.Handedness;
import io.github.gammawright.runtime.frame.Observers;
import io.github.gammawright.runtime.orbit.Direction;
import io.github.gammawright.runtime.orbit.Outcome;
import io.github.gammawright.runtime.swarm.ProgressBar;
import io.github.gammawright.runtime.swarm.RayTask;
import io.github.gammawright.runtime.swarm.RayTracer;
import io.github.gammawright.runtime.swarm.Swarm;
import io.github.gammawright.runtime.swarm.SwarmResult;
import io.github.gammawright.samples.kernels.KerrHamiltonianFlow;
import io.github.gammawright.samples.kernels.KerrMetric;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;

/**
 * The lantern field, an invented sky, seen past the rotating hole Dunmere, another, by an observer at rest: the light of
 * each pixel is followed back to the sky or to the hole. Lengths are in units of the hole's mass.
 */
final class LensedSky {

    static final double SPIN = 0.95;

    private static final double OBSERVER = 40;
    private static final double INCLINATION = 1.4;
    private static final double SKY = 1000;
    private static final double FIELD_OF_VIEW = 0.8;
    private static final int DARK = 0x000000;
    private static final int UNKNOWN = 0x80687C;

    private final int width;
    private final int height;

    /** A picture of the given size in pixels. */
    LensedSky(int width, int height) {
        this.width = width;
        this.height = height;
    }

    /** What is kept of a ray: 1 for the sky, 0 for the hole, −1 where it ended otherwise; then θ and φ. */
    private final class Pixel implements RayTask {

        private final KerrHamiltonianFlow flow = new KerrHamiltonianFlow(1, SPIN);
        private final MetricTensor metric = new MetricTensor(4, new KerrMetric(1, SPIN)::evaluate);
        private final double[] point = {0, OBSERVER, INCLINATION, 0};
        private final double[] momentum = new double[4];
        private final Camera camera;
        private final RayTracer tracer;

        Pixel() {
            Observers observers = new Observers(metric, Signature.MOSTLY_PLUS);
            // Forward is inwards, up is towards the pole; right is where φ grows, so that the three are left-handed.
            camera = new Camera(observers.frame(
                    point,
                    observers.staticVelocity(point),
                    Handedness.LEFT,
                    new double[] {0, -1, 0, 0},
                    new double[] {0, 0, 0, 1},
                    new double[] {0, 0, -1, 0}));
            double edge = 1.002 * (1 + Math.sqrt(1 - SPIN * SPIN));
            tracer = new RayTracer(new HamiltonianEquation(4, flow::evaluate), 1e-9, 1e-9)
                    .within(flow::inDomain)
                    .maxSteps(20_000)
                    .until("hole", (parameter, y) -> y[1] - edge, Direction.DECREASING)
                    .until("sky", (parameter, y) -> y[1] - SKY, Direction.INCREASING);
        }

        @Override
        public void prepare(int index, double[] initial) {
            int row = index / width;
            double[] light = camera.incomingAtPixel(index - row * width, row, width, height, FIELD_OF_VIEW);
            metric.lower(point, light, momentum);
            System.arraycopy(point, 0, initial, 0, 4);
            System.arraycopy(momentum, 0, initial, 4, 4);
        }

        @Override
        public void follow(int index, double[] state, double[] result) {
            Outcome outcome = tracer.trace(0, state, -1e6, 1);
            result[0] = outcome == Outcome.EVENT ? tracer.surface() : -1;
            result[1] = state[2];
            result[2] = state[3];
        }
    }

    /** Follows all rays. */
    SwarmResult trace() {
        return new Swarm(8, 3, Pixel::new).tell(ProgressBar.onTerminal("rays")).follow(width * height);
    }

    /** Writes the picture, and returns how many rays ended at the hole, in the sky, and elsewhere. */
    int[] draw(Path picture) throws IOException {
        SwarmResult rays = trace();
        LanternField sky = new LanternField();
        BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
        int[] counts = new int[3];
        for (int i = 0; i < width * height; i++) {
            int end = rays.done(i) ? (int) rays.value(i, 0) : -1;
            int colour = end == 0 ? DARK : end < 0 ? UNKNOWN : sky.colour(rays.value(i, 1), rays.value(i, 2));
            image.setRGB(i % width, i / width, colour);
            counts[end < 0 ? 2 : end]++;
        }
        Files.createDirectories(picture.toAbsolutePath().getParent());
        ImageIO.write(image, "png", picture.toFile());
        rays.failures().forEach(System.err::println);
        return counts;
    }
}
