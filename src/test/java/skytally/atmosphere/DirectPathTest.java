package skytally.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("The line between a lamp and an eye")
class DirectPathTest {

    private static final Atmosphere CLEAR = Atmosphere.atSeaLevel(Clearness.CLEAR);

    @Test
    void isPythagorasNearBy() {
        DirectPath path = DirectPath.between(6, 1.6, 10);
        assertThat(path.lengthM()).isCloseTo(Math.hypot(10, 4.4), within(1e-4));
        assertThat(path.altitudeAtEyeRad()).isCloseTo(Math.atan2(4.4, 10), within(1e-5));
        assertThat(path.altitudeAtLampRad()).isCloseTo(-Math.atan2(4.4, 10), within(1e-5));
    }

    @Test
    void isTheHeightDifferenceStraightBelow() {
        DirectPath path = DirectPath.between(6, 1.6, 0);
        assertThat(path.lengthM()).isCloseTo(4.4, within(1e-12));
        assertThat(Math.toDegrees(path.altitudeAtEyeRad())).isCloseTo(90, within(1e-6));
    }

    /** 3.86 (√h₁ + √h₂) km with mean refraction, heights in metres: a rule of navigation, from memory. */
    @ParameterizedTest(name = "from {0} m and {1} m")
    @CsvSource({"6, 1.6", "15, 4.5", "100, 2", "1, 1"})
    void endsAtTheHorizonOfNavigation(double lampHeightM, double eyeHeightM) {
        double rule = 3860 * (Math.sqrt(lampHeightM) + Math.sqrt(eyeHeightM));
        assertThat(DirectPath.between(lampHeightM, eyeHeightM, rule * 0.995).clearsTheHorizon())
                .isTrue();
        assertThat(DirectPath.between(lampHeightM, eyeHeightM, rule * 1.005).clearsTheHorizon())
                .isFalse();
    }

    /** The flat-Earth path of one exponential layer: τ = b₀ (H / sin e)(1 − exp(−d sin e / H)). */
    @Test
    void passesWhatTheFlatLayerFormulaPasses() {
        DirectPath path = DirectPath.between(0, 3000, 5000);
        double sine = Math.sin(-path.altitudeAtEyeRad());
        double d = path.lengthM();
        double molecules = CLEAR.molecularOpticalDepth(550) / sine * (1 - Math.exp(-d * sine / 8000));
        double haze = CLEAR.aerosol().opticalDepth(550) / sine * (1 - Math.exp(-d * sine / 1500));
        assertThat(CLEAR.transmission(path, 550)).isCloseTo(Math.exp(-molecules - haze), within(1e-4));
    }

    /** Level and short: exp(−β d) with the ground's β. */
    @Test
    void passesExpOfTheGroundExtinctionWhenLevel() {
        DirectPath path = DirectPath.between(0, 0, 1000);
        assertThat(CLEAR.transmission(path, 550))
                .isCloseTo(Math.exp(-1000 * CLEAR.extinctionPerMetre(550)), within(2e-6));
    }

    @Test
    void isTheSameBothWays() {
        DirectPath there = DirectPath.between(30, 1.6, 12_000);
        DirectPath back = DirectPath.between(1.6, 30, 12_000);
        assertThat(there.lengthM()).isCloseTo(back.lengthM(), within(1e-9));
        assertThat(CLEAR.transmission(there, 600)).isCloseTo(CLEAR.transmission(back, 600), within(1e-7));
    }

    @Test
    void refusesTwoThingsAtOnePlace() {
        assertThatThrownBy(() -> DirectPath.between(2, 2, 0)).hasMessageContaining("apart");
    }
}
