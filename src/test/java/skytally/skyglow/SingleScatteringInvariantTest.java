package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;

@DisplayName("First-order sky glow: what must hold whatever the numbers")
class SingleScatteringInvariantTest {

    private static final SingleScattering CLEAR =
            new SingleScattering(Atmosphere.atSeaLevel(Clearness.CLEAR), 420, 550, 690);
    private static final Emission LAMBERT = TestEmissions.named("lambert");
    private static final Emission RING = TestEmissions.named("ring75-90");

    private static List<Sightline> someLines() {
        List<Sightline> lines = new ArrayList<>();
        for (double distance : new double[] {5, 800, 20_000}) {
            for (double zenith : new double[] {0, 45, 80, 95}) {
                for (double azimuth : new double[] {0, 70, 180}) {
                    lines.add(Sightline.ofDegrees(distance, 1.6, zenith, azimuth));
                }
            }
        }
        return lines;
    }

    @Test
    void lightAdds() {
        Emission both =
                TestEmissions.of((a, l, u) -> 3 * LAMBERT.toward(a, l, u) + 0.5 * RING.toward(a, l, u), RING.edges());
        for (Sightline line : someLines()) {
            double[] one = CLEAR.radiance(LAMBERT, line);
            double[] other = CLEAR.radiance(RING, line);
            double[] sum = CLEAR.radiance(both, line);
            for (int i = 0; i < sum.length; i++) {
                double expected = 3 * one[i] + 0.5 * other[i];
                assertThat(sum[i]).as("%s", line).isCloseTo(expected, within(1e-5 * expected));
            }
        }
    }

    @Test
    void leftAndRightOfARoundLightAreAlike() {
        for (double azimuth : new double[] {1, 40, 90, 135, 179}) {
            double[] right = CLEAR.radiance(RING, Sightline.ofDegrees(2000, 1.6, 65, azimuth));
            double[] left = CLEAR.radiance(RING, Sightline.ofDegrees(2000, 1.6, 65, -azimuth));
            double[] round = CLEAR.radiance(RING, Sightline.ofDegrees(2000, 1.6, 65, 360 - azimuth));
            assertThat(left).containsExactly(right, within(1e-12 * right[0]));
            assertThat(round).containsExactly(right, within(1e-12 * right[0]));
        }
    }

    @Test
    void theAzimuthOfTheZenithDoesNotMatter() {
        double[] north = CLEAR.radiance(LAMBERT, Sightline.ofDegrees(3000, 1.6, 0, 0));
        double[] east = CLEAR.radiance(LAMBERT, Sightline.ofDegrees(3000, 1.6, 0, 90));
        assertThat(east).containsExactly(north, within(1e-12 * north[0]));
    }

    /** Light thrown to the left brightens the sky on the left: the mirror image of light thrown to the right. */
    @Test
    void aMirroredLightGivesAMirroredSky() {
        Emission leftward = TestEmissions.of((a, l, u) -> u > 0 ? 1 + 0.8 * l : 0, List.of());
        Emission rightward = TestEmissions.of((a, l, u) -> u > 0 ? 1 - 0.8 * l : 0, List.of());
        double right = CLEAR.radiance(rightward, Sightline.ofDegrees(1000, 0, 60, 50))[1];
        assertThat(CLEAR.radiance(leftward, Sightline.ofDegrees(1000, 0, 60, -50))[1])
                .isCloseTo(right, within(1e-12 * right));
        // Seen from the viewer's place the frame of the light looks back: its left is the viewer's right.
        assertThat(CLEAR.radiance(leftward, Sightline.ofDegrees(1000, 0, 60, 50))[1])
                .isGreaterThan(1.05 * right);
    }

    @ParameterizedTest(name = "at zenith angle {0}°")
    @ValueSource(doubles = {0, 30, 60, 80})
    void furtherIsDarker(double zenithDeg) {
        for (Emission light : List.of(LAMBERT, RING)) {
            double nearer = Double.POSITIVE_INFINITY;
            for (double distance = 10; distance < 300_000; distance *= 1.3) {
                double here = CLEAR.radiance(light, Sightline.ofDegrees(distance, 0, zenithDeg, 0))[1];
                assertThat(here).as("at %s m", distance).isPositive().isLessThan(nearer);
                nearer = here;
            }
        }
    }

    /** In air that dims nothing, the far sky loses to distance alone, so overhead L falls as 1/D. */
    @Test
    void overheadInThinAirFallsWithDistance() {
        SingleScattering thin = new SingleScattering(Aerosol.ofDepth(0), new double[] {1e-9}, new double[] {0});
        Emission even = TestEmissions.of((a, l, u) -> 1, List.of());
        double near = thin.radiance(even, Sightline.ofDegrees(0.1, 0, 0, 0))[0];
        double far = thin.radiance(even, Sightline.ofDegrees(1, 0, 0, 0))[0];
        assertThat(near / far).isCloseTo(10, within(0.03));
    }

    /**
     * Isotropic scattering (g = 0 in the haze) with no molecules, flat and uniform air that dims nothing: overhead at D
     * the sky is β I / 8D, the integral of 1/(D² + s²) being π/2D and the phase 1/4π.
     */
    @Test
    void agreesWithTheFlatCaseOfIsotropicScattering() {
        double depth = 1e-9;
        double scaleHeight = 10_000;
        Aerosol even = new Aerosol(depth, 0, scaleHeight, 1, 0);
        SingleScattering air = new SingleScattering(even, new double[] {0}, new double[] {depth});
        double distance = 0.5;
        double found =
                air.radiance(TestEmissions.of((a, l, u) -> 1, List.of()), Sightline.ofDegrees(distance, 0, 0, 0))[0];
        assertThat(found / (depth / scaleHeight / (8 * distance))).isCloseTo(1, within(5e-4));
    }

    @Test
    void shortWavesAreScatteredMoreNearby() {
        double[] near = CLEAR.radiance(LAMBERT, Sightline.ofDegrees(500, 0, 0, 0));
        assertThat(near[0]).isGreaterThan(near[1]);
        assertThat(near[1]).isGreaterThan(near[2]);
    }

    @Test
    void darknessStaysDark() {
        Emission none = TestEmissions.of((a, l, u) -> 0, List.of());
        assertThat(CLEAR.radiance(none, Sightline.ofDegrees(500, 0, 30, 0))).containsOnly(0);
    }
}
