package io.github.gammawright.graph;

/** A few points of a metric's domain, with a value for every symbol at each of them. */
public interface SamplePoints {

    /** How many points there are. */
    int count();

    /** The value of a symbol at one of the points, NaN where it has none. */
    double value(Symbol symbol, int point);

    /** Points that know nothing of a domain: values between 1/2 and 3/2, the same in every run. */
    static SamplePoints arbitrary(int count) {
        return new SamplePoints() {
            @Override
            public int count() {
                return count;
            }

            @Override
            public double value(Symbol symbol, int point) {
                long key = symbol.kind().name().hashCode() * 1_000_003L + symbol.index() * 8_191L + point;
                for (int order : symbol.orders()) {
                    key = key * 31 + order + 1;
                }
                return 0.5 + PrimeField.VALUES.scramble(key) / (double) PrimeField.VALUES.prime();
            }
        };
    }
}
