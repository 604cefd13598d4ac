package io.github.gammawright.maven;

import io.github.gammawright.generation.BuildSettings;
import java.io.File;
import java.io.IOException;
import org.apache.maven.plugin.MojoFailureException;
import org.apache.maven.plugins.annotations.LifecyclePhase;
import org.apache.maven.plugins.annotations.Mojo;
import org.apache.maven.plugins.annotations.Parameter;

/**
 * Compares every class that {@code generate} makes with a high-precision reference, at points of its definition's domain.
 * The build fails if a class is out of bounds, or could not be compared at all.
 */
@Mojo(name = "check", defaultPhase = LifecyclePhase.VERIFY, threadSafe = true)
public final class CheckMojo extends GammawrightMojo {

    /**
     * The folder with the definitions, {@code *.metric.toml}.
     */
    @Parameter(
            property = "gammawright.definitionDirectory",
            defaultValue = "${project.basedir}/src/main/gammawright",
            required = true)
    private File definitionDirectory;

    /**
     * At how many points inside the domain the classes are compared; more are taken at its edges.
     */
    @Parameter(property = "gammawright.points", defaultValue = "200")
    private int points;

    /**
     * Where the sequence of points begins.
     */
    @Parameter(property = "gammawright.seed", defaultValue = "1")
    private long seed;

    /** Made by Maven. */
    public CheckMojo() {}

    @Override
    void run() throws IOException, MojoFailureException {
        if (points < 1) {
            throw new MojoFailureException("<points> needs at least 1, not " + points);
        }
        BuildSettings settings = settings();
        new CheckedKernels(settings, points, seed, getLog()).check(DefinitionFiles.in(definitionDirectory.toPath()));
    }
}
