package io.github.gammawright.verification.claims;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.ExpressionPrinter;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.Claims;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.verification.ClaimReport;
import io.github.gammawright.verification.ClaimReport.Witness;
import io.github.gammawright.verification.ClaimVerdict;
import io.github.gammawright.verification.SamplePoint;
import io.github.gammawright.verification.claims.ClaimPoints.Search;
import io.github.gammawright.verification.claims.Proof.Outcome;
import io.github.gammawright.verification.claims.Proof.Tensor;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferenceResiduals;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;

/**
 * Examines the claims of a definition. Each is tried in the reference at points of the domain, where a single point can
 * refute it, and then, if it says that something vanishes, proved by algebra where the budget allows. The outcome is the
 * same on every machine.
 */
public final class ClaimCheck {

    private static final String HARMLESS = "no point of the domain contradicts it";

    private final MetricDefinition definition;
    private final ClaimPoints points;
    private final Proof proof;
    private final Optional<List<Outcome>> freeOf;

    /** An examination in so many digits, at points that follow from the seed. */
    public ClaimCheck(MetricDefinition definition, int digits, long seed) {
        this.definition = definition;
        this.points = new ClaimPoints(new ReferenceEvaluator(definition, digits), seed);
        this.proof = new Proof(definition);
        this.freeOf = proof.freeOf();
    }

    /** What became of each claim, in the order in which definitions list them. */
    public List<ClaimReport> reports() {
        Claims claims = definition.claims();
        List<ClaimReport> reports = new ArrayList<>();
        claims.vacuum()
                .ifPresent(expected -> reports.add(vanishing(
                        "vacuum = " + expected,
                        expected,
                        new Statement(
                                "R",
                                2,
                                ReferenceResiduals::ricci,
                                List.of(),
                                Tensor.of(nodes -> nodes.einstein(nodes.graph().zero()))))));
        claims.signature().ifPresent(signature -> reports.add(signature(signature)));
        claims.independentOf().ifPresent(names -> names.forEach(name -> reports.add(independentOf(name))));
        claims.conformallyFlat().ifPresent(expected -> reports.add(conformallyFlat(expected)));
        claims.einsteinConstant().ifPresent(constant -> reports.add(einstein(constant)));
        claims.killing().forEach(field -> reports.add(killing(field)));
        return reports;
    }

    /** The coordinates of which the metric is free, claimed or not, by number. */
    public List<Integer> cyclicCoordinates() {
        List<Integer> cyclic = new ArrayList<>();
        for (int k = 0; k < definition.dimension(); k++) {
            if (freeOf.isPresent() && freeOf.get().get(k) != Outcome.OPEN) {
                cyclic.add(k);
            }
        }
        return cyclic;
    }

    /** Something that vanishes if a claim holds: its name and rank, what the reference and the algebra make of it. */
    private record Statement(
            String name,
            int rank,
            Function<ReferenceResiduals, List<Real>> residual,
            List<Expression> expressions,
            Tensor tensor) {}

    private ClaimReport vanishing(String claim, boolean expected, Statement statement) {
        Search search = points.search(statement.name(), statement.rank(), statement.residual());
        if (search.nonZero().isPresent()) {
            String explanation = "at one point " + value(search.nonZero().get()) + " instead of 0";
            return new ClaimReport(
                    claim,
                    expected ? ClaimVerdict.REFUTED : ClaimVerdict.PROVED,
                    search.points(),
                    explanation,
                    search.nonZero());
        }
        return vanishes(claim, expected, search.points(), proof.examine(statement.expressions(), statement.tensor()));
    }

    /** The report on a claim that something vanishes, or does not, when no point was found where it doesn't. */
    private static ClaimReport vanishes(String claim, boolean expected, int tried, Outcome outcome) {
        String how = switch (outcome) {
            case ZERO_BY_NORMAL_FORMS -> "every component has the normal form 0";
            case ZERO_IN_PRIME_FIELD -> "every component is 0 at random points of a prime field";
            case OPEN -> tried == 0 ? "no point of the domain could be tried" : HARMLESS;
        };
        if (outcome == Outcome.OPEN && tried == 0) {
            return new ClaimReport(claim, ClaimVerdict.NOT_TESTED, 0, how, Optional.empty());
        }
        if (!expected) {
            String no = outcome == Outcome.OPEN ? "it vanishes at every point that was tried" : how;
            return new ClaimReport(claim, ClaimVerdict.REFUTED, tried, no, Optional.empty());
        }
        ClaimVerdict verdict = switch (outcome) {
            case ZERO_BY_NORMAL_FORMS -> ClaimVerdict.PROVED;
            case ZERO_IN_PRIME_FIELD -> ClaimVerdict.CERTIFIED;
            case OPEN -> ClaimVerdict.TESTED;
        };
        return new ClaimReport(claim, verdict, tried, how, Optional.empty());
    }

    private ClaimReport conformallyFlat(boolean expected) {
        String claim = "conformally-flat = " + expected;
        int n = definition.dimension();
        if (n <= 2) {
            return new ClaimReport(
                    claim,
                    expected ? ClaimVerdict.PROVED : ClaimVerdict.REFUTED,
                    0,
                    "every metric of one or two dimensions is",
                    Optional.empty());
        }
        Tensor weyl = Tensor.of(MetricNodes::weyl);
        return vanishing(
                claim,
                expected,
                new Statement(
                        n == 3 ? "Cotton" : "C",
                        n == 3 ? 3 : 4,
                        ReferenceResiduals::conformalCurvature,
                        List.of(),
                        n == 3 ? Tensor.unknown() : weyl));
    }

    private ClaimReport einstein(Expression constant) {
        return vanishing(
                "einstein-constant = \"" + ExpressionPrinter.print(constant) + "\"",
                true,
                new Statement(
                        "(R − Λ g)",
                        2,
                        residuals -> residuals.einstein(constant),
                        List.of(constant),
                        (nodes, values) -> nodes.einstein(values.get(0))));
    }

    private ClaimReport killing(List<Expression> field) {
        String text = field.stream().map(ExpressionPrinter::print).collect(Collectors.joining(", "));
        return vanishing(
                "killing (" + text + ")",
                true,
                new Statement(
                        "(L_ξ g)",
                        2,
                        residuals -> residuals.killing(field),
                        field,
                        (nodes, values) -> nodes.killing(values)));
    }

    private ClaimReport independentOf(String name) {
        int k = definition.coordinates().indexOf(name);
        String claim = "independent-of " + name;
        Search search = points.search("∂_" + name + " g", 2, residuals -> residuals.derivativeOfMetric(k));
        if (search.nonZero().isPresent()) {
            return new ClaimReport(
                    claim,
                    ClaimVerdict.REFUTED,
                    search.points(),
                    "at one point " + value(search.nonZero().get()) + " instead of 0",
                    search.nonZero());
        }
        Outcome outcome = freeOf.map(outcomes -> outcomes.get(k)).orElse(Outcome.OPEN);
        if (outcome == Outcome.ZERO_BY_NORMAL_FORMS) {
            return new ClaimReport(
                    claim, ClaimVerdict.PROVED, search.points(), "it does not occur in the metric", Optional.empty());
        }
        return vanishes(claim, true, search.points(), outcome);
    }

    private ClaimReport signature(String claimed) {
        String claim = "signature = \"" + claimed + "\"";
        int negative = (int) claimed.chars().filter(sign -> sign == '-').count();
        int tried = 0;
        for (SamplePoint point : points.all()) {
            Optional<Inertia> inertia = points.inertia(point);
            if (inertia.isEmpty()) {
                continue;
            }
            tried++;
            if (inertia.get().negative() != negative) {
                return new ClaimReport(
                        claim,
                        ClaimVerdict.REFUTED,
                        tried,
                        "at one point it is " + "-".repeat(inertia.get().negative())
                                + "+".repeat(inertia.get().positive()),
                        Optional.of(new Witness(
                                ClaimPoints.boxed(point.parameters()),
                                ClaimPoints.boxed(point.coordinates()),
                                "number of negative eigenvalues",
                                inertia.get().negative())));
            }
        }
        boolean byFrame = definition.form() instanceof MetricForm.Coframe coframe
                && coframe.signs().stream().filter(sign -> sign < 0).count() == negative;
        if (byFrame) {
            return new ClaimReport(claim, ClaimVerdict.PROVED, tried, "it is that of the coframe", Optional.empty());
        }
        return tried == 0
                ? new ClaimReport(
                        claim, ClaimVerdict.NOT_TESTED, 0, "no point of the domain could be tried", Optional.empty())
                : new ClaimReport(claim, ClaimVerdict.TESTED, tried, HARMLESS, Optional.empty());
    }

    private static String value(Witness witness) {
        return witness.component() + " is " + witness.value();
    }
}
