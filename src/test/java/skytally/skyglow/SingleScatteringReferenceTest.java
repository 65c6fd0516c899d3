package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;

@DisplayName("First-order sky glow against independent solutions")
class SingleScatteringReferenceTest {

    /** Column L1 of the independent solutions: converged quadrature by another program. */
    @ParameterizedTest(name = "case {0}, {8}, {9} km, z {10}, az {11}")
    @CsvFileSource(resources = "/reference/skyglow-solutions.csv", numLinesToSkip = 1)
    void agreesWithinATenthOfAPercent(
            String name,
            double tauR,
            double tauA,
            double hR,
            double hA,
            double albedo,
            double g,
            double reflectance,
            String emission,
            double distanceKm,
            double zenithDeg,
            double azimuthDeg,
            double expectedPerKm2) {
        assertThat(hR).isEqualTo(8.0);
        SingleScattering air = new SingleScattering(
                new Aerosol(tauA, 1.3, hA * 1000, albedo, g), new double[] {tauR}, new double[] {tauA});
        double[] found = air.radiance(
                TestEmissions.named(emission), Sightline.ofDegrees(distanceKm * 1000, 0, zenithDeg, azimuthDeg));

        assertThat(found[0] * 1e6).isCloseTo(expectedPerKm2, Percentage.withPercentage(0.1));
    }

    /**
     * Flat ground, uniform air of coefficient β that dims nothing, isotropic scattering and intensity I: looking
     * overhead from distance D gives β I / 8D (the integral of 1/(D² + s²) along the line is π/2D, times β I / 4π).
     * Here: molecules so thin that they dim nothing, close enough that Earth is flat and the air uniform.
     */
    @Test
    void agreesWithTheFlatUniformCase() {
        double thin = 1e-9;
        double distanceM = 1;
        SingleScattering air = new SingleScattering(Aerosol.ofDepth(0), new double[] {thin}, new double[] {0});
        // Rayleigh's phase weighted over the half line: 3/16π ∫(1 + cos²γ) dγ from π/2 to π = 3/16π · 3π/4
        double expected = thin / 8000 * 1 / distanceM * (3 / (16 * Math.PI)) * (3 * Math.PI / 4);
        double found = air.radiance(
                        TestEmissions.of((a, l, u) -> 1, java.util.List.of()), Sightline.ofDegrees(distanceM, 0, 0, 0))[
                0];

        assertThat(found / expected).isCloseTo(1, within(1e-3));
        assertThat(Atmosphere.EARTH_RADIUS_M).isEqualTo(6_371_000);
    }
}
