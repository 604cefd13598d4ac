package io.github.gammawright.runtime;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The runtime needs Hipparchus and the JDK's base, and knows nothing of the generator. */
@AnalyzeClasses(packagesOf = ArchitectureTest.class, importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    @ArchTest
    static final ArchRule needsHipparchusAlone = classes()
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage("io.github.gammawright.runtime..", "org.hipparchus..", "java.lang..", "java.util..");
}
