package io.github.gammawright.maven;

import java.io.File;
import javax.inject.Inject;
import org.apache.maven.plugins.annotations.LifecyclePhase;
import org.apache.maven.plugins.annotations.Mojo;
import org.apache.maven.plugins.annotations.Parameter;
import org.apache.maven.project.MavenProject;
import org.codehaus.plexus.build.BuildContext;

/**
 * Generates kernel classes that only the tests use, and has the project compile them with the tests. Otherwise the same
 * as {@code generate}.
 */
@Mojo(name = "generate-test", defaultPhase = LifecyclePhase.GENERATE_TEST_SOURCES, threadSafe = true)
public final class GenerateTestMojo extends AbstractGenerateMojo {

    /**
     * The folder with the definitions, {@code *.metric.toml}.
     */
    @Parameter(
            property = "gammawright.testDefinitionDirectory",
            defaultValue = "${project.basedir}/src/test/gammawright",
            required = true)
    private File definitionDirectory;

    /**
     * The folder that the classes are written to, which becomes a test source root of the project.
     */
    @Parameter(
            property = "gammawright.testOutputDirectory",
            defaultValue = "${project.build.directory}/generated-test-sources/gammawright",
            required = true)
    private File outputDirectory;

    /** Made by Maven. */
    @Inject
    public GenerateTestMojo(BuildContext buildContext) {
        super(buildContext);
    }

    @Override
    File definitionFolder() {
        return definitionDirectory;
    }

    @Override
    File outputFolder() {
        return outputDirectory;
    }

    @Override
    void addSourceRoot(MavenProject to, String folder) {
        to.addTestCompileSourceRoot(folder);
    }
}
