package skytally.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
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

    @Test
    void anUnknownIdIsEmpty() {
        assertThat(SpectralClasses.byId("led9000")).isEmpty();
    }
}
