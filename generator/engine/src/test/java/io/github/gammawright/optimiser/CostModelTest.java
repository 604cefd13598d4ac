package io.github.gammawright.optimiser;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Instruction.Operator;
import io.github.gammawright.graph.ProgramBuilder;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.List;
import org.junit.jupiter.api.Test;

class CostModelTest {

    private final CostModel model = CostModel.standard();
    private final ProgramBuilder builder = new ProgramBuilder();
    private final int x = builder.append(new Instruction.Load(Symbol.of(Symbol.Kind.COORDINATE, "x", 0)));
    private final int a = builder.append(new Instruction.Load(Symbol.of(Symbol.Kind.PARAMETER, "a", 0)));

    @Test
    void costsAreInQuartersOfAnAddition() {
        assertThat(model.of(Operator.ADD)).isEqualTo(CostModel.ADDITION).isEqualTo(model.of(Operator.SUBTRACT));
        assertThat(model.of(Operator.DIVIDE)).isGreaterThan(model.of(Operator.MULTIPLY));
        assertThat(model.of(RealFunction.SIN)).isGreaterThan(model.of(RealFunction.SQRT));
        for (RealFunction function : RealFunction.values()) {
            assertThat(model.of(function)).as(function.symbol()).isPositive();
        }
    }

    @Test
    void workOnParametersIsFree() {
        int product = builder.multiply(a, a);
        int root = builder.append(new Instruction.Call(RealFunction.SQRT, List.of(product)));
        assertThat(model.of(builder.build(List.of(root)))).isZero();
        assertThat(model.of(builder.build(List.of(builder.divide(x, root))))).isEqualTo(model.of(Operator.DIVIDE));
    }

    @Test
    void sharedTrigonometryIsCheaperThanTwoCalls() {
        int sine = builder.append(new Instruction.Call(RealFunction.SIN, List.of(x)));
        int cosine = builder.append(new Instruction.Call(RealFunction.COS, List.of(x)));
        var program = builder.build(List.of(sine, cosine));
        assertThat(model.of(program)).isEqualTo(model.of(RealFunction.SIN) + model.of(RealFunction.COS));
        assertThat(model.withSharedTrigonometry(program)).isLessThan(model.of(program));
    }

    @Test
    void moreLiveValuesThanRegistersCost() {
        int[] products = new int[30];
        for (int i = 0; i < products.length; i++) {
            products[i] = builder.add(
                    x, builder.append(new Instruction.Load(Symbol.of(Symbol.Kind.PARAMETER, "p" + i, i + 1))));
        }
        int sum = products[0];
        for (int i = 1; i < products.length; i++) {
            sum = builder.add(sum, products[i]);
        }
        var program = builder.build(List.of(sum));
        int operations = program.count().operations() * model.of(Operator.ADD);
        assertThat(model.of(program)).isGreaterThan(operations);
        assertThat(model.of(Schedule.of(program))).isEqualTo(operations);
    }
}
