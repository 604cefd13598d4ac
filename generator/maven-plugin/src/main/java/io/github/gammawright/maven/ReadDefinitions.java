package io.github.gammawright.maven;

import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.generation.BuildPlan;
import io.github.gammawright.generation.BuildSettings;
import io.github.gammawright.generation.Mistakes;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;

/**
 * The definitions of a folder as far as they could be read.
 *
 * @param files the names of their files, in order
 * @param definitions what is in them, in the same order
 * @param mistakes what is wrong with the others
 */
record ReadDefinitions(List<String> files, List<MetricDefinition> definitions, Mistakes mistakes) {

    static ReadDefinitions read(SortedMap<String, Path> paths) {
        Mistakes mistakes = new Mistakes();
        List<String> files = new ArrayList<>();
        List<MetricDefinition> definitions = new ArrayList<>();
        paths.forEach((name, path) -> mistakes.attempt(() -> DefinitionReader.read(path))
                .ifPresent(definition -> {
                    files.add(name);
                    definitions.add(definition);
                }));
        return new ReadDefinitions(files, definitions, mistakes);
    }

    /**
     * What is to be made of them.
     *
     * @throws io.github.gammawright.diagnostic.DefinitionException with everything that is wrong with any of them
     */
    BuildPlan plan(BuildSettings settings) {
        BuildPlan plan =
                mistakes.attempt(() -> BuildPlan.of(definitions, settings)).orElse(new BuildPlan(List.of()));
        mistakes.throwIfAny();
        return plan;
    }
}
