package io.github.gammawright.geometry;

import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.hipparchus.fraction.BigFraction;

/**
 * The quantities of one metric as nodes of its graph, along one {@link Route}. Everything is computed once, when it is
 * first asked for.
 */
public final class Geometry {

    private final Optional<FramePlan> framePlan;
    private final MetricGraph metric;
    private final Route route;
    private final ExpressionGraph graph;
    private Node volumeElement;
    private final Differentiation differentiation;
    private final int n;
    private InverseMetric inverse;
    private Node[][][] metricDerivative;
    private Node[][][] firstKind;
    private Node[][][] christoffel;
    private Slicing slicing;
    private Frame frame;
    private Curvature curvature;

    /** The geometry of a metric, along a route. */
    public Geometry(MetricGraph metric, Route route) {
        this(metric, route, Optional.empty());
    }

    /** The same, with a plan for the orthonormal frame; without one it follows from the few points of the graph. */
    public Geometry(MetricGraph metric, Route route, Optional<FramePlan> framePlan) {
        this.framePlan = framePlan;
        this.metric = metric;
        this.route = route;
        this.graph = metric.graph();
        this.differentiation = new Differentiation(graph);
        this.n = metric.dimension();
    }

    /** All components of a quantity, row-major over all its indices. */
    public List<Node> components(Quantity quantity) {
        List<Node> components = new ArrayList<>();
        switch (quantity) {
            case METRIC -> addMatrix(metric.components(), components);
            case INVERSE_METRIC -> addMatrix(inverse().components(), components);
            case VOLUME_ELEMENT -> components.add(volumeElement());
            case METRIC_DERIVATIVE -> addTensor(metricDerivative(), components);
            case CHRISTOFFEL -> addTensor(christoffel(), components);
            case CHRISTOFFEL_FIRST_KIND -> addTensor(firstKind(), components);
            case CHRISTOFFEL_TRACE -> components.addAll(trace());
            case CONTRACTED_CHRISTOFFEL -> components.addAll(contracted());
            case GEODESIC_ACCELERATION -> components.addAll(geodesicAcceleration());
            case HAMILTONIAN_FLOW -> components.addAll(hamiltonianFlow());
            case CHRISTOFFEL_DERIVATIVE -> components.addAll(new ChristoffelDerivative(this).components());
            case GEODESIC_ACCELERATION_BY_TIME ->
                components.addAll(new FlowsByTime(this).acceleration(geodesicAcceleration()));
            case HAMILTONIAN_FLOW_BY_TIME ->
                components.addAll(new FlowsByTime(this).hamiltonianFlow(hamiltonianFlow()));
            case PARALLEL_TRANSPORT -> components.addAll(new ParallelTransport(this).rates());
            case GEODESIC_DEVIATION -> components.addAll(new GeodesicDeviation(this).acceleration());
            case RIEMANN -> components.addAll(curvature().mixed(curvature().riemann()));
            case WEYL -> components.addAll(curvature().mixed(curvature().weyl()));
            case RICCI -> addMatrix(curvature().ricci(), components);
            case RICCI_SCALAR -> components.add(curvature().scalar());
            case EINSTEIN -> addMatrix(curvature().einstein(), components);
            case KRETSCHMANN -> components.add(curvature().kretschmann());
            case ORTHONORMAL_FRAME -> addMatrix(frame().vectors(), components);
            case ROTATION_COEFFICIENTS -> components.addAll(RotationCoefficients.of(metric, frame()));
            case STRESS_SOURCE -> components.addAll(stressSource());
            case LAPSE,
                    SHIFT,
                    SPATIAL_METRIC,
                    INVERSE_SPATIAL_METRIC,
                    SPATIAL_VOLUME_ELEMENT,
                    SPATIAL_CHRISTOFFEL,
                    LAPSE_DERIVATIVE,
                    SHIFT_DERIVATIVE,
                    SPATIAL_METRIC_DERIVATIVE,
                    EXTRINSIC_CURVATURE,
                    MEAN_CURVATURE -> components.addAll(slicing().components(quantity));
        }
        return components;
    }

    /** The components of a quantity that a layout stores, those that vanish included, in its order. */
    public List<Node> entries(Quantity quantity, Layout layout) {
        if (layout != Layout.FULL && quantity.isCurvatureTensor()) {
            return PairMatrix.packed(
                    quantity == Quantity.RIEMANN
                            ? curvature().riemann()
                            : curvature().weyl());
        }
        List<Node> all = components(quantity);
        Shape shape = quantity.shape(n);
        return shape.tuples(layout).stream()
                .map(tuple -> all.get(shape.fullIndex(tuple)))
                .toList();
    }

    MetricGraph metric() {
        return metric;
    }

    Route route() {
        return route;
    }

    Differentiation differentiation() {
        return differentiation;
    }

    /** A part of the geometry that others are made of. */
    public enum Part {
        /** Γ^k_ij. */
        CONNECTION,
        /** R_klij. */
        CURVATURE
    }

    /**
     * The same geometry with the inverse metric and another part given in other forms, on another graph.
     *
     * @param other the metric there
     * @param form the other form of a value; empty if there is none
     */
    public Optional<Geometry> withForms(Part part, MetricGraph other, Function<Node, Optional<Node>> form) {
        Forms forms = new Forms(other.graph(), form);
        Geometry changed = new Geometry(other, route, framePlan);
        changed.inverse =
                new ComponentInverse(other.graph(), forms.matrix(inverse().components()), forms.of(determinant()));
        if (part == Part.CURVATURE) {
            changed.curvature = new Curvature(changed, curvature().riemann().with(other.graph(), forms::of));
        } else {
            changed.christoffel = new Node[n][][];
            for (int k = 0; k < n; k++) {
                changed.christoffel[k] = forms.matrix(christoffel()[k]);
            }
        }
        return forms.complete ? Optional.of(changed) : Optional.empty();
    }

    /** Takes values to other forms and notes whether all have one. */
    private static final class Forms {
        private final ExpressionGraph target;
        private final Function<Node, Optional<Node>> form;
        private boolean complete = true;

        Forms(ExpressionGraph target, Function<Node, Optional<Node>> form) {
            this.target = target;
            this.form = form;
        }

        Node of(Node node) {
            Optional<Node> found = complete ? form.apply(node) : Optional.empty();
            complete &= found.isPresent();
            Node result = found.orElse(target.zero());
            target.keep(result);
            return result;
        }

        Node[][] matrix(Node[][] symmetric) {
            Node[][] changed = new Node[symmetric.length][symmetric.length];
            for (int i = 0; i < symmetric.length; i++) {
                for (int j = 0; j <= i; j++) {
                    changed[i][j] = of(symmetric[i][j]);
                    changed[j][i] = changed[i][j];
                }
            }
            return changed;
        }
    }

    Curvature curvature() {
        if (curvature == null) {
            curvature = new Curvature(this);
        }
        return curvature;
    }

    /** The root in a quantity's components; none where it has none, or has one of the author's. */
    public Optional<CommonRoot> commonRoot(Quantity quantity) {
        return switch (quantity) {
            case VOLUME_ELEMENT, STRESS_SOURCE -> Optional.of(new CommonRoot(determinant(), false, 1));
            case SPATIAL_VOLUME_ELEMENT -> Optional.of(new CommonRoot(slicing().determinant(), true, 1));
            case LAPSE, LAPSE_DERIVATIVE -> slicing().lapseSquare().map(square -> new CommonRoot(square, true, 1));
            case EXTRINSIC_CURVATURE, MEAN_CURVATURE ->
                slicing().lapseSquare().map(square -> new CommonRoot(square, true, -1));
            default -> Optional.empty();
        };
    }

    private static void addMatrix(Node[][] matrix, List<Node> components) {
        for (Node[] row : matrix) {
            components.addAll(List.of(row));
        }
    }

    private static void addTensor(Node[][][] tensor, List<Node> components) {
        for (Node[][] matrix : tensor) {
            addMatrix(matrix, components);
        }
    }

    private Frame frame() {
        if (frame == null) {
            frame = Frame.of(metric, framePlan.orElseGet(() -> FramePlan.of(metric)));
        }
        return frame;
    }

    private Slicing slicing() {
        if (slicing == null) {
            slicing = new Slicing(metric, route, this);
        }
        return slicing;
    }

    InverseMetric inverse() {
        if (inverse == null) {
            inverse = route.inverse(metric);
        }
        return inverse;
    }

    /** ∂_k g_ij; k, i, j. */
    Node[][][] metricDerivative() {
        if (metricDerivative == null) {
            metricDerivative = new Node[n][n][n];
            for (int k = 0; k < n; k++) {
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j <= i; j++) {
                        Node derivative = differentiation.derivative(
                                metric.components()[i][j], metric.coordinates().get(k));
                        graph.keep(derivative);
                        metricDerivative[k][i][j] = derivative;
                        metricDerivative[k][j][i] = derivative;
                    }
                }
            }
        }
        return metricDerivative;
    }

    /** Γ_kij = ½ (∂_i g_kj + ∂_j g_ki − ∂_k g_ij); k, i, j. */
    Node[][][] firstKind() {
        if (firstKind == null) {
            Node[][][] d = metricDerivative();
            firstKind = new Node[n][n][n];
            for (int k = 0; k < n; k++) {
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j <= i; j++) {
                        Node sum = graph.sum(List.of(d[i][k][j], d[j][k][i], graph.negate(d[k][i][j])));
                        Node half = graph.multiple(BigFraction.ONE_HALF, sum);
                        graph.keep(half);
                        firstKind[k][i][j] = half;
                        firstKind[k][j][i] = half;
                    }
                }
            }
        }
        return firstKind;
    }

    /** Γ^k_ij = g^kl Γ_lij; k, i, j. */
    Node[][][] christoffel() {
        if (christoffel == null) {
            Node[][][] lower = firstKind();
            christoffel = new Node[n][n][n];
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    List<Node> covector = new ArrayList<>();
                    for (int l = 0; l < n; l++) {
                        covector.add(lower[l][i][j]);
                    }
                    List<Node> raised = inverse().raise(covector);
                    for (int k = 0; k < n; k++) {
                        graph.keep(raised.get(k));
                        christoffel[k][i][j] = raised.get(k);
                        christoffel[k][j][i] = raised.get(k);
                    }
                }
            }
        }
        return christoffel;
    }

    /** det g. */
    public Node determinant() {
        return inverse().determinant();
    }

    /** √|det g|, in the form that was {@link #useVolumeElement given} if one was. */
    private Node volumeElement() {
        if (volumeElement == null) {
            volumeElement = VolumeElement.of(graph, determinant(), metric.notNegative());
        }
        return volumeElement;
    }

    /** Sets how √|det g| is computed, to be called before any components are asked for. */
    public void useVolumeElement(Node form) {
        volumeElement = form;
    }

    /** Γ^m_mk = ½ g^ij ∂_k g_ij. */
    List<Node> trace() {
        Node[][] g = inverse().components();
        List<Node> trace = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            List<Node> terms = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    Node term = graph.multiply(g[i][j], metricDerivative()[k][i][j]);
                    terms.add(i == j ? graph.multiple(BigFraction.ONE_HALF, term) : term);
                }
            }
            trace.add(graph.sum(terms));
        }
        return trace;
    }

    /** g^ij Γ^k_ij, the first kind contracted before it is raised. */
    private List<Node> contracted() {
        Node[][] g = inverse().components();
        List<Node> covector = new ArrayList<>();
        for (int l = 0; l < n; l++) {
            List<Node> terms = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    Node term = graph.multiply(g[i][j], firstKind()[l][i][j]);
                    terms.add(i == j ? term : graph.multiple(BigFraction.TWO, term));
                }
            }
            Node sum = graph.sum(terms);
            graph.keep(sum);
            covector.add(sum);
        }
        return inverse().raise(covector);
    }

    /** ½ √|g| ∂_k g_ij. */
    private List<Node> stressSource() {
        Node half = graph.multiple(BigFraction.ONE_HALF, volumeElement());
        graph.keep(half);
        List<Node> source = new ArrayList<>();
        for (Node[][] matrix : metricDerivative()) {
            for (Node[] row : matrix) {
                for (Node derivative : row) {
                    source.add(graph.multiply(half, derivative));
                }
            }
        }
        return source;
    }

    private List<Node> geodesicAcceleration() {
        List<Node> velocity = metric.velocities().stream().map(graph::symbol).toList();
        return route.flow() == Route.Flow.CONTRACTION ? contractedAcceleration(velocity) : sweptAcceleration(velocity);
    }

    /** −Γ^k_ij u^i u^j, from the Γ that are there. */
    private List<Node> contractedAcceleration(List<Node> velocity) {
        List<Node> acceleration = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            List<Node> terms = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    Node term = graph.product(List.of(christoffel()[k][i][j], velocity.get(i), velocity.get(j)));
                    terms.add(graph.multiple(new BigFraction(i == j ? -1 : -2), term));
                }
            }
            acceleration.add(graph.sum(terms));
        }
        return acceleration;
    }

    /**
     * The acceleration from L = ½ g_ij u^i u^j without any Γ: ∂L/∂x^i − (u·∂) p_i with p_i = ∂L/∂u^i, by a backward and a
     * forward sweep, then raised.
     */
    private List<Node> sweptAcceleration(List<Node> velocity) {
        Node lagrangian = graph.multiple(BigFraction.ONE_HALF, quadraticForm(velocity));
        List<Symbol> all = new ArrayList<>(metric.coordinates());
        all.addAll(metric.velocities());
        List<Node> gradient = differentiation.gradient(lagrangian, all);
        Map<Symbol, Node> along = new LinkedHashMap<>();
        for (int i = 0; i < n; i++) {
            along.put(metric.coordinates().get(i), velocity.get(i));
        }
        List<Node> rates = differentiation.directional(gradient.subList(n, 2 * n), along);
        List<Node> covector = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            Node force = graph.subtract(gradient.get(i), rates.get(i));
            graph.keep(force);
            covector.add(force);
        }
        return inverse().raise(covector);
    }

    private Node quadraticForm(List<Node> velocity) {
        if (route.flow() == Route.Flow.AUTHORS_FORM && metric.quadraticForm().isPresent()) {
            return metric.quadraticForm().get();
        }
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                Node term = graph.product(List.of(metric.components()[i][j], velocity.get(i), velocity.get(j)));
                terms.add(i == j ? term : graph.multiple(BigFraction.TWO, term));
            }
        }
        return graph.sum(terms);
    }

    /** dx^i/dλ = ∂H/∂p_i, then dp_i/dλ = −∂H/∂x^i, by one backward sweep. */
    private List<Node> hamiltonianFlow() {
        List<Symbol> momenta = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            momenta.add(
                    Symbol.of(Symbol.Kind.MOMENTUM, metric.coordinates().get(i).name(), i));
        }
        List<Node> momentum = momenta.stream().map(graph::symbol).toList();
        Node hamiltonian = graph.multiple(BigFraction.ONE_HALF, inverse().square(momentum));
        List<Symbol> all = new ArrayList<>(momenta);
        all.addAll(metric.coordinates());
        List<Node> gradient = differentiation.gradient(hamiltonian, all);
        List<Node> flow = new ArrayList<>(gradient.subList(0, n));
        for (Node force : gradient.subList(n, 2 * n)) {
            flow.add(graph.negate(force));
        }
        return flow;
    }
}
