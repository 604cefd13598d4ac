package io.github.gammawright.maven;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.generation.BuildSettings;
import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.apache.maven.plugin.MojoExecution;
import org.apache.maven.plugin.MojoFailureException;
import org.apache.maven.plugins.annotations.Parameter;
import org.apache.maven.project.MavenProject;
import org.codehaus.plexus.build.BuildContext;

/** Generates kernels, for the main classes or for the tests. */
abstract class AbstractGenerateMojo extends GammawrightMojo {

    private final BuildContext buildContext;

    @Parameter(defaultValue = "${project}", readonly = true, required = true)
    private MavenProject project;

    @Parameter(defaultValue = "${mojoExecution}", readonly = true, required = true)
    private MojoExecution execution;

    /** Where the plugin keeps what it knows from one build to the next. */
    @Parameter(defaultValue = "${project.build.directory}/gammawright", readonly = true, required = true)
    private File stateDirectory;

    /**
     * The encoding in which the project's sources are compiled. With any other than UTF-8, letters beyond ASCII are
     * written as Unicode escapes.
     */
    @Parameter(property = "encoding", defaultValue = "${project.build.sourceEncoding}")
    private String encoding;

    AbstractGenerateMojo(BuildContext buildContext) {
        this.buildContext = buildContext;
    }

    /** Where the definitions are. */
    abstract File definitionFolder();

    /** Where the classes go. */
    abstract File outputFolder();

    /** Has the project compile a folder. */
    abstract void addSourceRoot(MavenProject to, String folder);

    @Override
    final void run() throws IOException, MojoFailureException {
        BuildSettings settings = settings();
        Path output = outputFolder().toPath();
        Path state = stateDirectory.toPath().resolve(execution.getGoal() + "-" + execution.getExecutionId() + ".state");
        boolean ascii = !"UTF-8".equalsIgnoreCase(encoding);
        KernelBuild build = new KernelBuild(
                definitionFolder().toPath(),
                output,
                state,
                fingerprint(settings, ascii),
                new GeneratedSources(settings, ascii));
        KernelBuild.Outcome outcome;
        try {
            outcome = build.run();
        } catch (DefinitionException e) {
            EditorMarkers.show(e, buildContext);
            throw e;
        }
        // Also when nothing was made: what is there is compiled in every build.
        addSourceRoot(project, output.toString());
        refresh(outcome.written());
        refresh(outcome.removed());
        log(outcome);
    }

    private String fingerprint(BuildSettings settings, boolean ascii) throws IOException {
        List<String> libraries = execution.getMojoDescriptor().getPluginDescriptor().getArtifacts().stream()
                .map(artifact -> artifact.getId())
                .toList();
        return new Fingerprint()
                .add(GeneratorFingerprint.of(libraries))
                .add(settings.toString())
                .add(Boolean.toString(ascii))
                .hex();
    }

    private void refresh(List<Path> files) {
        for (Path file : files) {
            buildContext.refresh(file.toFile());
        }
    }

    private void log(KernelBuild.Outcome outcome) {
        if (outcome.definitions() == 0 && outcome.removed().isEmpty()) {
            getLog().info("No definitions in " + definitionFolder());
        } else if (outcome.changedNothing()) {
            getLog().info("Nothing to generate: " + count(outcome.classes(), "class", "classes") + " of "
                    + count(outcome.definitions(), "definition", "definitions") + " up to date");
        } else {
            getLog().info("Generated " + count(outcome.written().size(), "class", "classes") + ", removed "
                    + outcome.removed().size() + "; there are now "
                    + count(outcome.classes(), "class", "classes") + " of "
                    + count(outcome.definitions(), "definition", "definitions"));
        }
    }

    private static String count(int number, String one, String many) {
        return number + " " + (number == 1 ? one : many);
    }
}
