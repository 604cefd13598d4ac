package io.github.gammawright.verification;

import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.IdentityReport.Residual;
import io.github.gammawright.verification.KernelInstance.Defect;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;

/**
 * Tries identities between the classes of one definition, with the values that the classes give. A residual may be as
 * large as the errors allow that the check of each class allows.
 */
final class IdentityCheck {

    /** At so many points: a wrong formula shows at almost any. */
    private static final int MOST_POINTS = 16;

    private final ReferenceEvaluator evaluator;
    private final CheckSettings settings;
    private final Map<Quantity, CheckedKernel> kernels = new EnumMap<>(Quantity.class);

    IdentityCheck(ReferenceEvaluator evaluator, CheckSettings settings) {
        this.evaluator = evaluator;
        this.settings = settings;
    }

    /** Takes a class in; of several of one quantity the first counts. */
    void add(CheckedKernel kernel) {
        kernels.putIfAbsent(kernel.quantity(), kernel);
    }

    /**
     * The reports on all identities whose quantities are there.
     *
     * @param sample points of the domain
     * @param cyclic the coordinates that the metric is free of
     */
    List<IdentityReport> reports(List<SamplePoint> sample, List<Integer> cyclic) {
        List<SamplePoint> points = selected(sample);
        List<IdentityTally> tallies = new ArrayList<>();
        for (Identity identity : Identity.values()) {
            if (kernels.keySet().containsAll(identity.quantities())) {
                tallies.add(new IdentityTally(identity));
            }
        }
        ReferenceTrio trio = new ReferenceTrio(evaluator);
        for (int p = 0; p < points.size() && !tallies.isEmpty(); p++) {
            trio.moveTo(points.get(p));
            IdentityPoint at = new IdentityPoint(kernels, settings, trio, points.get(p));
            double[] u = velocity(p);
            tallies.forEach(tally -> tally.add(at, u, evaluator.definition().dimension()));
        }
        List<IdentityReport> reports = new ArrayList<>();
        tallies.forEach(tally -> reports.add(tally.report()));
        FlowCheck.of(kernels, evaluator, cyclic).ifPresent(flow -> reports.addAll(flow.reports(points)));
        return reports;
    }

    private double[] velocity(int point) {
        return new Random(settings.seed() * 31 + point)
                .doubles(evaluator.definition().dimension(), -1, 1)
                .toArray();
    }

    /** Some of the points, spread over all of them, so that those at edges are among them. */
    private static List<SamplePoint> selected(List<SamplePoint> sample) {
        if (sample.size() <= MOST_POINTS) {
            return sample;
        }
        List<SamplePoint> selected = new ArrayList<>();
        for (int i = 0; i < MOST_POINTS; i++) {
            selected.add(sample.get((int) ((long) i * (sample.size() - 1) / (MOST_POINTS - 1))));
        }
        return selected;
    }

    /** What one identity has left over so far. */
    private static final class IdentityTally {

        private final Identity identity;
        private int points;
        private long compared;
        private long violations;
        private double worst;
        private Residual worstViolation;

        IdentityTally(Identity identity) {
            this.identity = identity;
        }

        void add(IdentityPoint at, double[] u, int n) {
            Identity.Residuals residuals = new Identity.Residuals(n);
            try {
                identity.residuals(at, u, residuals);
            } catch (Defect defect) {
                // The report of the class itself has it.
                return;
            }
            points++;
            for (int i = 0; i < residuals.values().size(); i++) {
                Approximate residual = residuals.values().get(i);
                if (Double.isNaN(residual.error()) || Double.isInfinite(residual.error())) {
                    // Undefined in the reference, too: a pole.
                    continue;
                }
                compared++;
                double excess = residual.excess();
                boolean violation = !(excess <= 1);
                violations += violation ? 1 : 0;
                if (violation && (worstViolation == null || excess > worst)) {
                    worstViolation = new Residual(
                            residuals.indices().get(i),
                            at.point().parameterList(),
                            at.point().coordinateList(),
                            residual.value(),
                            residual.error());
                }
                worst = Math.max(worst, excess);
            }
        }

        IdentityReport report() {
            return new IdentityReport(
                    identity.text(),
                    identity.formula(),
                    points,
                    compared,
                    worst,
                    violations,
                    Optional.ofNullable(worstViolation));
        }
    }
}
