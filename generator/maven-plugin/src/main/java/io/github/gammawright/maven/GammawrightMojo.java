package io.github.gammawright.maven;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.generation.BuildSettings;
import java.io.IOException;
import java.util.List;
import org.apache.maven.plugin.AbstractMojo;
import org.apache.maven.plugin.MojoExecutionException;
import org.apache.maven.plugin.MojoFailureException;
import org.apache.maven.plugins.annotations.Parameter;

/** What all goals have in common: how kernels are made, and how failures are reported. */
abstract class GammawrightMojo extends AbstractMojo {

    static {
        // the algebra library remarks on its steps at the level that Maven prints; read when its loggers are made
        System.setProperty("org.slf4j.simpleLogger.log.edu.jas", "warn");
    }

    /**
     * The Java package of the classes. A {@code [[kernel]]} table of a definition may name another for its class.
     */
    @Parameter(property = "gammawright.packageName", defaultValue = BuildSettings.DEFAULT_PACKAGE)
    private String packageName;

    /**
     * The quantities, by their names such as {@code christoffel}; each becomes a class of its own. A definition with
     * {@code [[kernel]]} tables makes the classes of these instead. The default is {@code metric},
     * {@code inverse-metric}, {@code christoffel} and {@code geodesic-acceleration}.
     */
    @Parameter(property = "gammawright.quantities")
    private List<String> quantities;

    /**
     * How results are laid out: {@code full} (row-major over all indices), {@code packed} (each symmetric pair once) or
     * {@code non-zero} (only components that are not identically zero).
     */
    @Parameter(property = "gammawright.layout", defaultValue = "full")
    private String layout;

    /**
     * How much work goes into fewer operations: {@code quick}, {@code normal} or {@code thorough}. It is counted in
     * steps, so that the classes are the same on every machine.
     */
    @Parameter(property = "gammawright.effort", defaultValue = "normal")
    private String effort;

    /**
     * Whose sine and cosine the classes call: {@code math} for {@code java.lang.Math}, {@code shared} for a method of
     * the class that gives both at once.
     */
    @Parameter(property = "gammawright.trigonometry", defaultValue = "math")
    private String trigonometry;

    /**
     * Whether the classes may call {@code Math.fma}. It is very slow on processors that do not have it.
     */
    @Parameter(property = "gammawright.fma", defaultValue = "false")
    private boolean fma;

    /**
     * What decides between several ways to compute the same: {@code speed} or {@code accuracy}.
     */
    @Parameter(property = "gammawright.prefer", defaultValue = "speed")
    private String prefer;

    /**
     * Leaves everything as it is.
     */
    @Parameter(property = "gammawright.skip", defaultValue = "false")
    private boolean skip;

    @Override
    public final void execute() throws MojoExecutionException, MojoFailureException {
        if (skip) {
            getLog().info("Skipped");
            return;
        }
        try {
            run();
        } catch (DefinitionException e) {
            throw DefinitionErrors.report(e, getLog());
        } catch (IOException e) {
            throw new MojoExecutionException(e.getMessage(), e);
        } catch (OutOfMemoryError e) {
            throw new MojoExecutionException(
                    "Out of memory: allow Maven more of it, for example with MAVEN_OPTS=-Xmx2g", e);
        } catch (StackOverflowError e) {
            throw new MojoExecutionException(
                    "An expression is nested too deeply for the stack: give parts of it names in [abbreviations], or allow"
                            + " more with MAVEN_OPTS=-Xss64m",
                    e);
        }
    }

    /** Does the work of the goal. */
    abstract void run() throws IOException, MojoFailureException, MojoExecutionException;

    /** The configuration, with its words looked up. */
    final BuildSettings settings() throws MojoFailureException {
        return new ConfiguredSettings(packageName, quantities, layout, effort, trigonometry, fma, prefer).resolve();
    }
}
