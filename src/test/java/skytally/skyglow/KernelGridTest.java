package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;

/**
 * What is found between the kernels kept, against the same air solved for itself. All at the coarse resolution: how
 * well one follows from its neighbours does not depend on it, and so it takes seconds.
 */
@DisplayName("Kernels between those kept")
class KernelGridTest {

    private static final double[] WAVELENGTHS_NM = {420, 470, 530, 580, 630, 690};
    private static final double[] DISTANCES_M = {500, 5000, 20_000, 50_000, 100_000};
    private static final double[] ZENITH_ANGLES_DEG = {0, 45, 75, 85};
    private static final double[] AZIMUTHS_DEG = {0, 90, 180};

    private static SkyglowKernel[][] kept;
    private static KernelGrid grid;

    @BeforeAll
    static void solve() {
        kept = new SkyglowKernel[KernelGrid.HAZE_DEPTHS.length][KernelGrid.REFLECTANCES.length];
        for (int haze = 0; haze < kept.length; haze++) {
            for (int ground = 0; ground < kept[haze].length; ground++) {
                kept[haze][ground] =
                        SkyglowKernel.solve(KernelGrid.node(haze, ground), TestResolutions.COARSE, share -> {});
            }
        }
        grid = new KernelGrid((haze, ground) -> kept[haze][ground]);
    }

    private static SkyglowKernel solved(Atmosphere air, double reflectance) {
        double[] ground = new double[WAVELENGTHS_NM.length];
        Arrays.fill(ground, reflectance);
        return SkyglowKernel.solve(LayeredAir.of(air, ground, WAVELENGTHS_NM), TestResolutions.COARSE, share -> {});
    }

    private static Atmosphere air(double hazeDepth, double angstrom, double groundHeightM) {
        return new Atmosphere(new Aerosol(hazeDepth, angstrom, 1500, 0.95, 0.65), groundHeightM);
    }

    @ParameterizedTest(name = "haze {0}, Ångström {1}, ground {2} at {3} m")
    @CsvSource({
        "0.07, 1.3, 0.10, 0",
        "0.14, 1.3, 0.22, 0",
        "0.25, 1.3, 0.50, 0",
        "0.15, 1.3, 0.08, 800",
        "0.05, 1.3, 0.05, 3000",
        "0.30, 1.3, 0.60, 3000",
        "0.10, 1.3, 0.15, -400",
        "0.12, 0.9, 0.18, 1500",
        "0.12, 1.7, 0.40, 300"
    })
    void areWithinTwoPerCentOfTheSameAirSolved(double haze, double angstrom, double ground, double heightM) {
        Atmosphere air = air(haze, angstrom, heightM);
        List<Double> misses = misses(grid.between(air, ground, WAVELENGTHS_NM), solved(air, ground));
        assertThat(Collections.max(misses)).as("worst").isLessThan(0.02);
        assertThat(misses.stream().mapToDouble(miss -> miss).average().orElseThrow())
                .as("mean")
                .isLessThan(0.002);
    }

    /** Of the light scattered more than once, and alone, so that first order hides nothing. */
    private static List<Double> misses(SkyglowKernel found, SkyglowKernel expected) {
        List<Double> misses = new ArrayList<>();
        for (String emission : List.of("lambert", "ring80-90")) {
            UpwardShape shape = UpwardShape.of(TestEmissions.named(emission));
            SkyField foundField = found.lit(shape);
            SkyField expectedField = expected.lit(shape);
            for (double distance : DISTANCES_M) {
                for (double zenithAngle : ZENITH_ANGLES_DEG) {
                    for (double azimuth : AZIMUTHS_DEG) {
                        Sightline line = Sightline.ofDegrees(distance, 1.6, zenithAngle, azimuth);
                        double[] one = foundField.higherOrders(line);
                        double[] other = expectedField.higherOrders(line);
                        for (int w = 0; w < one.length; w++) {
                            misses.add(Math.abs(one[w] / other[w] - 1));
                        }
                    }
                }
            }
        }
        return misses;
    }

    @Test
    void aKernelKeptIsFoundAsItIs() {
        Atmosphere air = air(0.10, 1.3, 0);
        List<Double> misses = misses(grid.between(air, 0.15, WAVELENGTHS_NM), solved(air, 0.15));
        assertThat(Collections.max(misses)).isLessThan(1e-6);
    }

    @Test
    void theMoleculesOfAWavelengthAreFoundAgain() {
        Atmosphere seaLevel = air(0.1, 1.3, 0);
        for (double nm : new double[] {430, 555, 633, 700}) {
            assertThat(KernelGrid.wavelengthAtSeaLevel(seaLevel.molecularOpticalDepth(nm)))
                    .isCloseTo(nm, within(1e-9));
        }
    }

    @ParameterizedTest(name = "{4}")
    @CsvSource({
        "0.04, 1.3, 0.15, 0, Aerosol optical depth at 550 nm must be 0.05 to 0.3",
        "0.31, 1.3, 0.15, 0, Aerosol optical depth at 550 nm must be 0.05 to 0.3",
        "0.10, 1.3, 0.04, 0, Reflectance of the ground must be 0.05 to 0.8",
        "0.10, 1.3, 0.85, 0, Reflectance of the ground must be 0.05 to 0.8",
        "0.10, 1.3, 0.15, 3100, Ground height in metres must be -500.0 to 3000",
        "0.05, 0.2, 0.15, 0, At 420 nm the haze is as one of depth 0.037",
        "0.30, 3.0, 0.15, 0, At 420 nm the haze is as one of depth 0.474"
    })
    void outsideIsRefusedWithTheReason(double haze, double angstrom, double ground, double heightM, String reason) {
        assertThatThrownBy(() -> grid.between(air(haze, angstrom, heightM), ground, WAVELENGTHS_NM))
                .isInstanceOf(OutsideKernelGridException.class)
                .hasMessageStartingWith(reason);
    }

    @Test
    void otherWavelengthsAndOtherHazeAreRefused() {
        assertThatThrownBy(() -> grid.between(air(0.1, 1.3, 0), 0.15, 380))
                .isInstanceOf(OutsideKernelGridException.class)
                .hasMessageContaining("reach from 412 to 762 nm");
        Atmosphere marine = new Atmosphere(new Aerosol(0.1, 1.3, 1000, 0.95, 0.65), 0);
        assertThatThrownBy(() -> grid.between(marine, 0.15, 550))
                .isInstanceOf(OutsideKernelGridException.class)
                .hasMessageContaining("other haze has to be solved for itself");
    }
}
