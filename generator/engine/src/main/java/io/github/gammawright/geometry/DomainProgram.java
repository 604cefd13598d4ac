package io.github.gammawright.geometry;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.Lowering;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * The conditions of a definition as a program.
 *
 * @param program its outputs are the operands of all conditions, in their order
 * @param conditions in the definition's order
 */
public record DomainProgram(StraightLineProgram program, List<MetricDefinition.Condition> conditions) {

    /** The conditions of a definition. */
    public static DomainProgram of(MetricDefinition definition) {
        return of(definition, new DefinitionScope(definition, SamplePoints.arbitrary(1)));
    }

    static DomainProgram of(MetricDefinition definition, DefinitionScope scope) {
        List<Node> operands = new ArrayList<>();
        for (MetricDefinition.Condition condition : definition.domain().conditions()) {
            for (Expression operand : condition.operands()) {
                operands.add(scope.translator().translate(operand));
            }
        }
        return new DomainProgram(
                Lowering.lower(scope.graph(), operands), definition.domain().conditions());
    }

    /** Whether all conditions hold at a point; a comparison with NaN does not. */
    public boolean contains(ToDoubleFunction<Symbol> point) {
        double[] values = ProgramInterpreter.run(program, point);
        int output = 0;
        for (MetricDefinition.Condition condition : conditions) {
            for (int i = 0; i < condition.comparisons().size(); i++) {
                double left = values[program.outputs().get(output + i)];
                double right = values[program.outputs().get(output + i + 1)];
                boolean holds = switch (condition.comparisons().get(i)) {
                    case LESS -> left < right;
                    case LESS_OR_EQUAL -> left <= right;
                    case GREATER -> left > right;
                    case GREATER_OR_EQUAL -> left >= right;
                };
                if (!holds) {
                    return false;
                }
            }
            output += condition.operands().size();
        }
        return true;
    }
}
