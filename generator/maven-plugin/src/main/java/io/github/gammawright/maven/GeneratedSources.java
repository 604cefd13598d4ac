package io.github.gammawright.maven;

import io.github.gammawright.generation.BuildPlan;
import io.github.gammawright.generation.BuildSettings;
import io.github.gammawright.generation.GeneratedClass;
import io.github.gammawright.generation.KernelGenerator;
import io.github.gammawright.generation.KernelSpecification;
import io.github.gammawright.generation.Mistakes;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.SortedMap;

/** Makes classes with the generator; loaded only when something has to be made. */
final class GeneratedSources implements KernelBuild.ClassSource {

    private final BuildSettings settings;
    private final boolean ascii;

    /**
     * A source of classes.
     *
     * @param ascii whether letters beyond ASCII are to be written as Unicode escapes
     */
    GeneratedSources(BuildSettings settings, boolean ascii) {
        this.settings = settings;
        this.ascii = ascii;
    }

    @Override
    public Map<String, Map<String, String>> make(SortedMap<String, Path> definitions, Set<String> outdated) {
        ReadDefinitions read = ReadDefinitions.read(definitions);
        BuildPlan plan = read.plan(settings);
        Mistakes mistakes = new Mistakes();
        Map<String, Map<String, String>> made = new LinkedHashMap<>();
        for (int i = 0; i < plan.parts().size(); i++) {
            String file = read.files().get(i);
            if (outdated.contains(file)) {
                made.put(file, make(plan.parts().get(i), mistakes));
            }
        }
        mistakes.throwIfAny();
        return made;
    }

    private Map<String, String> make(BuildPlan.Part part, Mistakes mistakes) {
        Map<String, String> texts = new LinkedHashMap<>();
        for (KernelSpecification kernel : part.kernels()) {
            mistakes.attempt(() -> new KernelGenerator().generate(part.definition(), kernel))
                    .ifPresent(made -> texts.put(made.path(), text(made)));
        }
        return texts;
    }

    private String text(GeneratedClass made) {
        return ascii ? UnicodeEscapes.escape(made.source()) : made.source();
    }
}
