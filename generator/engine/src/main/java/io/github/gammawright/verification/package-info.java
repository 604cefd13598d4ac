/**
 * Checks generated classes: compiles them in memory, runs them at points of the definition's domain and compares every
 * component with the independent reference.
 *
 * <p>{@link io.github.gammawright.verification.KernelCheck} puts the parts together; {@link
 * io.github.gammawright.verification.ReportTable} and {@link io.github.gammawright.verification.ReportJson} print what
 * it finds.
 */
package io.github.gammawright.verification;
