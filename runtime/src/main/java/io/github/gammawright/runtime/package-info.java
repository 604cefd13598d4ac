/**
 * What turns a kernel into a system for ODE integrators.
 *
 * <p>Nothing here knows the generator, nor a generated class this package: a kernel comes in as a method reference,
 * {@code new GeodesicEquation(4, new KerrGeodesicAcceleration(1.0, 0.6)::evaluate)}, so that generated and hand-written
 * code serve alike. Index order, units and sign conventions are those of the kernel that is handed in.
 */
package io.github.gammawright.runtime;
