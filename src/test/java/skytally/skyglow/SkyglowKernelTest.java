package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;

/** What must hold of any sky, whatever the numbers. */
@DisplayName("The kernel of all orders")
class SkyglowKernelTest {

    private static final double[] GROUNDS = {0, 0.15, 0.5, 0.8};

    /** The same clear air over four grounds, as if they were wavelengths. */
    private static SkyglowKernel kernel;

    private static SkyField matt;

    @BeforeAll
    static void solve() {
        double[] molecules = {0.0975, 0.0975, 0.0975, 0.0975};
        double[] haze = {0.1, 0.1, 0.1, 0.1};
        kernel = SkyglowKernel.solve(
                new LayeredAir(Aerosol.ofDepth(0.1), molecules, haze, GROUNDS), TestResolutions.COARSE, share -> {});
        matt = kernel.lit(UpwardShape.mattGround());
    }

    private static List<Sightline> lines() {
        List<Sightline> lines = new ArrayList<>();
        for (double distance : new double[] {0.1, 10, 300, 3000, 30_000, 200_000}) {
            for (double eyeHeight : new double[] {0, 1.6, 500, 3000}) {
                for (double zenithAngle : new double[] {0, 30, 60, 85, 89.9, 95, 120, 180}) {
                    for (double azimuth : new double[] {0, 100, 180}) {
                        lines.add(Sightline.ofDegrees(distance, eyeHeight, zenithAngle, azimuth));
                    }
                }
            }
        }
        return lines;
    }

    @Test
    void isFiniteAndBrightWhereverOneStandsAndLooks() {
        for (Sightline line : lines()) {
            for (double radiance : matt.higherOrders(line)) {
                assertThat(radiance).as("%s", line).isFinite().isNotNegative();
            }
            if (line.zenithAngleRad() < Math.PI / 2) {
                assertThat(matt.higherOrders(line)[1]).as("%s", line).isPositive();
            }
        }
    }

    /** Near the light, light scattered more than once grows as a logarithm at most while light scattered once grows as 1/D. */
    @Test
    void doesNotRunAwayNearTheLight() {
        double before = 0;
        for (double distance = 300; distance > 0.01; distance /= 2) {
            double here = matt.higherOrders(Sightline.ofDegrees(distance, 0, 0, 0))[1];
            assertThat(here).as("at %s m", distance).isGreaterThanOrEqualTo(before * 0.999);
            if (before > 0) {
                assertThat(here / before).as("at %s m", distance).isLessThan(1.5);
            }
            before = here;
        }
        double once = kernel.firstOrder().radiance(TestEmissions.named("lambert"), Sightline.ofDegrees(1, 0, 0, 0))[1];
        assertThat(matt.higherOrders(Sightline.ofDegrees(1, 0, 0, 0))[1]).isLessThan(0.05 * once);
    }

    @Test
    void isTheSameOnBothSidesOfTheWayToTheLight() {
        for (double azimuth : new double[] {10, 77, 150}) {
            assertThat(matt.higherOrders(Sightline.ofDegrees(8000, 2, 50, azimuth)))
                    .containsExactly(matt.higherOrders(Sightline.ofDegrees(8000, 2, 50, -azimuth)), within(1e-15));
        }
    }

    @Test
    void brighterGroundMakesABrighterSky() {
        for (Sightline line : lines()) {
            if (line.zenithAngleRad() < Math.PI / 2) {
                double[] radiance = matt.higherOrders(line);
                for (int i = 1; i < radiance.length; i++) {
                    assertThat(radiance[i]).as("%s", line).isGreaterThan(radiance[i - 1]);
                }
            }
        }
    }

    @ParameterizedTest(name = "at zenith angle {0}°")
    @ValueSource(doubles = {0, 30, 60, 80})
    void furtherIsDarker(double zenithAngle) {
        double nearer = Double.POSITIVE_INFINITY;
        for (double distance = 100; distance < 300_000; distance *= 1.3) {
            double here = matt.higherOrders(Sightline.ofDegrees(distance, 0, zenithAngle, 0))[1];
            assertThat(here).as("at %s m", distance).isPositive().isLessThan(nearer);
            nearer = here;
        }
    }

    /** Twice the light, twice the sky; two lights, the sum of their skies. */
    @Test
    void isLinearInTheLight() {
        UpwardShape ring = UpwardShape.of(TestEmissions.named("ring60-80"));
        double[] once = {1, 1, 1, 1};
        double[] mixed = {2, 2, 2, 2};
        SkyField both = kernel.lit(
                List.of(new SkyglowKernel.Share(UpwardShape.mattGround(), mixed), new SkyglowKernel.Share(ring, once)));
        Sightline line = Sightline.ofDegrees(12_000, 1.6, 40, 60);
        double[] ofRing = kernel.lit(ring).higherOrders(line);
        double[] ofGround = matt.higherOrders(line);
        for (int i = 0; i < GROUNDS.length; i++) {
            assertThat(both.higherOrders(line)[i])
                    .isCloseTo(2 * ofGround[i] + ofRing[i], Percentage.withPercentage(1e-4));
        }
    }

    @Test
    void theWholeIsFirstOrderAndTheRest() {
        Emission light = TestEmissions.named("lambert");
        Sightline line = Sightline.ofDegrees(5000, 0, 30, 0);
        double once = kernel.firstOrder().radiance(light, line)[1];
        assertThat(kernel.radiance(light, line)[1])
                .isCloseTo(once + matt.higherOrders(line)[1], Percentage.withPercentage(1e-9));
    }

    @Test
    void aStrengthIsNeededForEachWavelength() {
        List<SkyglowKernel.Share> tooFew = List.of(new SkyglowKernel.Share(UpwardShape.mattGround(), new double[] {1}));
        assertThatThrownBy(() -> kernel.lit(tooFew))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("A strength for each of 4 wavelengths, not 1");
    }

    @Test
    void tellsHowFarItIsAndStopsWhenTold() {
        LayeredAir air = LayeredAir.of(Atmosphere.atSeaLevel(Clearness.CLEAR), new double[] {0.15}, new double[] {550});
        List<Double> shares = Collections.synchronizedList(new ArrayList<>());
        SkyglowKernel.solve(air, TestResolutions.COARSE, shares::add);
        assertThat(shares)
                .hasSizeGreaterThan(100)
                .allMatch(share -> share > 0 && share <= 1)
                .contains(1.0);

        assertThatThrownBy(() -> SkyglowKernel.solve(air, TestResolutions.COARSE, share -> {
                    if (share > 0.3) {
                        throw new CancellationException("enough");
                    }
                }))
                .isInstanceOf(CancellationException.class)
                .hasMessage("enough");
    }
}
