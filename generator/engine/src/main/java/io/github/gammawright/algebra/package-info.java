/**
 * Normal forms of the values of a graph, and everything else that is asked of a computer algebra system: the only
 * package that knows JAS and Symja. Each step has a budget that counts work, and each result is certified before it
 * leaves the package.
 */
package io.github.gammawright.algebra;
