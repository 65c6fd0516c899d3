package skytally.skyglow;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleConsumer;
import skytally.atmosphere.Atmosphere;

/**
 * The answer of one atmosphere over matt ground to any light, at some wavelengths: all orders of scattering over a
 * round Earth. Light is linear, so the sky over any light follows from one kernel without solving again.
 *
 * <p>Light scattered once is worked out for each light and line exactly, with the light's own directions and height
 * ({@link SingleScattering}). Light scattered more often forgets the azimuth it was sent out at; it comes from fields
 * around a light on the ground, kept for nine hats of zenith angle ({@link UpwardShape}). For many lines make
 * a {@link SkyField} once with {@link #lit} and add {@link #firstOrder()}; {@link #radiance} does both for one.
 *
 * <p>Never changes; safe for use by several threads.
 */
public final class SkyglowKernel {

    /** Changes with every change of the method that moves a digit; kernels kept under another are made again. */
    public static final String METHOD = "successive-orders-1";

    private static final double THICK_HAZE = 0.2;
    private static final double BRIGHT_GROUND = 0.4;
    /** Orders that are followed one by one. */
    private static final int USUAL_ORDERS = 6;
    /** The same where haze is thick or the ground is bright. */
    private static final int MORE_ORDERS = 7;

    private final LayeredAir air;
    private final FieldGrid grid;
    private final AngularBasis basis;
    /** For each wavelength: by point, then by function of direction, then by hat. */
    private final float[][] moments;
    /** For each wavelength, by row. */
    private final double[][] logSize;
    /** For each wavelength, by row, then by hat. */
    private final float[][] onGround;

    private final SingleScattering firstOrder;

    SkyglowKernel(
            LayeredAir air,
            FieldGrid grid,
            AngularBasis basis,
            float[][] moments,
            double[][] logSize,
            float[][] onGround) {
        this.air = air;
        this.grid = grid;
        this.basis = basis;
        this.moments = moments;
        this.logSize = logSize;
        this.onGround = onGround;
        this.firstOrder = new SingleScattering(air.aerosol(), air.molecularDepth(), air.hazeDepth());
    }

    /**
     * Works out a kernel: some seconds, on as many threads as the common pool has, with the same digits on any.
     *
     * @param reflectance   of the ground, matt, 0 to 1
     * @param progress      told the share done, 0 to 1, again and again and from any thread; an exception from it
     *                      stops the work within a moment and is thrown on
     * @param wavelengthsNm the wavelengths to work at, in nanometres
     */
    public static SkyglowKernel solve(
            Atmosphere air, double reflectance, DoubleConsumer progress, double... wavelengthsNm) {
        double[] ground = new double[wavelengthsNm.length];
        Arrays.fill(ground, reflectance);
        return solve(LayeredAir.of(air, ground, wavelengthsNm), progress);
    }

    static SkyglowKernel solve(LayeredAir air, DoubleConsumer progress) {
        boolean thick = Arrays.stream(air.hazeDepth()).anyMatch(depth -> depth >= THICK_HAZE);
        boolean bright = Arrays.stream(air.reflectance()).anyMatch(share -> share >= BRIGHT_GROUND);
        return solve(air, Resolution.USUAL.withOrders(thick || bright ? MORE_ORDERS : USUAL_ORDERS), progress);
    }

    static SkyglowKernel solve(LayeredAir air, Resolution resolution, DoubleConsumer progress) {
        return of(MultipleScattering.solve(air, resolution, progress));
    }

    private static SkyglowKernel of(ScatteredField field) {
        int wavelengths = field.air().wavelengths();
        int lanes = wavelengths * ZenithHats.COUNT;
        int rows = field.grid().distances();
        int perPoint = field.basis().size() * ZenithHats.COUNT;
        float[][] moments = new float[wavelengths][field.grid().points() * perPoint];
        double[][] logSize = new double[wavelengths][rows];
        float[][] onGround = new float[wavelengths][rows * ZenithHats.COUNT];
        for (int w = 0; w < wavelengths; w++) {
            for (int i = 0; i < moments[w].length; i++) {
                moments[w][i] = field.moments()[i / perPoint][lane(i % perPoint, w, lanes)];
            }
            for (int i = 0; i < onGround[w].length; i++) {
                onGround[w][i] = (float) field.onGround()[lane(i, w, lanes)];
            }
            for (int row = 0; row < rows; row++) {
                logSize[w][row] = field.logSize()[row * wavelengths + w];
            }
        }
        return new SkyglowKernel(field.air(), field.grid(), field.basis(), moments, logSize, onGround);
    }

    /** Where the i-th number of one wavelength stands among those of all. */
    private static int lane(int i, int w, int lanes) {
        return i / ZenithHats.COUNT * lanes + w * ZenithHats.COUNT + i % ZenithHats.COUNT;
    }

    // ---- the door ----

    /**
     * Radiance along a line of sight by light scattered once, twice and so on, for each wavelength.
     *
     * @return per square metre: multiply W/sr in to get W/(m² sr) out, cd in to get cd/m² out
     */
    public double[] radiance(Emission light, Sightline line) {
        double[] sum = firstOrder.radiance(light, line);
        double[] more = lit(UpwardShape.of(light)).higherOrders(line);
        for (int w = 0; w < sum.length; w++) {
            sum[w] += more[w];
        }
        return sum;
    }

    /** Light scattered once, in the same air. */
    public SingleScattering firstOrder() {
        return firstOrder;
    }

    /** The field around a light of this shape, per unit of the intensity it was made with, at every wavelength. */
    public SkyField lit(UpwardShape shape) {
        double[] even = new double[air.wavelengths()];
        Arrays.fill(even, 1);
        return lit(List.of(new Share(shape, even)));
    }

    /**
     * A part of what lights that stand together send up.
     *
     * @param shape    by zenith angle
     * @param strength how much of it, for each wavelength
     */
    public record Share(UpwardShape shape, double[] strength) {}

    /** The field around lights that stand together. */
    public SkyField lit(List<Share> shares) {
        int wavelengths = air.wavelengths();
        float[][] summed = new float[grid.points()][basis.size() * wavelengths];
        double[] ground = new double[grid.distances() * wavelengths];
        double[] size = new double[grid.distances() * wavelengths];
        for (int w = 0; w < wavelengths; w++) {
            double[] weights = weights(shares, w);
            weigh(moments[w], weights, w, summed);
            for (int row = 0; row < grid.distances(); row++) {
                ground[row * wavelengths + w] = dot(onGround[w], row * ZenithHats.COUNT, weights);
            }
            for (int row = 0; row < grid.distances(); row++) {
                size[row * wavelengths + w] = logSize[w][row];
            }
        }
        return new SkyField(new ScatteredField(air, grid, basis, wavelengths, summed, size, ground));
    }

    private double[] weights(List<Share> shares, int w) {
        double[] weights = new double[ZenithHats.COUNT];
        for (Share share : shares) {
            if (share.strength().length != air.wavelengths()) {
                throw new IllegalArgumentException(
                        "A strength for each of " + air.wavelengths() + " wavelengths, not " + share.strength().length);
            }
            for (int hat = 0; hat < weights.length; hat++) {
                weights[hat] += share.shape().weight(hat) * share.strength()[w];
            }
        }
        return weights;
    }

    private void weigh(float[] hats, double[] weights, int w, float[][] into) {
        for (int i = 0; i < hats.length / ZenithHats.COUNT; i++) {
            into[i / basis.size()][i % basis.size() * air.wavelengths() + w] =
                    (float) dot(hats, i * ZenithHats.COUNT, weights);
        }
    }

    private static double dot(float[] hats, int first, double[] weights) {
        double sum = 0;
        for (int hat = 0; hat < ZenithHats.COUNT; hat++) {
            sum += weights[hat] * hats[first + hat];
        }
        return sum;
    }

    // ---- for keeping it, and for finding others between ----

    LayeredAir air() {
        return air;
    }

    FieldGrid grid() {
        return grid;
    }

    AngularBasis basis() {
        return basis;
    }

    float[] moments(int w) {
        return moments[w];
    }

    double[] logSize(int w) {
        return logSize[w];
    }

    float[] onGround(int w) {
        return onGround[w];
    }

    /** A kernel put together from others of the same grid. */
    static final class Blend {

        private final LayeredAir air;
        private final SkyglowKernel form;
        private final double[][] moments;
        private final double[][] logSize;
        private final double[][] onGround;

        Blend(LayeredAir air, SkyglowKernel form) {
            this.air = air;
            this.form = form;
            int wavelengths = air.wavelengths();
            moments = new double[wavelengths][form.moments[0].length];
            logSize = new double[wavelengths][form.logSize[0].length];
            onGround = new double[wavelengths][form.onGround[0].length];
        }

        /** Adds to wavelength {@code w} what {@code from} has at its wavelength {@code fromW}. */
        void add(int w, SkyglowKernel from, int fromW, double weight) {
            addTo(moments[w], from.moments[fromW], weight);
            addTo(onGround[w], from.onGround[fromW], weight);
            for (int i = 0; i < logSize[w].length; i++) {
                logSize[w][i] += weight * from.logSize[fromW][i];
            }
        }

        private static void addTo(double[] sum, float[] values, double weight) {
            for (int i = 0; i < sum.length; i++) {
                sum[i] += weight * values[i];
            }
        }

        SkyglowKernel kernel() {
            List<float[]> rounded = new ArrayList<>();
            for (double[][] all : List.of(moments, onGround)) {
                for (double[] values : all) {
                    float[] floats = new float[values.length];
                    for (int i = 0; i < floats.length; i++) {
                        floats[i] = (float) values[i];
                    }
                    rounded.add(floats);
                }
            }
            int wavelengths = air.wavelengths();
            return new SkyglowKernel(
                    air,
                    form.grid,
                    form.basis,
                    rounded.subList(0, wavelengths).toArray(float[][]::new),
                    logSize,
                    rounded.subList(wavelengths, 2 * wavelengths).toArray(float[][]::new));
        }
    }
}
