package skytally.luminaire;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

@DisplayName("What schedules call a fitting")
class ShapeWordsTest {

    /** Every row can be reached by its own words, so none stands behind another that takes all of its. */
    @ParameterizedTest
    @MethodSource("skytally.luminaire.ShapeWords#rows")
    void eachRowAnswersToItsWords(ShapeWords.Row row) {
        assertThat(ShapeWords.find(String.join(" ", row.words()))).contains(row);
        assertThat(row.why()).isNotBlank().doesNotContain("\"");
    }

    /** By what the words say to somebody of the trade; common practice, no source. */
    @ParameterizedTest(name = "{0}: {1}")
    @CsvSource({
        "'Round-beam floodlight, no visor', beam-60",
        "'narrow-beam flood', beam-30",
        "'Flat-glass area light', flat-area",
        "'clear globe on post', all-round",
        "'globe with cap', all-round-capped",
        "'louvred bollard', all-round-capped",
        "'SELF-LIT panel', self-lit-panel",
        "'Spotlights (narrow), in the ground', beam-10",
        "'flat-glass floodlight', beam-60",
        "'road lantern, flat glass', flat-road",
        "'wall pack', all-round-capped",
    })
    void areReadAsTheTradeMeansThem(String name, String shape) {
        assertThat(ShapeWords.find(name).orElseThrow().shape().id()).isEqualTo(shape);
    }

    @Test
    void thatNameNoShapeAreNotGuessed() {
        assertThat(ShapeWords.find("")).isEmpty();
        assertThat(ShapeWords.find("as agreed with the client")).isEmpty();
        assertThat(ShapeWords.find("<b>&")).isEmpty();
    }
}
