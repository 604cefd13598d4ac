/**
 * JMH benchmarks of kernels against what else gives the same numbers, and the program that prints them as a table.
 *
 * <p>The subject is the connection of Kerr's metric in Boyer–Lindquist coordinates. Each contender is the best version of
 * its idea that we could write; a test holds that all of them agree.
 */
package io.github.gammawright.benchmarks;
