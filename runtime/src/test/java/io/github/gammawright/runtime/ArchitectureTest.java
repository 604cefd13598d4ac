package io.github.gammawright.runtime;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The runtime needs Hipparchus and the JDK's base, and knows nothing of the generator; its packages depend one way. */
@AnalyzeClasses(packagesOf = ArchitectureTest.class, importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    private static final String ROOT = "io.github.gammawright.runtime";

    @ArchTest
    static final ArchRule needsHipparchusAlone = classes()
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage(
                    ROOT + "..",
                    "org.hipparchus..",
                    "java.lang..",
                    "java.util..",
                    "java.io..",
                    "java.nio..",
                    "java.math..");

    /** Each package may use the root and what is named beside it. */
    @ArchTest
    static final ArchRule packagesDependOneWay = layeredArchitecture()
            .consideringOnlyDependenciesInLayers()
            .layer("kernels")
            .definedBy(ROOT)
            .layer("frame")
            .definedBy(ROOT + ".frame")
            .layer("conserved")
            .definedBy(ROOT + ".conserved")
            .layer("symplectic")
            .definedBy(ROOT + ".symplectic")
            .layer("orbit")
            .definedBy(ROOT + ".orbit")
            .layer("chart")
            .definedBy(ROOT + ".chart")
            .layer("swarm")
            .definedBy(ROOT + ".swarm")
            .layer("output")
            .definedBy(ROOT + ".output")
            .whereLayer("kernels")
            .mayNotAccessAnyLayer()
            .whereLayer("frame")
            .mayOnlyAccessLayers("kernels")
            .whereLayer("conserved")
            .mayOnlyAccessLayers("kernels")
            .whereLayer("symplectic")
            .mayOnlyAccessLayers("kernels")
            .whereLayer("orbit")
            .mayOnlyAccessLayers("kernels", "conserved")
            .whereLayer("chart")
            .mayOnlyAccessLayers("kernels", "orbit")
            .whereLayer("swarm")
            .mayOnlyAccessLayers("kernels", "orbit")
            .whereLayer("output")
            .mayOnlyAccessLayers("orbit");
}
