package io.github.gammawright.verification;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.KernelInstance.Defect;
import io.github.gammawright.verification.SlotMap.Entry;
import io.github.gammawright.verification.reference.ReferencePoint;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;

/** Compares one result array of a kernel with the reference, point by point. */
final class QuantityComparison {

    private final Quantity quantity;
    private final ReferenceQuantity reference;
    private final SlotMap map;
    private final ErrorStatistics statistics;
    private double[] result;

    private QuantityComparison(
            Quantity quantity, ReferenceQuantity reference, SlotMap map, ErrorStatistics statistics) {
        this.quantity = quantity;
        this.reference = reference;
        this.map = map;
        this.statistics = statistics;
    }

    static QuantityComparison of(
            Quantity quantity, Layout layout, int n, KernelInstance instance, CheckSettings settings) throws Defect {
        ReferenceQuantity named = ReferenceQuantity.named(quantity.symbol()).orElseThrow();
        ReferenceQuantity reference = layout == Layout.FULL ? named : named.packedForm();
        int first = quantity.shape(n).first();
        int length = instance.length(quantity);
        int rank = reference.extents(n).size();
        SlotMap map = SlotMap.of(reference, n, layout, length, instance.index(quantity, rank), first);
        if (map.length() != length) {
            throw new Defect("the length of " + quantity.symbol() + " is " + length + ", but the layout "
                    + layout.symbol() + " has " + map.length() + " entries");
        }
        requireCover(quantity, map);
        ErrorStatistics statistics = new ErrorStatistics(quantity.symbol(), settings, first);
        return new QuantityComparison(quantity, reference, map, statistics);
    }

    /** Every entry of the array must be some component's. */
    private static void requireCover(Quantity quantity, SlotMap map) throws Defect {
        BitSet covered = new BitSet();
        for (Entry entry : map.entries()) {
            if (entry.slot() >= map.length()) {
                throw new Defect("component " + entry.indices() + " of " + quantity.symbol() + " is said to be at "
                        + entry.slot() + ", beyond the length " + map.length());
            }
            if (entry.slot() >= 0) {
                covered.set(entry.slot());
            }
        }
        if (covered.cardinality() != map.length()) {
            throw new Defect("entry " + covered.nextClearBit(0) + " of " + quantity.symbol() + " is no component's");
        }
    }

    /** A new array for the kernel to fill; what it leaves out stays NaN, which no bound accepts. */
    double[] freshResult() {
        result = new double[map.length()];
        Arrays.fill(result, Double.NaN);
        return result;
    }

    /** Compares what the kernel has written. */
    void compare(ReferenceTrio trio, SamplePoint point, InputArrays inputs, double[][] vectors) {
        double[][] own = inputs.select(quantity, vectors);
        ReferencePoint.Conditioned conditioned = trio.conditioned(reference, point, own);
        List<List<Double>> lists = new ArrayList<>();
        for (double[] vector : own) {
            lists.add(Arrays.stream(vector).boxed().toList());
        }
        statistics.add(map, conditioned, result, () -> trio.noise(reference, point, own), point, lists);
    }

    QuantityReport report() {
        return statistics.report();
    }
}
