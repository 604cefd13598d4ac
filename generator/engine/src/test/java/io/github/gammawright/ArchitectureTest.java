package io.github.gammawright;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.conditions.ArchConditions.callMethod;
import static com.tngtech.archunit.lang.conditions.ArchConditions.dependOnClassesThat;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The packages of the engine depend on one another in one direction, and each outside library is behind one of them. */
@AnalyzeClasses(packagesOf = ArchitectureTest.class, importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    private static final String ROOT = "io.github.gammawright.";

    /** What each package may use; a package that isn't named here may use, and be used by, none. */
    @ArchTest
    static final ArchRule dependenciesPointOneWay = layeredArchitecture()
            .consideringOnlyDependenciesInAnyPackage("io.github.gammawright..")
            .withOptionalLayers(true)
            .layer("diagnostic")
            .definedBy(ROOT + "diagnostic..")
            .layer("definition")
            .definedBy(ROOT + "definition..")
            .layer("graph")
            .definedBy(ROOT + "graph..")
            .layer("algebra")
            .definedBy(ROOT + "algebra..")
            .layer("geometry")
            .definedBy(ROOT + "geometry..")
            .layer("optimiser")
            .definedBy(ROOT + "optimiser..")
            .layer("emission")
            .definedBy(ROOT + "emission..")
            .layer("verification")
            .definedBy(ROOT + "verification..")
            .layer("catalogue")
            .definedBy(ROOT + "catalogue..")
            .layer("generation")
            .definedBy(ROOT + "generation..")
            .whereLayer("diagnostic")
            .mayNotAccessAnyLayer()
            .whereLayer("definition")
            .mayOnlyAccessLayers("diagnostic")
            .whereLayer("graph")
            .mayOnlyAccessLayers("diagnostic", "definition")
            .whereLayer("algebra")
            .mayOnlyAccessLayers("diagnostic", "definition", "graph")
            .whereLayer("geometry")
            .mayOnlyAccessLayers("diagnostic", "definition", "graph", "algebra")
            .whereLayer("optimiser")
            .mayOnlyAccessLayers("diagnostic", "definition", "graph", "algebra", "geometry")
            .whereLayer("emission")
            .mayOnlyAccessLayers("diagnostic", "definition", "graph", "geometry")
            .whereLayer("verification")
            .mayOnlyAccessLayers("diagnostic", "definition", "graph", "algebra", "geometry", "emission")
            .whereLayer("catalogue")
            .mayOnlyAccessLayers("diagnostic", "definition")
            .whereLayer("generation")
            .mayNotBeAccessedByAnyLayer();

    /** The table above would allow a cycle inside a package's sub-packages; none is wanted there either. */
    @ArchTest
    static final ArchRule noCycles = slices().matching(ROOT + "(**)").should().beFreeOfCycles();

    @ArchTest
    static final ArchRule everyPackageHasItsPlace = classes()
            .should()
            .resideInAnyPackage(
                    ROOT + "diagnostic..",
                    ROOT + "definition..",
                    ROOT + "graph..",
                    ROOT + "algebra..",
                    ROOT + "geometry..",
                    ROOT + "optimiser..",
                    ROOT + "emission..",
                    ROOT + "verification..",
                    ROOT + "catalogue..",
                    ROOT + "generation..");

    /** A reference that shared code with the generator would share its mistakes. */
    @ArchTest
    static final ArchRule referenceGoesItsOwnWay = noClasses()
            .that()
            .resideInAPackage(ROOT + "verification.reference..")
            .should()
            .transitivelyDependOnClassesThat()
            .resideInAnyPackage(ROOT + "graph..", ROOT + "algebra..", ROOT + "optimiser..", ROOT + "emission..");

    @ArchTest
    static final ArchRule computerAlgebraOnlyInAlgebra = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "algebra..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.matheclipse..", "edu.jas..");

    @ArchTest
    static final ArchRule javaSourceOnlyInEmission = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "emission..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("com.palantir.javapoet..");

    @ArchTest
    static final ArchRule tomlOnlyInDefinition = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "definition..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.tomlj..");

    /** Budgets count work, so that the same input gives the same output on every machine. */
    @ArchTest
    static final ArchRule outputDoesNotDependOnTheClock = noClasses()
            .that()
            .resideInAnyPackage(
                    ROOT + "definition..",
                    ROOT + "graph..",
                    ROOT + "algebra..",
                    ROOT + "geometry..",
                    ROOT + "optimiser..",
                    ROOT + "emission..")
            .should(callMethod(System.class, "nanoTime")
                    .or(callMethod(System.class, "currentTimeMillis"))
                    .or(dependOnClassesThat(resideInAPackage("java.time.."))));

    /** Builds run in parallel in one JVM. */
    @ArchTest
    static final ArchRule noStaticState = fields().that().areStatic().should().beFinal();
}
