package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.atmosphere.Aerosol;

/** Rules that others found from outside the physics, or with other models of it. */
@DisplayName("Sky glow against rules of observers")
class SkyglowLawsTest {

    private static SkyglowKernel kernel;

    @BeforeAll
    static void solve() {
        kernel = SkyglowKernel.solve(
                new LayeredAir(Aerosol.ofDepth(0.1), new double[] {0.0975}, new double[] {0.1}, new double[] {0.15}),
                share -> {});
    }

    private static double radiance(Emission light, double distanceKm, double zenithDeg) {
        return kernel.radiance(light, Sightline.ofDegrees(distanceKm * 1000, 0, zenithDeg, 0))[0];
    }

    /** By least squares in the logarithms. */
    private static double exponent(Emission light, double zenithDeg) {
        double[] distances = {10, 15, 20, 25, 30, 40, 50};
        double x = 0;
        double y = 0;
        double xx = 0;
        double xy = 0;
        for (double distance : distances) {
            double logDistance = Math.log(distance);
            double logRadiance = Math.log(radiance(light, distance, zenithDeg));
            x += logDistance;
            y += logRadiance;
            xx += logDistance * logDistance;
            xy += logDistance * logRadiance;
        }
        int n = distances.length;
        return (n * xy - x * y) / (n * xx - x * x);
    }

    /**
     * Walker, M. F. (1977), The effects of urban lighting on the brightness of the night sky, PASP 89, 405: toward a
     * town of P inhabitants at d km, 45° up (the direction from memory), the sky brightens by 0.01 P d^−2.5 of natural,
     * 10 to 50 km, with about 1000 lm a head, of which a matt town sends up 12.5 %. Natural here 171 µcd/m².
     */
    @Test
    void walkersRuleHoldsWithinAFactorOfThree() {
        Emission town = TestEmissions.named("lambert");
        for (double distance : new double[] {10, 20, 30, 50}) {
            double perHead = 125 * radiance(town, distance, 45) / 171e-6;
            double walker = 0.01 * Math.pow(distance, -2.5);
            assertThat(perHead / walker).as("%s km", distance).isBetween(1 / 3.0, 3.0);
        }
        // 0.64 at 10 km and 0.52 at 50 km by the independent solutions of this project
        assertThat(125 * radiance(town, 10, 45) / 171e-6 / (0.01 * Math.pow(10, -2.5)))
                .isCloseTo(0.64, within(0.01));
        assertThat(125 * radiance(town, 50, 45) / 171e-6 / (0.01 * Math.pow(50, -2.5)))
                .isCloseTo(0.52, within(0.01));
    }

    @Test
    void theSkyFallsWithDistanceAsObserved() {
        assertThat(exponent(TestEmissions.named("lambert"), 0)).isBetween(-3.0, -2.2);
        assertThat(exponent(TestEmissions.named("lambert"), 45)).isBetween(-3.0, -2.2);
        // −2.56 overhead by the independent solutions of this project
        assertThat(exponent(TestEmissions.named("lambert"), 0)).isCloseTo(-2.56, within(0.02));
    }

    /**
     * Garstang, R. H. (1986), Model for artificial night-sky illumination, PASP 98, 364: a town's emission
     * {@code Φ/2π (2 G (1 − F) cos z + 0.554 F z⁴)}, G = 0.15, F = 0.15. Overhead it falls as d^−2.29 by the independent
     * solutions of this project.
     */
    @Test
    void aTownByGarstangFallsMoreSlowly() {
        Emission town = TestEmissions.of(
                (ahead, left, up) -> {
                    if (up <= 0) {
                        return 0;
                    }
                    double zenithAngle = Math.acos(up);
                    return (2 * 0.15 * 0.85 * up + 0.554 * 0.15 * Math.pow(zenithAngle, 4)) / (2 * Math.PI);
                },
                List.of());
        assertThat(exponent(town, 0)).isCloseTo(-2.29, within(0.02));
    }
}
