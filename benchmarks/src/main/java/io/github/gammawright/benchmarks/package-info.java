/** Benchmarks of kernels, and the comparison of metric choices. */
package io.github.gammawright.benchmarks;
