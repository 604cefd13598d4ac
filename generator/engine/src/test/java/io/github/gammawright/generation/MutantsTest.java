package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.CompilationFailure;
import io.github.gammawright.verification.IdentityReport;
import io.github.gammawright.verification.KernelCheck;
import io.github.gammawright.verification.KernelReport;
import io.github.gammawright.verification.KernelReport.Verdict;
import io.github.gammawright.verification.KernelUnderTest;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** Kernels made wrong on purpose: a sign, an index, a factor, a dropped term, a constant in its twelfth digit. */
class MutantsTest {

    private static final int WANTED = 30;
    private static final CheckSettings FEW_POINTS =
            CheckSettings.DEFAULT.withPoints(4).withEdgePoints(2);

    private static final List<Quantity> CONNECTED = List.of(
            Quantity.METRIC,
            Quantity.INVERSE_METRIC,
            Quantity.VOLUME_ELEMENT,
            Quantity.METRIC_DERIVATIVE,
            Quantity.CHRISTOFFEL,
            Quantity.CHRISTOFFEL_FIRST_KIND,
            Quantity.CHRISTOFFEL_TRACE,
            Quantity.CONTRACTED_CHRISTOFFEL,
            Quantity.GEODESIC_ACCELERATION,
            Quantity.HAMILTONIAN_FLOW);

    /** In the body: an operation between two values, an index of an array, or a plain factor. */
    private static final List<Mutation> MUTATIONS = List.of(
            new Mutation("sign", Pattern.compile("(?<=[\\w)\\]]) \\+ (?=[\\w(])"), " - "),
            new Mutation("sign", Pattern.compile("(?<=[\\w)\\]]) - (?=[\\w(])"), " + "),
            new Mutation("factor", Pattern.compile("(?<=[\\w)\\]]) \\* (?=[\\w(])"), " * 2.0 * "),
            new Mutation("constant in the twelfth digit", Pattern.compile(" = (?=[\\w(-])"), " = 1.000000000003 * "),
            new Mutation("dropped term", Pattern.compile("(?<=[\\w)\\]]) [+-] \\w+(?=;)"), ""),
            new Mutation("quotient for product", Pattern.compile("(?<=[\\w)\\]]) \\* (?=\\w)"), " / "));

    private record Mutation(String name, Pattern pattern, String replacement) {}

    @Test
    void everyMutantIsCaught() {
        Random random = new Random(17);
        Map<String, Integer> caught = new java.util.TreeMap<>();
        int made = 0;
        for (String name : List.of("schwarzschild", "flrw-closed", "ellipsoid-of-revolution")) {
            MetricDefinition definition = definition(name);
            KernelCheck check = new KernelCheck(definition, FEW_POINTS);
            for (Quantity quantity :
                    List.of(Quantity.CHRISTOFFEL, Quantity.GEODESIC_ACCELERATION, Quantity.HAMILTONIAN_FLOW)) {
                GeneratedClass original = generate(definition, quantity);
                assertThat(check.check(underTest(original, original.source())).verdict())
                        .isEqualTo(Verdict.PASSED);
                for (int k = 0; k < 4; k++) {
                    Mutation mutation = MUTATIONS.get(made % MUTATIONS.size());
                    Optional<String> mutant = mutate(original.source(), mutation, random);
                    made++;
                    if (mutant.isPresent() && isCaught(check, underTest(original, mutant.get()))) {
                        caught.merge(mutation.name(), 1, Integer::sum);
                    } else {
                        assertThat(mutant)
                                .as("%s in %s of %s", mutation.name(), quantity, name)
                                .isEmpty();
                    }
                }
            }
        }
        assertThat(caught.values().stream().mapToInt(Integer::intValue).sum())
                .as("%s", caught)
                .isGreaterThanOrEqualTo(WANTED);
        assertThat(caught).hasSizeGreaterThanOrEqualTo(4);
    }

    private static boolean isCaught(KernelCheck check, KernelUnderTest mutant) {
        try {
            KernelReport report = check.check(mutant);
            return report.verdict() == Verdict.FAILED;
        } catch (CompilationFailure wrongJava) {
            throw new AssertionError(String.join("\n", wrongJava.errors()) + "\n" + mutant.source(), wrongJava);
        }
    }

    /** One place of the arithmetic changed; nothing if there is no such place. */
    private static Optional<String> mutate(String source, Mutation mutation, Random random) {
        int start = source.indexOf("private void compute(");
        int end = source.indexOf("\n    }\n", start);
        Matcher matcher = mutation.pattern().matcher(source).region(start, end);
        matcher.useTransparentBounds(true);
        List<int[]> places = new ArrayList<>();
        while (matcher.find()) {
            String line = source.substring(
                    source.lastIndexOf('\n', matcher.start()) + 1, source.indexOf('\n', matcher.start()));
            if (!line.contains("= 0.0;")) {
                places.add(new int[] {matcher.start(), matcher.end()});
            }
        }
        if (places.isEmpty()) {
            return Optional.empty();
        }
        int[] place = places.get(random.nextInt(places.size()));
        return Optional.of(source.substring(0, place[0]) + mutation.replacement() + source.substring(place[1]));
    }

    /** Each wrong class breaks an identity that ties it to the others, whatever the reference says. */
    @Test
    void identitiesCatchWrongClassesToo() {
        MetricDefinition definition = definition("sphere");
        Map<Quantity, List<String>> broken = new EnumMap<>(Quantity.class);
        Map<Quantity, GeneratedClass> classes = new EnumMap<>(Quantity.class);
        for (Quantity quantity : CONNECTED) {
            classes.put(quantity, generate(definition, quantity));
        }
        for (Quantity wrong : List.of(
                Quantity.METRIC,
                Quantity.VOLUME_ELEMENT,
                Quantity.CHRISTOFFEL,
                Quantity.GEODESIC_ACCELERATION,
                Quantity.HAMILTONIAN_FLOW)) {
            KernelCheck check = new KernelCheck(definition, FEW_POINTS);
            classes.forEach((quantity, made) ->
                    check.check(underTest(made, quantity == wrong ? doubled(made.source()) : made.source())));
            List<String> failed = check.identities(List.of(1)).stream()
                    .filter(identity -> !identity.passed())
                    .map(IdentityReport::name)
                    .toList();
            broken.put(wrong, failed);
        }

        assertThat(broken)
                .allSatisfy((quantity, identities) ->
                        assertThat(identities).as("%s", quantity).isNotEmpty());
        // The wrong component is that of theta, which leaves the momentum along phi alone.
        assertThat(broken.get(Quantity.GEODESIC_ACCELERATION))
                .containsExactly("Euler–Lagrange", "conservation of g(u,u)");
        assertThat(broken.get(Quantity.HAMILTONIAN_FLOW)).containsExactly("Hamilton = Lagrange");
        assertThat(broken.get(Quantity.VOLUME_ELEMENT)).containsExactly("volume");
    }

    @Test
    void identitiesHoldForRightClasses() {
        MetricDefinition definition = definition("sphere");
        KernelCheck check = new KernelCheck(definition, FEW_POINTS);
        for (Quantity quantity : CONNECTED) {
            GeneratedClass made = generate(definition, quantity);
            check.check(underTest(made, made.source()));
        }

        assertThat(check.identities(List.of(1))).hasSize(13).allSatisfy(identity -> {
            assertThat(identity.passed()).as(identity.toString()).isTrue();
            assertThat(identity.compared()).isPositive();
        });
    }

    /** The class with the first value that it stores, of those that are not 0, twice as large. */
    private static String doubled(String source) {
        Matcher store =
                Pattern.compile("(\\w+\\[[^\\]]+\\] = )(?!0\\.0;)([^;\\n]+);").matcher(source);
        assertThat(store.find(source.indexOf("private void compute("))).isTrue();
        return source.substring(0, store.start()) + store.group(1) + "2 * (" + store.group(2) + ");"
                + source.substring(store.end());
    }

    private static MetricDefinition definition(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    private static KernelUnderTest underTest(GeneratedClass made, String source) {
        return new KernelUnderTest(
                made.specification().qualifiedName(),
                source,
                made.specification().quantities(),
                Layout.FULL,
                made.functions().stream()
                        .map(function -> new KernelUnderTest.RequestedFunction(
                                function.name(), function.method(), function.orders()))
                        .toList());
    }

    private static GeneratedClass generate(MetricDefinition definition, Quantity quantity) {
        GenerationOptions standard = GenerationOptions.DEFAULT;
        GenerationOptions quick = new GenerationOptions(
                GenerationOptions.Effort.QUICK, standard.trigonometry(), standard.fma(), standard.prefer());
        return new KernelGenerator()
                .generate(definition, new KernelSpecification("trial", "Trial", List.of(quantity), Layout.FULL, quick));
    }
}
