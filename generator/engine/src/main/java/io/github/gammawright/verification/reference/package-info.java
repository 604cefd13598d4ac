/**
 * The independent reference: evaluates the syntax tree of a definition in many digits, with truncated power series for
 * the derivatives and a numeric inverse of the metric. It shares nothing with the stages that make kernels but the
 * parser's syntax tree, so that a mistake there cannot hide here.
 *
 * <p>Three layers, each using only the ones before it: binary floating-point numbers of any precision ({@code Real},
 * {@code RealArithmetic} and its elementary functions); truncated power series in several variables ({@code Taylor});
 * geometry over such series ({@code ReferenceGeometry}), from which {@link
 * io.github.gammawright.verification.reference.ReferenceEvaluator} gives the values of quantities and their
 * conditioning limits.
 */
package io.github.gammawright.verification.reference;
