/** Trajectories and arrays in files: CSV and NumPy's format, streamed, and never half-written under their own name. */
package io.github.gammawright.runtime.output;
