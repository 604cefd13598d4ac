/** Runs of one state along its curve: integrators, events, dense output, and how a run ended. */
package io.github.gammawright.runtime.orbit;
