package io.github.gammawright.graph;

import java.util.BitSet;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * A value in an {@link ExpressionGraph}: immutable, and made once only, so that equal values are the same object.
 * Nodes are numbered in order of creation; every operand has a smaller number than its user.
 */
public abstract sealed class Node {

    private final int id;
    private final BitSet symbols;

    Node(int id, BitSet symbols) {
        this.id = id;
        this.symbols = symbols;
    }

    /** The number of the node in its graph. */
    public final int id() {
        return id;
    }

    /** The numbers of the symbols that the value depends on, as their graph counts them. */
    final BitSet symbols() {
        return symbols;
    }

    /** The nodes that this one is computed from. */
    public abstract List<Node> operands();

    /** Whether this is the number zero. */
    public final boolean isZero() {
        return this instanceof Constant constant && constant.value().signum() == 0;
    }

    /** Whether this is the number one. */
    public final boolean isOne() {
        return this instanceof Constant constant && constant.value().equals(BigFraction.ONE);
    }

    /** A rational number. */
    public static final class Constant extends Node {
        private final BigFraction value;

        Constant(int id, BigFraction value) {
            super(id, new BitSet());
            this.value = value;
        }

        /** The number. */
        public BigFraction value() {
            return value;
        }

        @Override
        public List<Node> operands() {
            return List.of();
        }
    }

    /** The circle's constant. */
    public static final class Pi extends Node {
        Pi(int id) {
            super(id, new BitSet());
        }

        @Override
        public List<Node> operands() {
            return List.of();
        }
    }

    /** A symbol. */
    public static final class Leaf extends Node {
        private final Symbol symbol;

        Leaf(int id, BitSet symbols, Symbol symbol) {
            super(id, symbols);
            this.symbol = symbol;
        }

        /** What the leaf stands for. */
        public Symbol symbol() {
            return symbol;
        }

        @Override
        public List<Node> operands() {
            return List.of();
        }
    }

    /** A rational multiple of a node that is neither a constant nor itself a multiple. */
    public static final class Multiple extends Node {
        private final BigFraction coefficient;
        private final Node node;

        Multiple(int id, BigFraction coefficient, Node node) {
            super(id, node.symbols());
            this.coefficient = coefficient;
            this.node = node;
        }

        /** The factor, neither 0 nor 1. */
        public BigFraction coefficient() {
            return coefficient;
        }

        /** What is multiplied. */
        public Node node() {
            return node;
        }

        @Override
        public List<Node> operands() {
            return List.of(node);
        }
    }

    /** constant + Σ coefficient · node, of two summands or more; the coefficients are coprime integers. */
    public static final class Sum extends Node {
        private final BigFraction constant;
        private final List<BigFraction> coefficients;
        private final List<Node> nodes;

        Sum(int id, BitSet symbols, BigFraction constant, List<BigFraction> coefficients, List<Node> nodes) {
            super(id, symbols);
            this.constant = constant;
            this.coefficients = List.copyOf(coefficients);
            this.nodes = List.copyOf(nodes);
        }

        /** The rational summand, perhaps 0. */
        public BigFraction constant() {
            return constant;
        }

        /** The coefficients of {@link #operands()}, in their order. */
        public List<BigFraction> coefficients() {
            return coefficients;
        }

        @Override
        public List<Node> operands() {
            return nodes;
        }
    }

    /** A product of two or more factors, of which no two are powers of one base. */
    public static final class Product extends Node {
        private final List<Node> factors;

        Product(int id, BitSet symbols, List<Node> factors) {
            super(id, symbols);
            this.factors = List.copyOf(factors);
        }

        @Override
        public List<Node> operands() {
            return factors;
        }
    }

    /** A rational power, its exponent neither 0 nor 1; for an exponent that is no integer the base is not negative. */
    public static final class Power extends Node {
        private final Node base;
        private final BigFraction exponent;

        Power(int id, Node base, BigFraction exponent) {
            super(id, base.symbols());
            this.base = base;
            this.exponent = exponent;
        }

        /** What is raised to the power. */
        public Node base() {
            return base;
        }

        /** The exponent. */
        public BigFraction exponent() {
            return exponent;
        }

        @Override
        public List<Node> operands() {
            return List.of(base);
        }
    }

    /** A power of a non-negative base whose exponent depends on parameters only. */
    public static final class ParameterPower extends Node {
        private final Node base;
        private final Node exponent;

        ParameterPower(int id, BitSet symbols, Node base, Node exponent) {
            super(id, symbols);
            this.base = base;
            this.exponent = exponent;
        }

        /** What is raised to the power. */
        public Node base() {
            return base;
        }

        /** The exponent. */
        public Node exponent() {
            return exponent;
        }

        @Override
        public List<Node> operands() {
            return List.of(base, exponent);
        }
    }

    /** A function applied to its arguments. */
    public static final class Call extends Node {
        private final RealFunction function;
        private final List<Node> arguments;

        Call(int id, BitSet symbols, RealFunction function, List<Node> arguments) {
            super(id, symbols);
            this.function = function;
            this.arguments = List.copyOf(arguments);
        }

        /** What is applied. */
        public RealFunction function() {
            return function;
        }

        @Override
        public List<Node> operands() {
            return arguments;
        }
    }
}
