package skytally.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.Checks;

/** Every class against values derived independently from the same components. */
@DisplayName("Spectral classes against independent values")
class SpectralClassesReferenceTest {

    private static final String DERIVED = "spectral-classes-derived.csv";
    private static final String CHECKS = "spectrum-checks.csv";

    @ParameterizedTest(name = "{0}")
    @MethodSource("derivedRows")
    void derivesWhatTheTableHolds(String id, List<String> cells) {
        Spectrum spectrum = spectrum(id);
        double[] actual = {
            spectrum.luminousEfficacyLmPerW(),
            spectrum.scotopicEfficacyLmPerW(),
            spectrum.scotopicPhotopicRatio(),
            spectrum.shareBetween(380, 500),
            spectrum.shareBetween(405, 530) / spectrum.shareBetween(380, 730),
            spectrum.zeroMagnitudeIlluminanceLx() * 1e6,
            2.5 * Math.log10(spectrum.zeroMagnitudeIlluminanceLx() / 2.54e-6)
        };
        int[] columns = {2, 3, 4, 7, 8, 10, 11};
        // Half of the last digit, and 0.1 % for the observers, whose 1 nm tables were used there and are interpolated
        // here.
        double[] halfDigits = {0.05, 0.05, 0.0005, 0.00005, 0.00005, 0.0005, 0.0006};
        double[] relative = {0.0005, 0.001, 0.001, 0, 0, 0.0005, 0};
        for (int i = 0; i < columns.length; i++) {
            double expected = Double.parseDouble(cells.get(columns[i])) * (columns[i] == 10 ? 1e6 : 1);
            double tolerance = 1.001 * (halfDigits[i] + relative[i] * expected);
            assertThat(actual[i]).as("%s, column %d", id, columns[i] + 1).isCloseTo(expected, within(tolerance));
        }
    }

    static Stream<Object[]> derivedRows() {
        return Checks.lines(DERIVED).stream().skip(1).map(cells -> new Object[] {cells.get(0), cells});
    }

    @Test
    void theTableHoldsEveryClassOfTheIndex() {
        assertThat(SpectralClasses.all())
                .extracting(SpectralClass::id)
                .containsExactlyElementsOf(Checks.lines(DERIVED).stream()
                        .skip(1)
                        .map(cells -> cells.get(0))
                        .toList());
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("classRows")
    void agreesWithTheCheckRow(Checks.Row row) {
        Spectrum spectrum = spectrum(row.inputs().replaceFirst("class (\\w+).*", "$1"));
        row.isMatchedBy(
                switch (row.id().substring(row.id().lastIndexOf('-') + 1)) {
                    case "LER" -> spectrum.luminousEfficacyLmPerW();
                    case "SP" -> spectrum.scotopicPhotopicRatio();
                    case "E0" -> spectrum.zeroMagnitudeIlluminanceLx();
                    default -> throw new AssertionError("No such quantity: " + row.id());
                });
    }

    static Stream<Checks.Row> classRows() {
        return Checks.of(CHECKS, "C-").filter(row -> !row.id().startsWith("C-x"));
    }

    @Test
    void tenWattsOfWarmWhiteLed() {
        Checks.row(CHECKS, "C-x1").isMatchedBy(10 * spectrum("led3000").luminousEfficacyLmPerW());
    }

    @Test
    void johnsonVOfTenMicroluxOfWarmWhiteLed() {
        Checks.row(CHECKS, "C-x2")
                .isMatchedBy(-2.5 * Math.log10(1e-5 / spectrum("led3000").zeroMagnitudeIlluminanceLx()));
    }

    /** Published range for measured skies on the Vega scale: 187-227 µcd/m², Bara et al. 2020 (abstract). */
    @Test
    void luminanceOfTheNaturalSkyBySpectrum() {
        double squareArcsecondsPerSteradian = Math.pow(180 * 3600 / Math.PI, 2);
        double zeroLuminance =
                SpectralClasses.naturalSky().spectrum().zeroMagnitudeIlluminanceLx() * squareArcsecondsPerSteradian;
        Checks.row(CHECKS, "L-nat").isMatchedBy(zeroLuminance * Math.pow(10, -0.4 * 22.0));
    }

    private static Spectrum spectrum(String id) {
        return SpectralClasses.byId(id)
                .orElseThrow(() -> new AssertionError("No class " + id))
                .spectrum();
    }
}
