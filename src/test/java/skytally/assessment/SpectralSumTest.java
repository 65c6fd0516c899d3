package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;
import skytally.naturalsky.NaturalBackground;
import skytally.skyglow.Sightline;
import skytally.skyglow.SingleScattering;
import skytally.spectrum.Passband;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.SpectralClasses;
import skytally.spectrum.Spectrum;

/** Six wavelengths and a cubic between them, against the air worked out at every half nanometre and every line. */
@DisplayName("From six wavelengths to a band")
class SpectralSumTest {

    private static final List<Sightline> LINES = List.of(
            Sightline.ofDegrees(300, 1.6, 0, 0),
            Sightline.ofDegrees(3000, 1.6, 60, 0),
            Sightline.ofDegrees(10_000, 1.6, 0, 0),
            Sightline.ofDegrees(50_000, 1.6, 45, 0),
            Sightline.ofDegrees(50_000, 1.6, 80, 180));

    @ParameterizedTest
    @MethodSource("skytally.spectrum.SpectralClasses#all")
    void losesLittleToTheCubic(SpectralClass each) {
        Spectrum spectrum = each.spectrum();
        SpectralSum sum = SpectralSum.of(spectrum);
        double[] nodes = spectrum.nodeWavelengthsNm();
        for (Clearness clearness : Clearness.values()) {
            Atmosphere air = Atmosphere.atSeaLevel(clearness);
            SingleScattering six = new SingleScattering(air, SpectralSum.WAVELENGTHS_NM);
            SingleScattering every = new SingleScattering(air, nodes);
            for (Sightline line : LINES) {
                double bound = line.groundDistanceM() > 10_000 ? 2.5e-3 : 4e-4;
                double[] kernel = six.radiance(new GroundEmission(0), line);
                double[] exact = every.radiance(new GroundEmission(0), line);
                double luminance = mean(exact, spectrum.nodeWeights(Passband.PHOTOPIC));
                double johnsonV =
                        mean(exact, spectrum.nodeWeights(Passband.JOHNSON_V)) * spectrum.johnsonVFluxDensityPerLux();
                assertThat(sum.luminance(kernel) / luminance)
                        .as("photopic, %s air, %s", clearness.words(), line)
                        .isCloseTo(1, within(bound));
                assertThat(sum.johnsonV(kernel) / johnsonV)
                        .as("Johnson V, %s air, %s", clearness.words(), line)
                        .isCloseTo(1, within(bound));
            }
        }
    }

    private static double mean(double[] kernel, double[] weights) {
        double sum = 0;
        double all = 0;
        for (int i = 0; i < kernel.length; i++) {
            sum += kernel[i] * weights[i];
            all += weights[i];
        }
        return sum / all;
    }

    @Test
    void ofGreyAirIsTheAirsOwn() {
        double[] grey = new double[SpectralSum.WAVELENGTHS_NM.length];
        Arrays.fill(grey, 3e-9);
        for (SpectralClass each : SpectralClasses.all()) {
            SpectralSum sum = SpectralSum.of(each.spectrum());
            assertThat(sum.luminance(grey)).isCloseTo(3e-9, within(1e-20));
            assertThat(sum.johnsonV(grey) / each.spectrum().johnsonVFluxDensityPerLux())
                    .isCloseTo(3e-9, within(1e-12));
        }
    }

    @Test
    void ofNoLightIsNothing() {
        assertThat(SpectralSum.of(SpectralClasses.lamps().get(0).spectrum())
                        .luminance(new double[SpectralSum.WAVELENGTHS_NM.length]))
                .isZero();
    }

    /**
     * Artificial light of 10.0 % of the traditional 171 µcd/m² (171.3 unrounded), scattered alike at all wavelengths, beside the natural sky of 22.0: by its
     * own luminance, and in the V band. To the printed digits (independent solutions computed for this project).
     */
    @ParameterizedTest(name = "{0}: {1} % photopic, {2} % in V")
    @CsvSource({"hps, 9.2, 7.4", "led3000, 9.2, 8.7", "led4000, 9.2, 9.0", "pcamber, 9.2, 7.2"})
    void tenPercentOfTheTraditionalSkyIsLessOfTheRealOne(String id, double photopic, double inV) {
        double[] kernel = new double[SpectralSum.WAVELENGTHS_NM.length];
        Arrays.fill(kernel, 0.1 * PlaceNumbers.naturalOnVisualScale().candelaPerSquareMetre());
        SpectralSum lamp = SpectralSum.of(SpectralClasses.byId(id).orElseThrow().spectrum());
        NaturalBackground natural = NaturalBackground.reference(0.2);
        double luminance = natural.photopicLuminanceAt(0).candelaPerSquareMetre();
        assertThat(100 * lamp.luminance(kernel) / luminance).isCloseTo(photopic, within(0.0501));
        assertThat(100 * lamp.johnsonV(kernel) / natural.johnsonVRadianceAt(0)).isCloseTo(inV, within(0.0501));
    }
}
