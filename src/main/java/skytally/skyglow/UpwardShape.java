package skytally.skyglow;

import java.util.Arrays;
import java.util.List;

/**
 * The part of an emission that goes up, by zenith angle alone: the mean over azimuth, as a sum of nine hats. That is
 * all that light scattered more than once remembers of a lamp.
 *
 * <p>The hats' weights are those nearest in the mean square over the half-sphere. The hats add up to 1 everywhere, so
 * the flux is kept exactly, and with it the mean of everything that is straight between the hats.
 */
public final class UpwardShape {

    private static final double[][] GRAM = gram();

    private static final UpwardShape MATT_GROUND = of(new MattGround());

    private final double[] weights;

    private UpwardShape(double[] weights) {
        this.weights = weights;
    }

    /** Of an emission, in its own unit of intensity. What it sends below the level is left out. */
    public static UpwardShape of(Emission light) {
        double[] onHats = new double[ZenithHats.COUNT];
        new UpwardGathering(light).addTo(onHats);
        return new UpwardShape(solved(onHats));
    }

    /** {@code cos z / π}: matt ground that sends back one unit of flux. */
    public static UpwardShape mattGround() {
        return MATT_GROUND;
    }

    /** Flux upward, in the emission's unit of intensity times steradian. */
    public double flux() {
        double sum = 0;
        for (int i = 0; i < ZenithHats.COUNT; i++) {
            double row = 0;
            for (int j = 0; j < ZenithHats.COUNT; j++) {
                row += GRAM[i][j];
            }
            sum += weights[i] * row;
        }
        return sum;
    }

    double weight(int hat) {
        return weights[hat];
    }

    /** Integrals over the half-sphere of each pair of hats. */
    private static double[][] gram() {
        double[][] gram = new double[ZenithHats.COUNT][ZenithHats.COUNT];
        GaussRule rule = GaussRule.of(16);
        for (int i = 0; i < ZenithHats.COUNT - 1; i++) {
            double half = (ZenithHats.peak(i + 1) - ZenithHats.peak(i)) / 2;
            for (int n = 0; n < rule.count(); n++) {
                double zenithAngle = ZenithHats.peak(i) + half * (1 + rule.nodes()[n]);
                double solidAngle = 2 * Math.PI * StrictMath.sin(zenithAngle) * half * rule.weights()[n];
                double upper = ZenithHats.share(i, zenithAngle);
                gram[i][i] += solidAngle * (1 - upper) * (1 - upper);
                gram[i][i + 1] += solidAngle * (1 - upper) * upper;
                gram[i + 1][i] += solidAngle * (1 - upper) * upper;
                gram[i + 1][i + 1] += solidAngle * upper * upper;
            }
        }
        return gram;
    }

    /** Each hat overlaps only with its neighbours: forward and back once. */
    private static double[] solved(double[] right) {
        double[] value = right.clone();
        double[] pivot = new double[value.length];
        pivot[0] = GRAM[0][0];
        for (int i = 1; i < value.length; i++) {
            double factor = GRAM[i][i - 1] / pivot[i - 1];
            pivot[i] = GRAM[i][i] - factor * GRAM[i - 1][i];
            value[i] -= factor * value[i - 1];
        }
        for (int i = value.length - 1; i >= 0; i--) {
            double known = i + 1 < value.length ? GRAM[i][i + 1] * value[i + 1] : 0;
            value[i] = (value[i] - known) / pivot[i];
        }
        return value;
    }

    @Override
    public String toString() {
        return "UpwardShape" + Arrays.toString(weights);
    }

    private record MattGround() implements Emission {

        @Override
        public double toward(double ahead, double left, double up) {
            return up > 0 ? up / Math.PI : 0;
        }

        @Override
        public List<Cone> edges() {
            return List.of();
        }

        @Override
        public double heightM() {
            return 0;
        }
    }
}
