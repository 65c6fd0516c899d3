package skytally.citation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Walks every source. */
@DisplayName("Bibliography")
class BibliographyTest {

    @ParameterizedTest
    @MethodSource("skytally.citation.Bibliography#all")
    void aSourceCanBeCitedAndSaysHowWellItStands(Citation citation) {
        assertThat(citation.key()).matches("[a-z0-9-]+");
        assertThat(citation.reference()).hasSizeGreaterThan(10);
        assertThat(citation.standing().words()).isNotBlank();
        assertThat(Bibliography.cite(citation.key())).isEqualTo(citation);
    }

    @Test
    void refusesANumberWithoutASource() {
        assertThatThrownBy(() -> Bibliography.cite("hearsay")).hasMessageContaining("hearsay");
    }
}
