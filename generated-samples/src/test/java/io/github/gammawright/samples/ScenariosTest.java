package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.runtime.swarm.SwarmResult;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ScenariosTest {

    @TempDir
    Path folder;

    @BeforeAll
    static void withoutAScreen() {
        System.setProperty("java.awt.headless", "true");
    }

    @Test
    void plotsAreDrawn() throws IOException {
        new OrbitPlot().draw(folder.resolve("orbit.png"));
        new TwoClocks().draw(folder.resolve("clocks.png"));
        new ShortestWay().draw(folder.resolve("ellipsoid.png"));
        for (String name : new String[] {"orbit", "clocks", "ellipsoid"}) {
            BufferedImage image = ImageIO.read(folder.resolve(name + ".png").toFile());
            assertThat(image.getWidth()).isEqualTo(900);
            assertThat(inked(image)).as(name).isGreaterThan(100);
        }
        assertThat(Files.readAllLines(folder.resolve("orbit.png.csv"))).hasSize(2502);
    }

    private static int inked(BufferedImage image) {
        int count = 0;
        for (int x = 0; x < image.getWidth(); x++) {
            for (int y = 0; y < image.getHeight(); y++) {
                count += (image.getRGB(x, y) & 0xFFFFFF) == (Plots.INK.getRGB() & 0xFFFFFF) ? 1 : 0;
            }
        }
        return count;
    }

    /**
     * The shadow's width in the equatorial plane, seen from r = 40: the rays with the impact parameters of the two photon
     * orbits (Bardeen 1973; from memory) bound it, so that pixels within are dark and those outside are not.
     */
    @Test
    void theShadowLiesBetweenThePhotonOrbits() throws IOException {
        int width = 120;
        int height = 80;
        LensedSky sky = new LensedSky(width, height);
        SwarmResult rays = sky.trace();
        assertThat(rays.complete()).isTrue();
        assertThat(rays.failures()).isEmpty();
        int left = width;
        int right = 0;
        int dark = 0;
        for (int i = 0; i < width * height; i++) {
            assertThat(rays.value(i, 0)).isGreaterThanOrEqualTo(0);
            if (rays.value(i, 0) == 0) {
                dark++;
                left = Math.min(left, i % width);
                right = Math.max(right, i % width);
            }
        }
        // Angles from the middle: about b/r, the slower side where light goes against the hole's turning.
        double unit = 2 * Math.tan(0.4) / width;
        double a = LensedSky.SPIN;
        double with = Math.pow(2 * (1 + Math.cos(2.0 / 3 * Math.acos(-a))), 1.5) + a;
        double against = Math.pow(2 * (1 + Math.cos(2.0 / 3 * Math.acos(a))), 1.5) - a;
        assertThat((width / 2.0 - left) * unit * 40).isBetween(0.9 * with, 1.25 * with);
        assertThat((right + 1 - width / 2.0) * unit * 40).isBetween(0.9 * against, 1.25 * against);
        int[] counts = sky.draw(folder.resolve("sky.png"));
        assertThat(counts[0]).isEqualTo(dark);
        assertThat(counts[2]).isZero();
        assertThat(ImageIO.read(folder.resolve("sky.png").toFile()).getHeight()).isEqualTo(height);
    }
}
