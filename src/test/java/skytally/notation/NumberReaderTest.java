package skytally.notation;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

@DisplayName("The reader of numbers")
class NumberReaderTest {

    @ParameterizedTest(name = "{0} is {1}")
    @CsvSource(delimiter = '|', quoteCharacter = '"', textBlock = """
            0            | 0
            007          | 7
            5200         | 5200
            +5           | 5
            -5           | -5
            "−5"         | -5
            6.5          | 6.5
            6.           | 6
            .5           | 0.5
            6,5          | 6.5
            ,5           | 0.5
            -6,5         | -6.5
            "−6,5"       | -6.5
            0,500        | 0.500
            0,125        | 0.125
            1,50         | 1.50
            1,5000       | 1.5000
            1234,567     | 1234.567
            5 200        | 5200
            "5\u00a0200" | 5200
            "5\u2009200" | 5200
            "5\u202f200" | 5200
            5 200,5      | 5200.5
            5 200.5      | 5200.5
            5 200,500    | 5200.500
            1 234 567    | 1234567
            -1 200       | -1200
            1,234,567    | 1234567
            1,234.5      | 1234.5
            -1,234.5     | -1234.5
            1.234,5      | 1234.5
            1.234.567    | 1234567
            1.234.567,8  | 1234567.8
            1.500        | 1.500
            2e3          | 2000
            2E3          | 2000
            2e+3         | 2000
            2.5e-3       | 0.0025
            1e308        | 1e308
            1e9999       | 1e9999
            "  800\t"    | 800
            "\u00a0800"  | 800
            "800\u00a0"  | 800
            """)
    void readsWhatHasOneReading(String typed, String expected) {
        for (boolean wholeOnly : new boolean[] {false, true}) {
            assertThat(NumberReader.read(typed, wholeOnly))
                    .isInstanceOfSatisfying(
                            NumberReader.Number.class,
                            number -> assertThat(number.value()).isEqualByComparingTo(new BigDecimal(expected)));
        }
    }

    @ParameterizedTest(name = "{0} is {1} or {2}")
    @CsvSource(delimiter = '|', textBlock = """
            1,500   | 1500   | 1.500
            12,345  | 12345  | 12.345
            999,999 | 999999 | 999.999
            -1,500  | -1500  | -1.500
            +1,500  | +1500  | +1.500
            "−1,500" | -1500  | -1.500
            """, quoteCharacter = '"')
    void asksWhichOfTwoReadingsIsMeantUnlessOnlyAWholeNumberMakesSense(String typed, String whole, String fraction) {
        assertThat(NumberReader.read(typed, false))
                .isEqualTo(new NumberReader.Unreadable("can be read in two ways: write " + whole + " or " + fraction));
        assertThat(NumberReader.read(typed, true)).isEqualTo(new NumberReader.Number(new BigDecimal(whole)));
    }

    @ParameterizedTest(name = "[{0}]")
    @ValueSource(
            strings = {
                "",
                " ",
                "\u00a0",
                "-",
                "+",
                "−",
                ".",
                ",",
                "e",
                "e5",
                "1e",
                "1e+",
                "1e1.5",
                "1e99999",
                "NaN",
                "nan",
                "Infinity",
                "-Infinity",
                "∞",
                "0x10",
                "0x1p3",
                "5d",
                "5f",
                "1_000",
                "٣",
                "５",
                "²",
                "½",
                "1/2",
                "--5",
                "+-5",
                "- 5",
                "5-",
                "1..5",
                "1,,5",
                "1.2.3",
                "1,2,3",
                "1,23,456",
                "12,34.5",
                "1.23,4.5",
                "1 23",
                "1  234",
                "1234 567",
                "1\t234",
                "5'200",
                "5\n200",
                "6,5e3",
                "6 m",
                "24x",
                "ten",
                "<b>6</b>",
                "'; --",
                "5%",
                "\u0000"
            })
    void refusesWhatHasNone(String typed) {
        for (boolean wholeOnly : new boolean[] {false, true}) {
            assertThat(NumberReader.read(typed, wholeOnly)).isEqualTo(new NumberReader.Unreadable("is not a number"));
        }
    }

    @Test
    void looksAtFortyCharactersAndAtNoMore() {
        assertThat(NumberReader.read("1".repeat(40), false))
                .isEqualTo(new NumberReader.Number(new BigDecimal("1".repeat(40))));
        for (int length : new int[] {41, 10_000, 1_000_000}) {
            assertThat(NumberReader.read("1".repeat(length), false))
                    .isEqualTo(new NumberReader.Unreadable("is longer than 40 characters"));
        }
    }

    @Test
    void keepsEveryDigit() {
        assertThat(NumberReader.read("0.10000000000000000000000000000000000001", false))
                .isEqualTo(new NumberReader.Number(new BigDecimal("0.10000000000000000000000000000000000001")));
    }
}
