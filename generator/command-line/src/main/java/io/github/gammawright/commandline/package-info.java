/** The commands of the program {@code gammawright}. */
package io.github.gammawright.commandline;
