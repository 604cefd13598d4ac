package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.List;

/**
 * Builds the tree of a chain of operators of equal strength, {@code a - b + c} or {@code a*b/c}. A short one groups to
 * the left, as it was meant. A long one is cut into halves, which has the same value in exact arithmetic but a height
 * that grows like a logarithm only: {@code a - b + c - d} becomes {@code (a - b) + (c - d)}, and {@code a + b - c + d}
 * becomes {@code (a + b) - (c - d)}.
 */
final class ChainBuilder {

    /** Longer chains are cut. */
    static final int LONGEST = 32;

    /**
     * The largest piece of one that is cut. Half as much, so that a tree that is printed and parsed again is the same:
     * then the pieces at its left end stand in one chain with a few more operands.
     */
    private static final int PIECE = 16;

    private final Join join;
    private final List<Link> links = new ArrayList<>();
    private int binding;

    ChainBuilder(Join join) {
        this.join = join;
    }

    /** Appends an operand and the operator behind it. Once a weaker operator comes, all before is its operand. */
    void add(ExpressionParser.Part operand, int strength, Expression.Operator operator, SourcePosition position) {
        ExpressionParser.Part left = operand;
        if (!links.isEmpty() && strength < binding) {
            left = close(operand);
        }
        binding = strength;
        links.add(new Link(left, operator, position));
    }

    /** The tree of all operands with the given last one; the chain is then empty. */
    ExpressionParser.Part close(ExpressionParser.Part last) {
        if (links.isEmpty()) {
            return last;
        }
        List<ExpressionParser.Part> operands = new ArrayList<>();
        for (Link link : links) {
            operands.add(link.left());
        }
        operands.add(last);
        ExpressionParser.Part whole = tree(operands, 0, operands.size(), operands.size() > LONGEST ? PIECE : LONGEST);
        links.clear();
        return whole;
    }

    private ExpressionParser.Part tree(List<ExpressionParser.Part> operands, int from, int to, int piece) {
        if (to - from > piece) {
            int middle = (from + to) / 2;
            Link link = links.get(middle - 1);
            ExpressionParser.Part left = tree(operands, from, middle, piece);
            turnBehind(link.operator(), middle, to);
            return join.binary(link.operator(), left, tree(operands, middle, to, piece), link.position());
        }
        ExpressionParser.Part left = operands.get(from);
        for (int i = from + 1; i < to; i++) {
            Link link = links.get(i - 1);
            left = join.binary(link.operator(), left, operands.get(i), link.position());
        }
        return left;
    }

    /** Behind a minus or a division the operators between the operands of the right half are turned round. */
    private void turnBehind(Expression.Operator operator, int from, int to) {
        if (operator == Expression.Operator.SUBTRACT || operator == Expression.Operator.DIVIDE) {
            for (int i = from; i < to - 1; i++) {
                Link link = links.get(i);
                links.set(i, new Link(link.left(), opposite(link.operator()), link.position()));
            }
        }
    }

    private static Expression.Operator opposite(Expression.Operator operator) {
        return switch (operator) {
            case ADD -> Expression.Operator.SUBTRACT;
            case SUBTRACT -> Expression.Operator.ADD;
            case MULTIPLY -> Expression.Operator.DIVIDE;
            case DIVIDE -> Expression.Operator.MULTIPLY;
            case POWER -> Expression.Operator.POWER;
        };
    }

    /** An operand and the operator behind it. */
    private record Link(ExpressionParser.Part left, Expression.Operator operator, SourcePosition position) {}

    /** Makes a node of the tree. */
    interface Join {
        ExpressionParser.Part binary(
                Expression.Operator operator,
                ExpressionParser.Part left,
                ExpressionParser.Part right,
                SourcePosition position);
    }
}
