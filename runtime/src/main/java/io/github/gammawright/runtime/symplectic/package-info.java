/** Integrators that keep the structure of Hamilton's equations. */
package io.github.gammawright.runtime.symplectic;
