/** The goals of the Maven plugin. */
package io.github.gammawright.maven;
