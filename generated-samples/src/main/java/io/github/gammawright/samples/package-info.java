/** Scenarios that run on kernels made by the plugin in this build. */
package io.github.gammawright.samples;
