package skytally.skyglow;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;

/**
 * The sky of all orders: a new atmosphere, nine shapes at six wavelengths, worked out side by side and one wavelength
 * at a time; and a dome of 612 directions at six wavelengths for one place, from a kernel that is ready, beside the
 * first order of the same.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class SkyglowKernelBenchmark {

    private static final double[] WAVELENGTHS_NM = {420, 470, 530, 580, 630, 690};
    private static final double REFLECTANCE = 0.15;
    private static final int LEAST_DIRECTIONS = 600;

    private final Atmosphere clear = Atmosphere.atSeaLevel(Clearness.CLEAR);
    private final SkyglowKernel kernel = SkyglowKernel.solve(clear, REFLECTANCE, share -> {}, WAVELENGTHS_NM);
    private final Emission light = TestEmissions.named("lambert");
    private final List<Sightline> dome = new ArrayList<>();

    public SkyglowKernelBenchmark() {
        for (double zenithAngle = 2.5; zenithAngle < 85; zenithAngle += 5) {
            for (double azimuth = 0; azimuth < 360; azimuth += 10) {
                dome.add(Sightline.ofDegrees(20_000, 1.6, zenithAngle, azimuth));
            }
        }
        if (dome.size() < LEAST_DIRECTIONS) {
            throw new IllegalStateException(dome.size() + " directions");
        }
    }

    @Benchmark
    public SkyglowKernel newAtmosphere() {
        return SkyglowKernel.solve(clear, REFLECTANCE, share -> {}, WAVELENGTHS_NM);
    }

    @Benchmark
    public List<SkyglowKernel> newAtmosphereByWavelength() {
        List<SkyglowKernel> kernels = new ArrayList<>();
        for (double nm : WAVELENGTHS_NM) {
            kernels.add(SkyglowKernel.solve(clear, REFLECTANCE, share -> {}, nm));
        }
        return kernels;
    }

    /** Shape, field, first order and all others. */
    @Benchmark
    public double dome() {
        SkyField field = kernel.lit(UpwardShape.of(light));
        double sum = firstOrderOfDome();
        for (Sightline line : dome) {
            sum += field.higherOrders(line)[0];
        }
        return sum;
    }

    @Benchmark
    public double firstOrderOfDome() {
        double sum = 0;
        for (Sightline line : dome) {
            sum += kernel.firstOrder().radiance(light, line)[0];
        }
        return sum;
    }
}
