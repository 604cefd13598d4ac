package io.github.gammawright.commandline;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.ExpressionPrinter;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.Parameter;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import picocli.CommandLine.Command;

/** Shows what is built in. */
@Command(name = "list", description = "Lists the built-in definitions with their coordinates and parameters.")
final class ListCommand implements Callable<Integer> {

    private final Terminal terminal;

    ListCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        TextTable table = new TextTable().row(List.of("NAME", "COORDINATES", "PARAMETERS", "TITLE"));
        Catalogue catalogue = Catalogue.standard();
        for (String name : catalogue.names()) {
            MetricDefinition definition =
                    DefinitionReader.read(catalogue.find(name).orElseThrow());
            table.row(List.of(
                    definition.name(),
                    String.join(", ", definition.coordinates()),
                    definition.parameters().stream().map(ListCommand::describe).collect(Collectors.joining(", ")),
                    definition.title()));
        }
        terminal.out().print(table.leftAligned());
        return ExitStatus.DONE;
    }

    private static String describe(Parameter parameter) {
        return parameter
                .defaultExpression()
                .map(value -> parameter.name() + " = " + ExpressionPrinter.print(value))
                .orElse(parameter.name());
    }
}
