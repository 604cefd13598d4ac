package io.github.gammawright.verification.reference;

import java.util.ArrayList;
import java.util.List;

/**
 * An orthonormal frame and its connection: the dual of the definition's coframe, or the Gram-Schmidt process on the
 * coordinate directions in the order of {@link FrameOrder}. Undefined where there is none for the whole domain.
 */
final class ReferenceFrame {

    private final ReferenceGeometry geometry;
    private final int n;
    /** e_a^i. */
    private final Taylor[][] legs;

    private ReferenceFrame(ReferenceGeometry geometry) {
        this.geometry = geometry;
        this.n = geometry.dimension();
        this.legs = new Taylor[n][];
    }

    /** e_a^i = ±g^ij ω^a_j. */
    static ReferenceFrame ofCoframe(ReferenceGeometry geometry, Taylor[][] oneForms, List<Integer> signs) {
        ReferenceFrame frame = new ReferenceFrame(geometry);
        Taylor[][] inverse = geometry.inverse(geometry.order());
        for (int a = 0; a < frame.n; a++) {
            frame.legs[a] = new Taylor[frame.n];
            for (int i = 0; i < frame.n; i++) {
                Taylor sum = geometry.zero(geometry.order());
                for (int j = 0; j < frame.n; j++) {
                    sum = ReferenceGeometry.plusProduct(sum, inverse[i][j], oneForms[a][j]);
                }
                frame.legs[a][i] = signs.get(a) < 0 ? sum.negate() : sum;
            }
        }
        return frame;
    }

    static ReferenceFrame ofDirections(ReferenceGeometry geometry, List<FrameOrder.Step> order) {
        ReferenceFrame frame = new ReferenceFrame(geometry);
        List<Taylor[]> found = new ArrayList<>();
        for (FrameOrder.Step step : order) {
            Taylor[] direction = frame.across(found, step.coordinate());
            if (step.nullCoordinate() < 0) {
                frame.legs[step.coordinate()] = frame.normalised(direction);
            } else {
                frame.pair(step, direction, frame.across(found, step.nullCoordinate()));
                found.add(frame.legs[step.nullCoordinate()]);
            }
            found.add(frame.legs[step.coordinate()]);
        }
        return frame;
    }

    /** ∂_k less its parts along the legs. */
    private Taylor[] across(List<Taylor[]> found, int k) {
        Taylor[] vector = new Taylor[n];
        for (int i = 0; i < n; i++) {
            vector[i] = i == k ? geometry.ring().constant(Real.ONE) : geometry.zero(geometry.order());
        }
        Taylor[] direction = vector.clone();
        for (Taylor[] leg : found) {
            Taylor part = product(direction, leg);
            if (product(leg, leg).value().signum() < 0) {
                part = part.negate();
            }
            for (int i = 0; i < n; i++) {
                vector[i] = vector[i].minus(part.times(leg[i]));
            }
        }
        return vector;
    }

    private Taylor[] normalised(Taylor[] vector) {
        Taylor square = product(vector, vector);
        Taylor norm = (square.value().signum() < 0 ? square.negate() : square).sqrt();
        Taylor[] leg = new Taylor[n];
        for (int i = 0; i < n; i++) {
            leg[i] = vector[i].dividedBy(norm);
        }
        return leg;
    }

    /** (N ∓ k)/√2 with N null and N·k = 1. */
    private void pair(FrameOrder.Step step, Taylor[] direction, Taylor[] nullDirection) {
        Taylor product = product(direction, nullDirection);
        Taylor half = product(direction, direction).dividedBy(product).half();
        Taylor root = geometry.ring().constant(Real.of(2)).sqrt();
        Taylor[] minus = new Taylor[n];
        Taylor[] plus = new Taylor[n];
        for (int i = 0; i < n; i++) {
            Taylor other = direction[i].minus(half.times(nullDirection[i]));
            Taylor along = nullDirection[i].dividedBy(product);
            minus[i] = other.minus(along).dividedBy(root);
            plus[i] = other.plus(along).dividedBy(root);
        }
        legs[step.coordinate()] = minus;
        legs[step.nullCoordinate()] = plus;
    }

    private Taylor product(Taylor[] u, Taylor[] v) {
        Taylor sum = geometry.zero(geometry.order());
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                if (!u[i].isAbsent() && !v[j].isAbsent()) {
                    sum = ReferenceGeometry.plusProduct(sum, geometry.metric()[i][j], u[i].times(v[j]));
                }
            }
        }
        return sum;
    }

    private boolean isComplete() {
        for (Taylor[] leg : legs) {
            if (leg == null) {
                return false;
            }
        }
        return true;
    }

    /** e_a^i, row-major. */
    Taylor[] vectors() {
        if (!isComplete()) {
            return undefined(n * n);
        }
        List<Taylor> all = new ArrayList<>();
        for (Taylor[] leg : legs) {
            all.addAll(List.of(leg));
        }
        return all.toArray(Taylor[]::new);
    }

    /** γ_abc = g_kl e_a^k e_c^i (∂_i e_b^l + Γ^l_ij e_b^j), row-major. */
    Taylor[] rotationCoefficients() {
        if (!isComplete()) {
            return undefined(n * n * n);
        }
        int order = geometry.order() - 1;
        Taylor[][][] gamma = geometry.christoffel();
        List<Taylor> all = new ArrayList<>();
        Taylor[][][] covariant = new Taylor[n][n][n];
        for (int b = 0; b < n; b++) {
            for (int i = 0; i < n; i++) {
                for (int l = 0; l < n; l++) {
                    Taylor sum = geometry.derivative(legs[b][l], i);
                    for (int j = 0; j < n; j++) {
                        sum = ReferenceGeometry.plusProduct(sum, gamma[l][i][j], legs[b][j]);
                    }
                    covariant[b][i][l] = sum;
                }
            }
        }
        for (int a = 0; a < n; a++) {
            Taylor[] lowered = lowered(legs[a]);
            for (int b = 0; b < n; b++) {
                for (int c = 0; c < n; c++) {
                    Taylor sum = geometry.zero(order);
                    for (int i = 0; i < n; i++) {
                        for (int l = 0; l < n; l++) {
                            if (!legs[c][i].isAbsent() && !lowered[l].isAbsent()) {
                                sum = ReferenceGeometry.plusProduct(
                                        sum, covariant[b][i][l], legs[c][i].times(lowered[l]));
                            }
                        }
                    }
                    all.add(sum);
                }
            }
        }
        return all.toArray(Taylor[]::new);
    }

    private Taylor[] lowered(Taylor[] vector) {
        Taylor[] lowered = new Taylor[n];
        for (int l = 0; l < n; l++) {
            lowered[l] = geometry.zero(geometry.order());
            for (int k = 0; k < n; k++) {
                lowered[l] = ReferenceGeometry.plusProduct(lowered[l], geometry.metric()[k][l], vector[k]);
            }
        }
        return lowered;
    }

    private Taylor[] undefined(int count) {
        Taylor[] all = new Taylor[count];
        java.util.Arrays.fill(all, geometry.ring().undefined());
        return all;
    }
}
