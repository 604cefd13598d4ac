/** The definitions that come with the engine, as texts; reading them is the business of {@code definition}. */
package io.github.gammawright.catalogue;
