/**
 * Scenarios of our own invention that run on kernels made by the plugin in this build, from the definitions in
 * {@code src/main/gammawright}.
 */
package io.github.gammawright.samples;
