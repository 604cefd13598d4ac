package io.github.gammawright.generation;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.emission.KernelModel;
import io.github.gammawright.geometry.DomainProgram;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Shape;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.List;

/** Lays the components of a kernel's quantities out in its result arrays. */
final class KernelModels {

    private KernelModels() {}

    /**
     * The model of a class.
     *
     * @param zero for each quantity which entries of its layout vanish; the program's outputs are these entries, in this
     *     order
     */
    static KernelModel of(
            MetricDefinition definition,
            KernelSpecification specification,
            List<List<Boolean>> zero,
            StraightLineProgram program,
            DomainProgram domain) {
        List<KernelModel.Result> results = new ArrayList<>();
        int offset = 0;
        for (int q = 0; q < specification.quantities().size(); q++) {
            Quantity quantity = specification.quantities().get(q);
            Shape shape = quantity.shape(definition.dimension());
            results.add(result(quantity, shape, specification.layout(), zero.get(q), program, offset));
            offset += zero.get(q).size();
        }
        return new KernelModel(
                definition,
                specification.packageName(),
                specification.className(),
                specification.layout(),
                results,
                program,
                domain(domain),
                command(definition, specification));
    }

    private static KernelModel.Result result(
            Quantity quantity,
            Shape shape,
            Layout layout,
            List<Boolean> zero,
            StraightLineProgram program,
            int offset) {
        List<Integer> slots = new ArrayList<>();
        List<List<Integer>> tuples = new ArrayList<>();
        List<int[]> stored = shape.tuples(layout);
        for (int entry = 0; entry < stored.size(); entry++) {
            boolean vanishes = zero.get(entry);
            if (vanishes && layout == Layout.NON_ZERO) {
                continue;
            }
            slots.add(vanishes ? -1 : program.outputs().get(offset + entry));
            tuples.add(java.util.Arrays.stream(stored.get(entry)).boxed().toList());
        }
        return new KernelModel.Result(quantity, shape, slots, tuples);
    }

    private static KernelModel.Domain domain(DomainProgram domain) {
        List<KernelModel.Condition> conditions = new ArrayList<>();
        int output = 0;
        for (MetricDefinition.Condition condition : domain.conditions()) {
            int end = output + condition.operands().size();
            conditions.add(new KernelModel.Condition(
                    domain.program().outputs().subList(output, end), condition.comparisons(), condition.text()));
            output = end;
        }
        return new KernelModel.Domain(domain.program(), conditions);
    }

    /** The command that makes the class again, the options that differ from what is used without them included. */
    private static String command(MetricDefinition definition, KernelSpecification specification) {
        StringBuilder command = new StringBuilder("gammawright generate ");
        command.append(argument(definition)).append(" --out DIR");
        command.append(" --package ")
                .append(specification.packageName().isEmpty() ? "''" : specification.packageName());
        command.append(" --class ").append(specification.className());
        command.append(" --quantity ");
        command.append(String.join(
                ",", specification.quantities().stream().map(Quantity::symbol).toList()));
        if (specification.layout() != Layout.FULL) {
            command.append(" --layout ").append(specification.layout().symbol());
        }
        GenerationOptions options = specification.options();
        if (options.effort() != GenerationOptions.DEFAULT.effort()) {
            command.append(" --effort ").append(options.effort().symbol());
        }
        if (options.trigonometry() != GenerationOptions.DEFAULT.trigonometry()) {
            command.append(" --trigonometry ").append(options.trigonometry().symbol());
        }
        if (options.fma()) {
            command.append(" --fma");
        }
        if (options.prefer() != GenerationOptions.DEFAULT.prefer()) {
            command.append(" --prefer ").append(options.prefer().symbol());
        }
        return command.toString();
    }

    /** The name of a built-in definition; else the file's, without its folder, which another machine may not have. */
    private static String argument(MetricDefinition definition) {
        boolean builtIn = Catalogue.standard()
                .find(definition.name())
                .map(SourceText::text)
                .filter(definition.source().text()::equals)
                .isPresent();
        if (builtIn) {
            return definition.name();
        }
        String path = definition.source().name();
        String file = path.substring(Math.max(path.lastIndexOf('/'), path.lastIndexOf('\\')) + 1);
        return file.codePoints().allMatch(c -> Character.isLetterOrDigit(c) || "._-+".indexOf(c) >= 0)
                ? file
                : "'" + file.replace("'", "'\\''") + "'";
    }
}
