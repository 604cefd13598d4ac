package io.github.gammawright.runtime.frame;

import java.util.Objects;

/**
 * Where an observer's pixels look: a frame of four dimensions whose e_1 points forward, e_2 to the right and e_3 up in the
 * picture, and light of unit energy in that frame. Forward, right and up are a left-handed triad: ask for
 * {@link Handedness#LEFT} where the coordinates are right-handed, as t, r, θ, φ are.
 *
 * <p>A picture is made by following the light of each pixel back in time: integrate from {@link #incoming} towards smaller
 * parameters.
 */
public final class Camera {

    private final OrthonormalFrame frame;

    /**
     * Takes the frame.
     *
     * @param frame e_0 the observer's velocity, e_1 forward, e_2 right, e_3 up
     * @throws IllegalArgumentException if it has not four vectors
     */
    public Camera(OrthonormalFrame frame) {
        this.frame = Objects.requireNonNull(frame, "frame");
        if (frame.dimension() != 4) {
            throw new IllegalArgumentException("a camera needs a frame of 4 vectors, not " + frame.dimension());
        }
    }

    /** The frame. */
    public OrthonormalFrame frame() {
        return frame;
    }

    /**
     * The velocity k^i of the light that arrives from a direction, k = e_0 − n, with energy 1 for the observer.
     *
     * @param right the angle to the right of e_1 in radians, measured round e_3
     * @param up the angle above the plane of e_1 and e_2 in radians
     * @return k^i, a new array, to the future
     */
    public double[] incoming(double right, double up) {
        double c = Math.cos(up);
        return frame.toCoordinates(1, -c * Math.cos(right), -c * Math.sin(right), -Math.sin(up));
    }

    /** The velocity of light that is sent into a direction, k = e_0 + n; see {@link #incoming} for the angles. */
    public double[] outgoing(double right, double up) {
        double c = Math.cos(up);
        return frame.toCoordinates(1, c * Math.cos(right), c * Math.sin(right), Math.sin(up));
    }

    /**
     * The light that arrives at a pixel of a plane picture (gnomonic projection, as a pinhole makes it).
     *
     * @param column the pixel's column, from 0 at the left; may lie between pixels
     * @param row the pixel's row, from 0 at the top
     * @param width how many columns the picture has
     * @param height how many rows it has
     * @param fieldOfView the angle between the left and the right edge in radians, below π
     * @return k^i as in {@link #incoming}
     */
    public double[] incomingAtPixel(double column, double row, int width, int height, double fieldOfView) {
        if (!(fieldOfView > 0 && fieldOfView < Math.PI)) {
            throw new IllegalArgumentException("a plane picture shows an angle between 0 and π, not " + fieldOfView);
        }
        double unit = 2 * Math.tan(fieldOfView / 2) / width;
        double x = (column + 0.5 - 0.5 * width) * unit;
        double y = (0.5 * height - row - 0.5) * unit;
        return incoming(Math.atan(x), Math.atan2(y, Math.hypot(1, x)));
    }
}
