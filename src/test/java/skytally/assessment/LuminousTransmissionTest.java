package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;
import skytally.spectrum.Passband;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.Spectrum;

/** Against the mean taken at every half nanometre and every line, over every class, air and length of path. */
@DisplayName("What the air lets through of a spectrum")
class LuminousTransmissionTest {

    private static final double LONGEST_LEVEL_M = 50_000;

    @ParameterizedTest
    @MethodSource("skytally.spectrum.SpectralClasses#all")
    void isTheSpectralMeanOnLevelPaths(SpectralClass each) {
        for (Clearness clearness : Clearness.values()) {
            Atmosphere air = Atmosphere.atSeaLevel(clearness);
            LuminousTransmission quick = new LuminousTransmission(each.spectrum(), air);
            for (double length = 1; length <= LONGEST_LEVEL_M; length *= 1.5) {
                double molecules = length / 8000;
                double haze = length / air.aerosol().scaleHeightM();
                double exact = exact(each.spectrum(), air, molecules, haze);
                assertThat(quick.through(molecules, haze))
                        .as("%s air, %.0f m", clearness.words(), length)
                        .isCloseTo(exact, within(2e-4))
                        .isCloseTo(exact, within((exact > 0.01 ? 5e-3 : 0.1) * exact));
            }
        }
    }

    private static double exact(Spectrum spectrum, Atmosphere air, double molecules, double haze) {
        return spectrum.weighted(
                        Passband.PHOTOPIC,
                        nm -> Math.exp(-air.molecularOpticalDepth(nm) * molecules
                                - air.aerosol().opticalDepth(nm) * haze))
                / spectrum.weighted(Passband.PHOTOPIC);
    }

    @ParameterizedTest
    @MethodSource("skytally.spectrum.SpectralClasses#all")
    void takesMoreOnLongerPathsAndNothingOnNone(SpectralClass each) {
        LuminousTransmission quick = new LuminousTransmission(each.spectrum(), Atmosphere.atSeaLevel(Clearness.HAZY));
        assertThat(quick.through(0, 0)).isEqualTo(1);
        double before = 1;
        for (double length = 100; length <= LONGEST_LEVEL_M; length *= 1.2) {
            double here = quick.through(length / 8000, length / 1500);
            assertThat(here).isPositive().isLessThan(before);
            before = here;
        }
    }
}
