package io.github.gammawright.samples;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Locale;

/** Runs one scenario: {@code java -jar gammawright-samples.jar NAME [PICTURE.png]}. */
public final class Scenarios {

    private static final String USAGE = """
            java -jar gammawright-samples.jar NAME [PICTURE.png]

            orbit      the probe Thistledown round the amber star: a table of its periapses, a rosette, a CSV file
            sky        the lantern field seen past the rotating hole Dunmere
            clocks     two ferries' clocks on two orbits of one black hole
            ellipsoid  a balloon race of 10,000 km on the WGS84 ellipsoid

            Without PICTURE.png the picture is NAME.png in the current folder.
            For research use: not validated for navigation or other safety-critical use.
            """;

    private Scenarios() {}

    /** Runs the scenario that is named; exits with 2 where it is not known. */
    public static void main(String[] arguments) throws IOException {
        System.setProperty("java.awt.headless", "true");
        if (arguments.length < 1 || arguments.length > 2 || !run(arguments)) {
            System.err.print(USAGE);
            System.exit(2);
        }
    }

    private static boolean run(String[] arguments) throws IOException {
        String name = arguments[0];
        Path picture = Path.of(arguments.length == 2 ? arguments[1] : name + ".png");
        switch (name) {
            case "orbit" -> {
                ThistledownOrbit.main(new String[0]);
                new OrbitPlot().draw(picture);
            }
            case "sky" -> {
                int[] counts = new LensedSky(960, 640).draw(picture);
                System.out.printf(
                        Locale.ROOT,
                        "%d rays to the hole, %d to the sky, %d elsewhere%n",
                        counts[0],
                        counts[1],
                        counts[2]);
            }
            case "clocks" -> new TwoClocks().draw(picture);
            case "ellipsoid" -> {
                double[] end = new ShortestWay().draw(picture);
                System.out.printf(
                        Locale.ROOT,
                        "ends at latitude %.9f°, longitude %.9f°, with azimuth %.9f°%n",
                        Math.toDegrees(end[0]),
                        Math.toDegrees(end[1]),
                        Math.toDegrees(end[2]));
            }
            default -> {
                return false;
            }
        }
        System.out.println("wrote " + picture);
        return true;
    }
}
