package io.github.gammawright.samples;

/**
 * An invented sky: pale lamps on a dusky ground, and bands of latitude, hatched aslant, every thirty degrees. It depends on
 * nothing but the direction.
 */
final class LanternField {

    private static final int CELLS = 90;

    private static final int[] GROUND = {24, 30, 52};
    private static final int[] HATCH = {86, 118, 112};
    private static final int[] LAMP = {232, 226, 246};

    /**
     * The colour of a direction.
     *
     * @param theta the angle from the pole in radians
     * @param phi the azimuth in radians, any number of turns
     * @return red, green and blue as one number, as pictures have it
     */
    int colour(double theta, double phi) {
        double latitude = 90 - Math.toDegrees(theta);
        double longitude = Math.toDegrees(phi) - 360 * Math.floor(Math.toDegrees(phi) / 360);
        double lamp = lamp(latitude, longitude);
        int[] ground = hatched(latitude, longitude) ? HATCH : GROUND;
        int colour = 0;
        for (int channel = 0; channel < 3; channel++) {
            double value = ground[channel] + lamp * (LAMP[channel] - ground[channel]);
            colour = colour << 8 | (int) Math.round(value);
        }
        return colour;
    }

    private static boolean hatched(double latitude, double longitude) {
        double inBand = latitude - 30 * Math.floor(latitude / 30);
        double stripe = longitude + latitude - 3 * Math.floor((longitude + latitude) / 3);
        return inBand < 10 && stripe < 1.1;
    }

    /** Each cell of the sky has one lamp at most, at a place that its number alone decides. */
    private static double lamp(double latitude, double longitude) {
        int row = (int) Math.floor((latitude + 90) / 180 * CELLS);
        double height = Math.max(0.05, Math.cos(Math.toRadians((row + 0.5) * 180 / CELLS - 90)));
        int columns = Math.max(1, (int) (2 * CELLS * height));
        int column = (int) Math.floor(longitude / 360 * columns);
        long hash = mix(31L * row + 7919L * column + 17);
        if ((hash & 3) != 0) {
            return 0;
        }
        double x = longitude / 360 * columns - column - 0.2 - 0.6 * ((hash >>> 8 & 1023) / 1023.0);
        double y = (latitude + 90) / 180 * CELLS - row - 0.2 - 0.6 * ((hash >>> 18 & 1023) / 1023.0);
        double size = 0.06 + 0.12 * ((hash >>> 28 & 1023) / 1023.0);
        return Math.exp(-(x * x + y * y) / (size * size));
    }

    private static long mix(long value) {
        long z = value * 0x9E3779B97F4A7C15L;
        z = (z ^ z >>> 30) * 0xBF58476D1CE4E5B9L;
        z = (z ^ z >>> 27) * 0x94D049BB133111EBL;
        return (z ^ z >>> 31) & Long.MAX_VALUE;
    }
}
