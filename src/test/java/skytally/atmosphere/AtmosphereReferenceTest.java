package skytally.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("The air against published and independent values")
class AtmosphereReferenceTest {

    private static final Atmosphere CLEAR = Atmosphere.atSeaLevel(Clearness.CLEAR);

    /** Bodhaine et al. 1999, reproduced by the full method to 1e-5; rows A-R*, computed independently for this project. */
    @ParameterizedTest(name = "{0} nm: {1}")
    @CsvSource({
        "400, 0.360213",
        "450, 0.221106",
        "500, 0.143353",
        "550, 0.09707",
        "600, 0.06809",
        "650, 0.0491835",
        "700, 0.0364209"
    })
    void molecularDepthAgreesWithBodhaine(double wavelengthNm, double expected) {
        assertThat(Molecules.opticalDepthAtSeaLevel(wavelengthNm)).isCloseTo(expected, Percentage.withPercentage(0.05));
    }

    /** A second published formula, Hansen and Travis 1974, differs by 0.5 % at most. */
    @ParameterizedTest(name = "{0} nm")
    @CsvSource({"400", "450", "500", "550", "600", "650", "700"})
    void molecularDepthIsNearHansenAndTravis(double wavelengthNm) {
        double l2 = Math.pow(wavelengthNm / 1000, -2);
        double hansenTravis = 0.008569 * l2 * l2 * (1 + 0.0113 * l2 + 0.00013 * l2 * l2);
        assertThat(Molecules.opticalDepthAtSeaLevel(wavelengthNm))
                .isCloseTo(hansenTravis, Percentage.withPercentage(0.5));
    }

    /** Kasten and Young 1989, coefficients seen in public code; rows A-KY*, computed independently for this project. */
    @ParameterizedTest(name = "{0}°: {1}")
    @CsvSource({
        "90, 0.999712",
        "60, 1.15399",
        "45, 1.4126",
        "30, 1.99429",
        "20, 2.90315",
        "15, 3.81291",
        "10, 5.58604",
        "5, 10.3058",
        "2, 19.4332",
        "0, 37.9196"
    })
    void airMassAgreesWithKastenAndYoung(double altitudeDeg, double expected) {
        assertThat(AirMass.atAltitude(altitudeDeg)).isCloseTo(expected, Percentage.withPercentage(0.001));
    }

    @Test
    void refusesAnAltitudeBelowTheHorizon() {
        assertThatThrownBy(() -> AirMass.atAltitude(-0.1)).hasMessageContaining("0 to 90");
        assertThatThrownBy(() -> AirMass.atAltitude(Double.NaN)).hasMessageContaining("0 to 90");
    }

    /** Rows A-kV, A-beta0 and A-Vmet, computed independently for this project. */
    @Test
    void clearAirHasTheExtinctionOfTheReference() {
        assertThat(CLEAR.extinctionMagPerAirMass()).isCloseTo(0.243276, Percentage.withPercentage(0.01));
        assertThat(CLEAR.extinctionPerMetre(550) * 1000).isCloseTo(0.0787998, Percentage.withPercentage(0.01));
        double visualRangeKm = -Math.log(0.02) / (CLEAR.extinctionPerMetre(550) * 1000);
        assertThat(visualRangeKm).isCloseTo(49.6451, Percentage.withPercentage(0.01));
    }

    /** Air over high ground has lost the molecules below it: exp(−z/8000). */
    @Test
    void highGroundHasFewerMoleculesAndTheSameHaze() {
        Atmosphere high = new Atmosphere(Aerosol.ofDepth(0.10), 2400);
        assertThat(high.molecularOpticalDepth(550) / CLEAR.molecularOpticalDepth(550))
                .isCloseTo(Math.exp(-0.3), within(1e-12));
        assertThat(high.aerosol().opticalDepth(550)).isEqualTo(0.10);
    }

    /** Phase functions are normalised: over the sphere each adds up to 1. */
    @Test
    void phaseFunctionsAddUpToOne() {
        double molecules = 0;
        double haze = 0;
        int steps = 200_000;
        for (int i = 0; i < steps; i++) {
            double cosine = -1 + (2 * i + 1.0) / steps;
            molecules += Molecules.phase(cosine) * 2 * Math.PI * 2 / steps;
            haze += CLEAR.aerosol().phase(cosine) * 2 * Math.PI * 2 / steps;
        }
        assertThat(molecules).isCloseTo(1, within(1e-9));
        assertThat(haze).isCloseTo(1, within(1e-8));
    }
}
