/** Observers, their orthonormal frames, and the light that they see. */
package io.github.gammawright.runtime.frame;
