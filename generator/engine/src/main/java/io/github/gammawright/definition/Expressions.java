package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.SourcePosition;
import java.util.List;
import java.util.function.Consumer;

/** What one often wants to know of a syntax tree. */
public final class Expressions {

    private Expressions() {}

    /** The operands of a node, from left to right; of a number or name none. */
    public static List<Expression> operands(Expression expression) {
        if (expression instanceof Expression.Negation negation) {
            return List.of(negation.operand());
        }
        if (expression instanceof Expression.Binary binary) {
            return List.of(binary.left(), binary.right());
        }
        if (expression instanceof Expression.Call call) {
            return call.arguments();
        }
        return List.of();
    }

    /** Where the text of an expression begins; the position of a node itself is that of its operator. */
    public static SourcePosition start(Expression expression) {
        Expression first = expression;
        while (first instanceof Expression.Binary binary) {
            first = binary.left();
        }
        return first.position();
    }

    /** Calls the consumer with each occurrence of a name, from left to right. */
    public static void forEachName(Expression expression, Consumer<Expression.Name> consumer) {
        if (expression instanceof Expression.Name name) {
            consumer.accept(name);
        }
        for (Expression operand : operands(expression)) {
            forEachName(operand, consumer);
        }
    }

    /** How many functions are called. */
    static int calls(Expression expression) {
        int calls = expression instanceof Expression.Call ? 1 : 0;
        for (Expression operand : operands(expression)) {
            calls += calls(operand);
        }
        return calls;
    }

    /** How high the tree is, when a name counts as what the given function says; 1 is that of a leaf. */
    static int height(Expression expression, java.util.function.ToIntFunction<String> heightOfName) {
        if (expression instanceof Expression.Name name) {
            return heightOfName.applyAsInt(name.name());
        }
        int highest = 0;
        for (Expression operand : operands(expression)) {
            highest = Math.max(highest, height(operand, heightOfName));
        }
        return highest + 1;
    }

    /** Whether two trees are the same but for the positions of their nodes. */
    public static boolean sameTree(Expression a, Expression b) {
        if (a instanceof Expression.Number x && b instanceof Expression.Number y) {
            return x.value().equals(y.value());
        }
        if (a instanceof Expression.Name x && b instanceof Expression.Name y) {
            return x.name().equals(y.name());
        }
        if (a instanceof Expression.Binary x && b instanceof Expression.Binary y && x.operator() != y.operator()) {
            return false;
        }
        if (a instanceof Expression.Call x && b instanceof Expression.Call y && x.function() != y.function()) {
            return false;
        }
        List<Expression> left = operands(a);
        List<Expression> right = operands(b);
        if (a.getClass() != b.getClass() || left.size() != right.size()) {
            return false;
        }
        for (int i = 0; i < left.size(); i++) {
            if (!sameTree(left.get(i), right.get(i))) {
                return false;
            }
        }
        return true;
    }
}
