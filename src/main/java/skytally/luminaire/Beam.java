package skytally.luminaire;

import java.util.stream.DoubleStream;
import skytally.notation.QuantityFormat;

/**
 * A round beam about the nadir axis: {@code I = (n + 1) / 2π · cosⁿ γ} below its own level, nothing above.
 * With n = 1 it is the matt (Lambertian) surface, {@code cos γ / π}.
 *
 * @param exponent n, 1 or more
 */
record Beam(double exponent) implements IntensityDistribution {

    /** Share of the peak that is no light: no number of lamps makes it seen, and its magnitude would not be finite. */
    private static final double DARK = 1e-30;

    Beam {
        if (!(exponent >= 1 && exponent < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("A beam's exponent must be finite and 1 or more, not " + exponent);
        }
    }

    /**
     * The beam whose intensity has fallen to half at half its width from the axis: {@code n = ln ½ / ln cos(w/2)}.
     *
     * @param widthDeg full width at half the peak, 1 to 120 degrees
     */
    static Beam ofWidth(double widthDeg) {
        if (!(widthDeg >= 1 && widthDeg <= 120)) {
            throw new IllegalArgumentException("Beam width must be 1 to 120 degrees, not " + widthDeg);
        }
        double half = StrictMath.toRadians(widthDeg / 2);
        return new Beam(Math.max(1, StrictMath.log(0.5) / StrictMath.log(StrictMath.cos(half))));
    }

    @Override
    public double perLumen(double x, double y, double z) {
        if (z >= 0) {
            return 0;
        }
        double fall = exponent == 1 ? -z : Math.pow(-z, exponent);
        return fall < DARK ? 0 : (exponent + 1) / (2 * Math.PI) * fall;
    }

    @Override
    public double[] breaksRad() {
        double half = StrictMath.acos(StrictMath.pow(0.5, 1 / exponent));
        if (half >= Math.PI / 8) {
            return new double[] {Math.PI / 2};
        }
        // at 8 widths it has fallen to 2^-64 and nothing beyond counts
        return DoubleStream.of(half, 2 * half, 4 * half, Math.min(8 * half, Math.PI / 2), Math.PI / 2)
                .distinct()
                .toArray();
    }

    @Override
    public boolean isRound() {
        return true;
    }

    @Override
    public String formula() {
        return exponent == 1
                ? "cos γ / π for γ < 90°, else 0"
                : "(n + 1) / 2π · cosⁿ γ for γ < 90°, else 0, with n = "
                        + QuantityFormat.significant(exponent, 6).plain();
    }
}
