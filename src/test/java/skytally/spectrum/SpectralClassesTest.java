package skytally.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Objects;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Walks the whole catalogue. */
@DisplayName("Catalogue of spectral classes")
class SpectralClassesTest {

    @Test
    void everyFileOfTheFolderStandsInTheIndex() throws IOException, URISyntaxException {
        Path folder = Path.of(Objects.requireNonNull(getClass().getResource("/spectra/classes"))
                .toURI());
        try (Stream<Path> files = Files.list(folder)) {
            assertThat(files.map(file -> file.getFileName().toString())
                            .filter(name -> name.endsWith(".csv"))
                            .map(name -> name.replace(".csv", "")))
                    .containsExactlyInAnyOrderElementsOf(SpectralClasses.all().stream()
                            .map(SpectralClass::id)
                            .toList());
        }
    }

    @ParameterizedTest
    @MethodSource("skytally.spectrum.SpectralClasses#all")
    void aClassHoldsOneWatt(SpectralClass each) {
        assertThat(each.spectrum().shareBetween(380, 780)).isCloseTo(1, within(1e-12));
        assertThat(each.spectrum().luminousEfficacyLmPerW()).isBetween(10.0, 683.0);
        assertThat(each.label()).isNotBlank();
    }

    @ParameterizedTest
    @MethodSource("skytally.spectrum.SpectralClasses#all")
    void nodesAreSortedAndTheirWeightsAddToTheIntegral(SpectralClass each) {
        double[] weights = each.spectrum().nodeWeights(Passband.JOHNSON_V);
        assertThat(each.spectrum().nodeWavelengthsNm()).isSorted().hasSameSizeAs(weights);
        double sum = 0;
        for (double weight : weights) {
            sum += weight;
        }
        assertThat(sum).isCloseTo(each.spectrum().weighted(Passband.JOHNSON_V), within(1e-15));
        assertThat(each.spectrum().weighted(Passband.JOHNSON_V, wavelengthNm -> 0.5))
                .isCloseTo(sum / 2, within(1e-15));
    }

    @Test
    void referencesAreNotOfferedAsLamps() {
        assertThat(SpectralClasses.lamps()).hasSize(25).noneMatch(SpectralClass::isReference);
        assertThat(SpectralClasses.all()).filteredOn(SpectralClass::isReference).hasSize(3);
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(delimiter = '|', textBlock = """
            LASER,532,,,,1           | a component is LINE, GAUSS or PLANCK, not "LASER"
            LINE,532,,,1             | six cells are needed, not 5
            LINE,green,,,,1          | "green" is not a number
            LINE,1064,,,,1           | Wavelength must be 380 to 780 nm, not 1064.0
            LINE,532,,,,1.2          | Power must be a share, more than 0 and at most 1, not 1.2
            LINE,532,,,,NaN          | Power must be a share, more than 0 and at most 1, not NaN
            GAUSS,532,0,30,,1        | Widths must be more than 0 and less than 1000 nm, not 0.0 and 30.0
            PLANCK,,,,20,1           | Temperature must be 500 to 100 000 K, not 20.0
            """)
    void aBrokenLineSaysWhereAndWhat(String line, String fault) {
        assertThatThrownBy(() -> SpectralClasses.component(new Table.Row("classes/new.csv", 5, line)))
                .hasMessage("classes/new.csv, line 5: " + fault);
    }

    @Test
    void anUnknownIdIsEmpty() {
        assertThat(SpectralClasses.byId("led9000")).isEmpty();
    }
}
