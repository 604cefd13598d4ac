/** Constants of the motion, and how well a run keeps them. */
package io.github.gammawright.runtime.conserved;
