package io.github.gammawright.maven;

import java.io.File;
import javax.inject.Inject;
import org.apache.maven.plugins.annotations.LifecyclePhase;
import org.apache.maven.plugins.annotations.Mojo;
import org.apache.maven.plugins.annotations.Parameter;
import org.apache.maven.project.MavenProject;
import org.codehaus.plexus.build.BuildContext;

/**
 * Generates kernel classes from metric definitions, and has the project compile them. Only what changed is made anew: by
 * the contents of the definitions, the configuration and the generator, never by time stamps. A class whose definition
 * is gone is removed.
 */
@Mojo(name = "generate", defaultPhase = LifecyclePhase.GENERATE_SOURCES, threadSafe = true)
public final class GenerateMojo extends AbstractGenerateMojo {

    /**
     * The folder with the definitions, {@code *.metric.toml}.
     */
    @Parameter(
            property = "gammawright.definitionDirectory",
            defaultValue = "${project.basedir}/src/main/gammawright",
            required = true)
    private File definitionDirectory;

    /**
     * The folder that the classes are written to, which becomes a source root of the project.
     */
    @Parameter(
            property = "gammawright.outputDirectory",
            defaultValue = "${project.build.directory}/generated-sources/gammawright",
            required = true)
    private File outputDirectory;

    /** Made by Maven. */
    @Inject
    public GenerateMojo(BuildContext buildContext) {
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
        to.addCompileSourceRoot(folder);
    }
}
