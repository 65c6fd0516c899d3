package skytally.notation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.util.Locale;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** In the tables a plain space stands for the no-break space between thousands. */
@DisplayName("Written numbers")
class QuantityFormatTest {

    @ParameterizedTest(name = "{0} to {1} figures is {2}")
    @CsvSource(textBlock = """
            5200,        4, 5 200
            5200,        2, 5 200
            133670,      3, 134 000
            999.96,      4, 1 000
            999.96,      5, 999.96
            0.2,         2, 0.20
            29.8416,     3, 29.8
            0.00033,     2, 0.00033
            0.0001,      2, 0.00010
            0.000099999, 2, 0.00010
            0.000014,    2, 1.4 × 10⁻⁵
            0.0000099996, 3, 1.00 × 10⁻⁵
            9999999,     7, 9 999 999
            9999999,     3, 1.00 × 10⁷
            12345678,    3, 1.23 × 10⁷
            1e308,       2, 1.0 × 10³⁰⁸
            4.9e-324,    2, 4.9 × 10⁻³²⁴
            -5.25,       2, −5.3
            -1234.5,     5, −1 234.5
            -0.00002,    1, −2 × 10⁻⁵
            0,           3, 0
            -0.0,        3, 0
            """)
    void toSignificantFigures(double value, int figures, String expected) {
        assertThat(QuantityFormat.significant(value, figures).plain().replace('\u00a0', ' '))
                .isEqualTo(expected);
    }

    @ParameterizedTest(name = "{0} to {1} decimals is {2}")
    @CsvSource(textBlock = """
            -1.68792, 2, −1.69
            21.995,   2, 22.00
            0.0004,   3, 0.000
            -0.0004,  3, 0.000
            -0.0,     1, 0.0
            12345.6,  0, 12 346
            6.5,      0, 7
            """)
    void toDecimals(double value, int decimals, String expected) {
        assertThat(QuantityFormat.decimals(value, decimals).plain().replace('\u00a0', ' '))
                .isEqualTo(expected);
    }

    @ParameterizedTest(name = "{0} is {1}")
    @CsvSource(textBlock = """
            5200,   5 200
            20.50,  20.5
            2E+3,   2 000
            -0.250, −0.25
            0.000,  0
            """)
    void asTyped(BigDecimal typed, String expected) {
        assertThat(QuantityFormat.asTyped(typed).plain().replace('\u00a0', ' ')).isEqualTo(expected);
    }

    /** A tenth is not a double; the last bits must not round 0.15 down and 0.35 up. */
    @Test
    void lastBitsOfADoubleDecideNothing() {
        assertThat(QuantityFormat.significant(0.15, 1).plain()).isEqualTo("0.2");
        assertThat(QuantityFormat.significant(0.35, 1).plain()).isEqualTo("0.4");
        assertThat(QuantityFormat.significant(Math.nextDown(2.5), 1).plain()).isEqualTo("3");
        assertThat(QuantityFormat.decimals(0.1 + 0.2, 9).plain()).isEqualTo("0.300000000");
    }

    @Test
    void thousandsArePartedByASpaceThatDoesNotBreak() {
        assertThat(QuantityFormat.significant(5200, 4).digits()).isEqualTo("5\u00a0200");
    }

    @Test
    void aPowerStandsApartFromTheDigits() {
        Written written = QuantityFormat.significant(1.4e-5, 2);
        assertThat(written.hasPower()).isTrue();
        assertThat(written.digits()).isEqualTo("1.4");
        assertThat(written.power()).isEqualTo(-5);
        assertThat(written.powerDigits()).isEqualTo("−5");
        assertThat(QuantityFormat.significant(12, 2).hasPower()).isFalse();
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refusesWhatIsNoNumber(double value) {
        assertThatThrownBy(() -> QuantityFormat.significant(value, 3)).hasMessageContaining("finite");
        assertThatThrownBy(() -> QuantityFormat.decimals(value, 3)).hasMessageContaining("finite");
    }

    @Test
    void refusesFiguresADoubleDoesNotHold() {
        assertThatThrownBy(() -> QuantityFormat.significant(1, 0)).hasMessageContaining("1 to 12");
        assertThatThrownBy(() -> QuantityFormat.significant(1, 13)).hasMessageContaining("1 to 12");
        assertThatThrownBy(() -> QuantityFormat.decimals(1, 10)).hasMessageContaining("0 to 9");
    }

    @Test
    void isTheSameInEveryCountry() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(QuantityFormat.significant(1234.5, 5).plain()).isEqualTo("1\u00a0234.5");
            Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
            assertThat(QuantityFormat.significant(1.5e-6, 2).plain()).isEqualTo("1.5\u00a0×\u00a010⁻⁶");
            assertThat(QuantityFormat.decimals(-1.688, 2).plain()).isEqualTo("−1.69");
        } finally {
            Locale.setDefault(before);
        }
    }
}
