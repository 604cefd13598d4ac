/**
 * Runs of one state along its curve: integrators, events, dense output, and how a run ended.
 *
 * <p>Which integrator: the default, adaptive and of order 8, serves for everything, and best where steps should follow the
 * motion. The collocation of {@code runtime.symplectic} serves where constants must not drift however long the run, in the
 * form of Hamilton, with a step that resolves the fastest motion. Measured on two bound orbits round Kerr's hole of a = 0.9
 * (p = 6, e = 0.5 and p = 12, e = 0.3, θ from π/3) after 1,000 radial periods: Carter's constant off by 6e-12 and 1.4e-11 with
 * the default in 2.2 and 2.7 million evaluations; off by 6e-14 and 4e-14, without a trend, with collocation of order 6 and
 * steps of 0.125 and 0.5, in 20 and 15 million evaluations. Energy and axial momentum stay to the last bit in the form of
 * Hamilton with either.
 */
package io.github.gammawright.runtime.orbit;
