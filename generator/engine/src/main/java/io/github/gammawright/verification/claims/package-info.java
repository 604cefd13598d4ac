/** What the author of a definition believes of the metric: proved, tested at points, or refuted by one. */
package io.github.gammawright.verification.claims;
