package consumer;

import consumer.kernels.ChartTableChristoffel;
import consumer.kernels.SignalDomeChristoffel;

/** Prints a symbol of each surface: −sin θ cos θ of the sphere at θ = 1, and −r of the plane at r = 3. */
public final class Main {

    private Main() {}

    public static void main(String[] arguments) {
        double[] dome = new SignalDomeChristoffel(2.0).valuesAt(new double[] {1.0, 0.5});
        double[] table = new ChartTableChristoffel().valuesAt(new double[] {3.0, 0.5});
        System.out.println(dome[SignalDomeChristoffel.index(0, 1, 1)]);
        System.out.println(table[ChartTableChristoffel.index(0, 1, 1)]);
    }
}
