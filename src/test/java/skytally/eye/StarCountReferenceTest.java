package skytally.eye;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.Checks;
import skytally.photometry.Magnitude;

@DisplayName("Star counts against counts of catalogues")
class StarCountReferenceTest {

    /** The first number of a row is the count of the Hipparcos extract; the fit is stated to come within 15 % (0.06 in the logarithm). */
    @ParameterizedTest(name = "{0}")
    @MethodSource("wholeSky")
    void wholeSky(Checks.Row row) {
        double m = Double.parseDouble(row.inputs().replace("m=", ""));
        double counted = row.expectedValue();
        double tolerance = m <= 1 ? 1e-9 : StarCount.WORST_ERROR * counted;
        assertThat(StarCount.wholeSky(new Magnitude(m))).isCloseTo(counted, within(tolerance));
    }

    static Stream<Checks.Row> wholeSky() {
        return Checks.of("eye-checks.csv", "STARS-");
    }

    /** Values of the fit, and OEIS A053406 (Hipparcos): 15 328 to 7, 40 858 to 8. */
    @ParameterizedTest(name = "to {0}")
    @CsvSource(textBlock = """
            5.5, 2900
            6.0, 5030
            6.5, 8654
            7.0, 14764
            7.5, 24981
            8.0, 41919
            """)
    void fit(double m, double expected) {
        assertThat(StarCount.wholeSky(new Magnitude(m))).isCloseTo(expected, withinPercentage(0.05));
    }

    /** Mean over sidereal time with extinction 0.2, at latitudes 0, 40 and -35. */
    @ParameterizedTest(name = "overhead to {0}")
    @CsvSource(textBlock = """
            4.0, 177, 159, 192
            5.0, 549, 507, 580
            5.5, 968, 923, 1015
            6.0, 1710, 1640, 1795
            6.5, 2991, 2894, 3124
            """)
    void aboveTheHorizon(double zenithLimit, double equator, double north40, double south35) {
        double rule = StarCount.aboveHorizonByRuleOfThumb(new Magnitude(zenithLimit));
        assertThat(rule).isCloseTo(equator, withinPercentage(20));
        assertThat(rule).isCloseTo(north40, withinPercentage(20));
        assertThat(rule).isCloseTo(south35, withinPercentage(20));
    }

    @Test
    void neverFallsWithTheLimit() {
        double before = 0;
        for (int i = 0; i <= 900; i++) {
            double now = StarCount.wholeSky(new Magnitude(-1 + i / 100.0));
            assertThat(now).isGreaterThanOrEqualTo(before);
            before = now;
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1.01, 8.01})
    void refusesWhatIsNotCounted(double m) {
        assertThatThrownBy(() -> StarCount.wholeSky(new Magnitude(m))).hasMessageContaining("−1 to 8");
        assertThat(StarCount.covers(new Magnitude(m))).isFalse();
        assertThat(StarCount.covers(new Magnitude(6))).isTrue();
    }
}
