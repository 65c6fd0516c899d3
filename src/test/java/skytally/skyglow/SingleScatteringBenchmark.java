package skytally.skyglow;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.integration.IterativeLegendreGaussIntegrator;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;
import skytally.atmosphere.ExponentialLayer;
import skytally.atmosphere.Molecules;

/**
 * One line of sight at six wavelengths, by the house's rule and as a person would write it with a library's adaptive
 * integrator: the same integrand in plain s, begun where the
 * light is above its horizon and parted at the point nearest the light. Both are held to 1e-4 of the
 * converged value before anything is timed.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 6, time = 300, timeUnit = TimeUnit.MILLISECONDS)
@Measurement(iterations = 15, time = 300, timeUnit = TimeUnit.MILLISECONDS)
@Fork(2)
public class SingleScatteringBenchmark {

    private static final double[] WAVELENGTHS_NM = {420, 470, 530, 580, 630, 690};
    private static final double ACCURACY = 1e-4;
    /** What it must be asked for, by trial, to keep the accuracy on every line. */
    private static final double ASKED_OF_LIBRARY = 2e-5;

    private static final double R = Atmosphere.EARTH_RADIUS_M;
    private static final double[] DISTANCES_M = {300, 1000, 10_000, 50_000};
    private static final double[][] LOOKS_DEG = {{0, 0}, {60, 0}, {75, 120}};
    private static final int LINES = 12;
    private static final int MOST_EVALUATIONS = 1_000_000;

    private final Atmosphere clear = Atmosphere.atSeaLevel(Clearness.CLEAR);
    private final Aerosol aerosol = clear.aerosol();
    private final double[] molecularDepth =
            Arrays.stream(WAVELENGTHS_NM).map(clear::molecularOpticalDepth).toArray();
    private final double[] aerosolDepth =
            Arrays.stream(WAVELENGTHS_NM).map(aerosol::opticalDepth).toArray();
    private final SingleScattering air = new SingleScattering(clear, WAVELENGTHS_NM);
    private final Emission light = TestEmissions.named("lambert");
    private final List<Sightline> lines = new ArrayList<>();
    private final IterativeLegendreGaussIntegrator library =
            new IterativeLegendreGaussIntegrator(5, ASKED_OF_LIBRARY, 1e-300, 2, 30);

    public SingleScatteringBenchmark() {
        for (double distanceM : DISTANCES_M) {
            for (double[] look : LOOKS_DEG) {
                lines.add(Sightline.ofDegrees(distanceM, 0, look[0], look[1]));
            }
        }
        if (lines.size() != LINES) {
            throw new IllegalStateException(lines.size() + " lines, not " + LINES);
        }
        for (Sightline line : lines) {
            double[] quick = air.radiance(light, line);
            for (int i = 0; i < WAVELENGTHS_NM.length; i++) {
                double converged =
                        new PlainScattering(aerosol, molecularDepth[i], aerosolDepth[i], light, line).converged();
                require("the house's rule", quick[i], converged, line);
                require("the library's rule", byLibrary(line, i), converged, line);
            }
        }
    }

    private static void require(String rule, double value, double converged, Sightline line) {
        if (!(Math.abs(value / converged - 1) <= ACCURACY)) {
            throw new IllegalStateException(rule + " is off by " + (value / converged - 1) + " on " + line);
        }
    }

    @Benchmark
    @OperationsPerInvocation(LINES)
    public double byHouse() {
        double sum = 0;
        for (Sightline line : lines) {
            sum += air.radiance(light, line)[0];
        }
        return sum;
    }

    @Benchmark
    @OperationsPerInvocation(LINES)
    public double byLibrary() {
        double sum = 0;
        for (Sightline line : lines) {
            for (int i = 0; i < WAVELENGTHS_NM.length; i++) {
                sum += byLibrary(line, i);
            }
        }
        return sum;
    }

    private double byLibrary(Sightline line, int wavelength) {
        double turn = line.groundDistanceM() / R;
        double zenithCosine = Math.cos(line.zenithAngleRad());
        double level = Math.sin(line.zenithAngleRad());
        double viewX = -level * Math.cos(line.azimuthRad()) * Math.cos(turn) + zenithCosine * Math.sin(turn);
        double viewY = level * Math.sin(line.azimuthRad());
        double viewZ = level * Math.cos(line.azimuthRad()) * Math.sin(turn) + zenithCosine * Math.cos(turn);
        double eyeX = R * Math.sin(turn);
        double eyeZ = -2 * R * Math.sin(turn / 2) * Math.sin(turn / 2);
        double nearest = -(eyeX * viewX + eyeZ * viewZ);
        double top = R + Atmosphere.TOP_M;
        double end = -R * zenithCosine + Math.sqrt(R * R * zenithCosine * zenithCosine + top * top - R * R);
        UnivariateFunction integrand = s -> {
            double x = eyeX + s * viewX;
            double y = s * viewY;
            double z = eyeZ + s * viewZ;
            double distance = Math.sqrt(x * x + y * y + z * z);
            double up = z / distance;
            if (up <= 0) {
                return 0;
            }
            double height = Math.sqrt(R * R + s * (2 * R * zenithCosine + s)) - R;
            double cosine = (nearest - s) / distance;
            return light.toward(x / distance, y / distance, up)
                    / (distance * distance)
                    * scattered(height, cosine, wavelength)
                    * Math.exp(-depth(up, distance, wavelength) - depth(zenithCosine, s, wavelength));
        };
        double begin = Math.max(0, -eyeZ / viewZ); // below it the Earth is in the way
        double parting = Math.max(begin, Math.min(end, nearest));
        double far = library.integrate(MOST_EVALUATIONS, integrand, parting, end);
        return parting > begin ? far + library.integrate(MOST_EVALUATIONS, integrand, begin, parting) : far;
    }

    private double scattered(double height, double cosine, int wavelength) {
        return molecularDepth[wavelength]
                        / Molecules.SCALE_HEIGHT_M
                        * ExponentialLayer.density(Molecules.SCALE_HEIGHT_M, height)
                        * Molecules.phase(cosine)
                + aerosol.singleScatteringAlbedo()
                        * aerosolDepth[wavelength]
                        / aerosol.scaleHeightM()
                        * ExponentialLayer.density(aerosol.scaleHeightM(), height)
                        * aerosol.phase(cosine);
    }

    private double depth(double up, double length, int wavelength) {
        return molecularDepth[wavelength] * ExponentialLayer.on(R, Molecules.SCALE_HEIGHT_M, 0, up, length)
                + aerosolDepth[wavelength] * ExponentialLayer.on(R, aerosol.scaleHeightM(), 0, up, length);
    }
}
