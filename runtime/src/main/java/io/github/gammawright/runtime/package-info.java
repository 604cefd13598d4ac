/** What turns a kernel into a system for ODE integrators, into frames, orbits and ray bundles. */
package io.github.gammawright.runtime;
