package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.util.LinkedMultiValueMap;
import org.springframework.util.MultiValueMap;
import org.springframework.web.util.UriComponentsBuilder;
import org.springframework.web.util.UriUtils;

@DisplayName("The address of a sentence")
class SentenceAddressTest {

    private static final String UTF_8 = "UTF-8";

    @Test
    void leavesOutWhatMayBeLeftEmptyAndWas() {
        assertThat(address(
                        "form", "sentence",
                        "count", "24",
                        "lumens", "5200",
                        "spectralClass", "led3000",
                        "shape", "flat-area",
                        "mountingHeightM", "6",
                        "distanceM", "800",
                        "tiltDeg", "",
                        "eyeHeightM", " ",
                        "glareAngleDeg", "",
                        "air", "",
                        "groundReflectance", ""))
                .isEqualTo(
                        "/?count=24&lumens=5200&spectralClass=led3000&shape=flat-area&mountingHeightM=6&distanceM=800");
    }

    @Test
    void keepsEmptyWhatIsAskedForSoThatItIsRefused() {
        String address = address("count", "", "lumens", "", "mountingHeightM", "", "distanceM", "");

        assertThat(address).isEqualTo("/?count=&lumens=&mountingHeightM=&distanceM=");
        assertThat(SentenceReader.read(parameters(address)).faults())
                .extracting(fault -> fault.blank())
                .containsExactly(Blank.COUNT, Blank.LUMENS, Blank.MOUNTING_HEIGHT, Blank.DISTANCE);
    }

    @Test
    void isTheSameForASentenceInAnyOrder() {
        assertThat(address("distanceM", "800", "theme", "dark", "count", "24"))
                .isEqualTo(address("count", "24", "distanceM", "800", "theme", "dark"))
                .isEqualTo("/?count=24&distanceM=800&theme=dark");
    }

    /** A foot is 0.3048 m exactly (international yard and pound agreement, 1959). */
    @ParameterizedTest(name = "{0} ft is {1} m")
    @CsvSource({
        "20, 6.096",
        "1, 0.3048",
        "0, 0",
        "2625, 800.1",
        "'2 625', 800.1",
        "'6,5', 1.9812",
        "5280, 1609.344",
        "1e3, 304.8",
        "0.1, 0.03048",
        "-20, -6.096"
    })
    void turnsFeetIntoMetresExactly(String feet, String metres) {
        assertThat(address("mountingHeightFt", feet, "units", "us"))
                .isEqualTo("/?mountingHeightM=" + metres + "&units=us");
    }

    @ParameterizedTest(name = "{0} ft")
    @ValueSource(
            strings = {"20", "5.25", "2625", "19.5", "0.1", "123456", "656167", "5280.125", "1234.5678", "3.281", "0"})
    void givesFeetBackAsTheyWereTyped(String feet) {
        String metres =
                Objects.requireNonNull(parameters(address("distanceFt", feet)).getFirst("distanceM"));

        assertThat(new BigDecimal(SentenceAddress.feet(metres))).isEqualByComparingTo(new BigDecimal(feet));
        assertThat(address("distanceFt", SentenceAddress.feet(metres))).isEqualTo("/?distanceM=" + metres);
    }

    @ParameterizedTest(name = "{0} m is shown as {1} ft")
    @CsvSource({"800, 2624.7", "6, 19.685", "1.6, 5.2493", "200000, 656170", "6.096, 20"})
    void showsMetresInFeetToFiveFiguresUnlessTheyComeOutExactly(String metres, String feet) {
        assertThat(SentenceAddress.feet(metres)).isEqualTo(feet);
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {
                "far", "1,500", "1e308", "-1e308", "1e99999", "NaN", "<script>alert(1)</script>", "a&count=2&b=\"'",
                "a\r\nSet-Cookie: x=1", "//evil.example/", "{count}", "{unknown}", "${7*7}", "100%", "%0d%0a", "a+b c",
                "ü😀", "#top", "..;/", "٣"
            })
    void carriesAlongWhatCannotBeReadAsItWasTyped(String typed) {
        for (String field : List.of("distanceM", "distanceFt", "spectralClass")) {
            String address = address("count", "24", field, typed);
            String blank = field.equals("distanceFt") ? "distanceM" : field;

            assertThat(address)
                    .matches("/\\?count=24&" + blank + "=[A-Za-z0-9%._~-]+")
                    .doesNotContain("evil.example/");
            assertThat(parameters(address).getFirst(blank)).isEqualTo(typed);
            assertThat(SentenceReader.read(parameters(address)).faults()).hasSize(1);
        }
    }

    @ParameterizedTest(name = "{0} is written {1}")
    @CsvSource({
        "lumens, '5\u00a0200', 5200",
        "lumens, '5,5', 5.5",
        "lumens, 2e3, 2000",
        "lumens, '1,234.50', 1234.5",
        "count, '1,200', 1200",
        "tiltDeg, ' 15 ', 15",
        "tiltDeg, 0, 0"
    })
    void isWrittenInPlainNumbers(String field, String typed, String plain) {
        assertThat(address(field, typed)).isEqualTo("/?" + field + "=" + plain);
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"-6,5", "10 000 001", "1e39"})
    void keepsANumberThatMayNotStandThereAsItWasTyped(String typed) {
        assertThat(parameters(address("lumens", typed)).getFirst("lumens")).isEqualTo(typed);
    }

    @Test
    void letsAButtonHangTheLightsAnotherWay() {
        assertThat(address("tiltDeg", "", "tiltTo", "15")).isEqualTo("/?tiltDeg=15");
        assertThat(address("tiltDeg", "7", "tiltTo", "15")).isEqualTo("/?tiltDeg=15");
        assertThat(address("tiltDeg", "15", "tiltTo", "")).isEqualTo("/");
    }

    @Test
    void keepsTheSwitches() {
        assertThat(address("count", "2", "units", "us", "theme", "telescope"))
                .isEqualTo("/?count=2&units=us&theme=telescope");
    }

    @Test
    void carriesNothingElse() {
        assertThat(address("form", "sentence", "count", "2", "next", "//evil.example", "_csrf", "x", "Host", "evil"))
                .isEqualTo("/?count=2");
        assertThat(address("form", "sentence")).isEqualTo("/");
    }

    private static String address(String... namesAndValues) {
        MultiValueMap<String, String> sent = new LinkedMultiValueMap<>();
        for (int i = 0; i < namesAndValues.length; i += 2) {
            sent.add(namesAndValues[i], namesAndValues[i + 1]);
        }
        return SentenceAddress.plainAddress(sent);
    }

    /** As a server reads them. */
    private static MultiValueMap<String, String> parameters(String address) {
        MultiValueMap<String, String> read = new LinkedMultiValueMap<>();
        UriComponentsBuilder.fromUriString(address)
                .build()
                .getQueryParams()
                .forEach((name, values) ->
                        values.forEach(value -> read.add(name, value == null ? "" : UriUtils.decode(value, UTF_8))));
        return read;
    }
}
