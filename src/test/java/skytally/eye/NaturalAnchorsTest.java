package skytally.eye;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.Checks;
import skytally.eye.NaturalAnchor.Kind;
import skytally.naturalsky.NaturalBackground;
import skytally.photometry.Magnitude;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;

/** Walks every rung of the ladder. */
@DisplayName("Natural anchors")
class NaturalAnchorsTest {

    /** E0 · 10^(−0.4 (m + 0.20 X)) with magnitudes from memory; X 1 overhead, 1.99 at 30 degrees. */
    @ParameterizedTest(name = "{0}: {1} lx")
    @CsvSource(textBlock = """
            faintest-star, 8.0e-9
            sirius,        8.1e-6
            venus,         1.22e-4
            quarter-moon,  0.0198
            full-moon,     0.219
            starlit-ground, 0.67e-3
            civil-twilight, 3.4
            """)
    void isAsBrightAsTheLadderSays(String id, double lux) {
        assertThat(anchor(id).illuminance(ZeroPoint.TRADITIONAL).lux()).isCloseTo(lux, withinPercentage(0.5));
    }

    @ParameterizedTest
    @MethodSource("skytally.eye.NaturalAnchors#all")
    void hasANameASourceAndSomeLight(NaturalAnchor anchor) {
        assertThat(anchor.id()).matches("[a-z-]+");
        assertThat(anchor.name()).isNotBlank();
        assertThat(anchor.citation().reference()).isNotBlank();
        for (ZeroPoint zeroPoint : ZeroPoint.presets()) {
            assertThat(anchor.illuminance(zeroPoint).lux()).isPositive();
        }
    }

    @ParameterizedTest
    @MethodSource("skytally.photometry.ZeroPoint#presets")
    void standsFaintestFirst(ZeroPoint zeroPoint) {
        List<Double> rungs = NaturalAnchors.all().stream()
                .map(anchor -> anchor.illuminance(zeroPoint).lux())
                .toList();
        assertThat(rungs).hasSize(8).isSorted();
    }

    @Test
    void onlyWholeSkiesLieOnTheGround() {
        assertThat(NaturalAnchors.all())
                .filteredOn(anchor -> anchor.kind() == Kind.GROUND)
                .extracting(NaturalAnchor::id)
                .containsExactly("starlit-ground", "civil-twilight");
    }

    @Test
    void theFaintestStarIsTheThresholdOnANaturalSky() {
        double threshold = LimitingMagnitude.threshold(
                        ZeroPoint.TRADITIONAL.luminance(new SurfaceBrightness(22.0)),
                        LimitingMagnitude.CRUMEY_FIELD_FACTOR_TYPICAL)
                .lux();
        assertThat(anchor("faintest-star").illuminance(ZeroPoint.TRADITIONAL).lux())
                .isCloseTo(threshold, withinPercentage(0.1));
    }

    @Test
    void theStarlitGroundIsTheNaturalSkyIntegrated() {
        assertThat(anchor("starlit-ground").illuminance(ZeroPoint.TRADITIONAL).lux())
                .isCloseTo(
                        NaturalBackground.reference(0.15)
                                .horizontalIlluminance(ZeroPoint.TRADITIONAL)
                                .lux(),
                        withinPercentage(0.5));
    }

    /** Moonlight above the air by Krisciunas and Schaefer, in footcandles of their own; 0.3 % from E0 = 2.54e-6. */
    @Test
    void theQuarterMoonFollowsThePhaseLaw() {
        NaturalAnchor.ThroughAir moon =
                (NaturalAnchor.ThroughAir) anchor("quarter-moon").light();
        assertThat(moon.magnitude()).isEqualTo(new Magnitude(-10.128));
        assertThat(ZeroPoint.TRADITIONAL.illuminance(moon.magnitude()).lux())
                .isCloseTo(Checks.row("eye-checks.csv", "KSI-90").expectedValue(), withinPercentage(0.3));
    }

    private static NaturalAnchor anchor(String id) {
        return NaturalAnchors.byId(id).orElseThrow(() -> new AssertionError("No anchor " + id));
    }
}
