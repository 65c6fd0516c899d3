package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.web.ServerTest;
import skytally.web.Wire;

@ServerTest
@DisplayName("The first look as a page")
class FirstLookPageTest {

    private static final String ANSWER = "/?count=24&lumens=5200&distanceM=800";
    private static final String ERRORS =
            "/?count=abc&lumens=&spectralClass=moonlight&tiltDeg=-5&distanceM=%3Cb%3E%22far%22&air=clear&air=hazy";

    @LocalServerPort
    private int port;

    @Test
    void answersWithoutAnyBlankFilledInAndSaysSo() throws IOException {
        Wire.Answer answer = Wire.get(port, "/").send();

        assertThat(answer.status()).isEqualTo(200);
        assertThat(answer.header("Content-Type")).isEqualTo("text/html;charset=UTF-8");
        assertThat(answer.header("Vary")).isEqualTo("Accept");
        assertThat(answer.body()).contains("This used 11 guesses; the one that matters most is: ");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {
                ANSWER,
                "/?count=1",
                "/?lumens=0",
                "/?shape=diffuse-up",
                "/?distanceM=30000",
                "/?distanceM=1&units=us",
                "/?shape=self-lit-panel&tiltDeg=90&theme=telescope",
                ERRORS
            })
    void leadsNowhereThatIsNotThereAndUsesNoNameTwice(String path) throws IOException {
        String body = get(path);
        List<String> ids = all(body, "\\bid=\"([^\"]+)\"");

        assertThat(ids).doesNotHaveDuplicates().contains("main");
        assertThat(all(body, "href=\"#([^\"]*)\"")).isNotEmpty().allMatch(ids::contains);
        assertThat(all(body, "aria-describedby=\"([^\"]+)\"")).allMatch(ids::contains);
        // One for each blank, and the title of what is kept where there is an answer to keep.
        assertThat(all(body, "<label[^>]* for=\"([^\"]+)\""))
                .hasSize(body.contains("action=\"/keep\"") ? 12 : 11)
                .allMatch(ids::contains);
        for (String names : all(body, "aria-labelledby=\"([^\"]+)\"")) {
            assertThat(ids).contains(names.split(" "));
        }
        assertThat(body.split("<h1", -1)).hasSize(2);
        assertThat(body)
                .doesNotContain(" style=", "<style", "<script", "javascript:", " onclick=")
                .doesNotContain("th:", "??", ">null<", "NaN")
                .contains("An aid to judgement. It does not replace a licensed lighting design, a site measurement or"
                        + " the local code; where they differ, they decide.");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {ANSWER, "/?lumens=0", "/?distanceM=30000&units=us"})
    void opensEveryNumberToItsFormulaItsNumbersAndItsSource(String path) throws IOException {
        List<String> workings = all(get(path), "(?s)<div class=\"app-panel__body\" id=\"w-[^\"]+\">(.*?)</details>");

        assertThat(workings).hasSizeGreaterThan(30).allSatisfy(working -> {
            assertThat(working).containsPattern("<p class=\"app-working__formula\"><i>[^<]+</i></p>");
            assertThat(working).containsPattern("<p class=\"app-working__formula\">[^<]{5,}</p>");
            assertThat(working).containsPattern("(?s)Sources:\\s+\\S[^<]{8,} \\([^<]+\\)\\.</p>");
        });
        // at least one of them shows all four parts of an input, with its state in a word
        assertThat(workings).anySatisfy(working -> assertThat(working).contains(">given<", ">your sentence<"));
    }

    @Test
    void keepsWhatWasTypedRightAndWrongAndLinksEachFaultToItsField() throws IOException {
        Wire.Answer answer = Wire.get(port, ERRORS + "&mountingHeightM=6.5").send();

        assertThat(answer.status()).isEqualTo(400);
        assertThat(answer.header("Vary")).isEqualTo("Accept");
        String summary =
                all(answer.body(), "(?s)<div class=\"app-errors\"(.*?)</div>").get(0);
        assertThat(all(summary, "href=\"#([^\"]+)\""))
                .containsExactly("count", "lumens", "spectralClass", "tiltDeg", "distanceM", "air");
        assertThat(answer.body())
                .contains("id=\"count\" name=\"count\" value=\"abc\"")
                .contains("id=\"lumens\" name=\"lumens\" value=\"\"")
                .contains("id=\"distanceM\" name=\"distanceM\" value=\"&lt;b&gt;&quot;far&quot;\"")
                .contains("id=\"mountingHeightM\" name=\"mountingHeightM\" value=\"6.5\"")
                .contains("<option value=\"moonlight\" selected=\"selected\">“moonlight”</option>")
                .contains("<option value=\"-5\" selected=\"selected\">")
                .contains("id=\"count-error\">How many lights: “abc” is not a number. Enter a whole number from 1 to"
                        + " 20\u00a0000, such as 24.<")
                .doesNotContain("<b>", "What you would see");
        assertThat(all(answer.body(), "(?s)id=\"([a-zA-Z]+)\"[^>]*aria-invalid=\"true\""))
                .containsExactlyInAnyOrder("count", "lumens", "spectralClass", "tiltDeg", "distanceM", "air");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {
                "%3Cscript%3Ealert(1)%3C/script%3E",
                "%22%20autofocus%20onfocus=%22alert(1)",
                "%27%3E%3Cimg%20src=x%3E",
                "$%7B7*7%7D",
                "%5B%5B$%7B7*7%7D%5D%5D",
                "__$%7B7*7%7D__",
                "%00",
                "%E2%80%AE"
            })
    void treatsMarkupAsText(String typed) throws IOException {
        for (Blank blank : Blank.values()) {
            Wire.Answer answer =
                    Wire.get(port, "/?" + blank.field() + "=" + typed).send();

            assertThat(answer.status()).as(blank.field()).isEqualTo(400);
            assertThat(answer.body())
                    .contains("There is a problem", "href=\"#" + blank.field() + "\"")
                    .doesNotContain("<script", "<img", " autofocus onfocus=\"", ">49<", "“49”");
        }
    }

    @Test
    void leadsFromTheFormToThePlainAddress() throws IOException {
        Wire.Answer answer = Wire.get(
                        port,
                        "/?form=sentence&theme=dark&count=24&lumens=5%C2%A0200&spectralClass=led3000&shape=flat-area"
                                + "&mountingHeightM=6&distanceM=800&tiltDeg=&eyeHeightM=&glareAngleDeg=&air="
                                + "&groundReflectance=&tiltTo=15")
                .send();

        assertThat(answer.status()).isEqualTo(303);
        assertThat(answer.header("Location"))
                .isEqualTo("/?count=24&lumens=5200&spectralClass=led3000&shape=flat-area&tiltDeg=15&mountingHeightM=6"
                        + "&distanceM=800&theme=dark");
        assertThat(get(answer.header("Location")))
                .contains("What you would see, 800\u00a0m away", "data-theme=\"dark\"");
    }

    /** A word, a space, a letter that takes three bytes: each grows on its way into an address. */
    @ParameterizedTest(name = "{0} repeated")
    @ValueSource(strings = {"x", "x+", "x*", "%E2%82%AC"})
    void givesBackTenThousandCharactersThatCannotBeRead(String piece) throws IOException {
        int pieceLength = piece.startsWith("%") ? 1 : piece.length();
        String typed = piece.repeat((piece.startsWith("%") ? 5_000 : 10_000) / pieceLength);
        Wire.Answer redirect = Wire.get(port, "/?form=sentence&count=" + typed + "&distanceM=800")
                .send();

        assertThat(redirect.status()).isEqualTo(303);
        Wire.Answer page = Wire.get(port, redirect.header("Location")).send();
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.body())
                .contains("is longer than 40 characters", "id=\"distanceM\" name=\"distanceM\" value=\"800\"");
        assertThat(all(page.body(), "id=\"count\" name=\"count\" value=\"([^\"]*)\"")
                        .get(0)
                        .length())
                .isGreaterThan(4_990);
    }

    @Test
    void showsTheLadderAsAPictureASentenceAndATable() throws IOException {
        String body = get(ANSWER);
        String picture = all(body, "(?s)(<svg class=\"app-ladder\".*?</svg>)").get(0);
        String words = text(picture);

        assertThat(picture).contains("role=\"img\"", "<title id=", "<desc id=");
        String says = all(picture, "<desc[^>]*>([^<]+)</desc>").get(0);
        assertThat(body).contains("<p>" + says + "</p>");
        List<String> rows = all(body, "(?s)<tr(?: class=\"app-table__mark\")?>\\s*<th scope=\"row\">(.*?)</tr>");
        assertThat(rows).hasSize(10);
        for (String row : rows) {
            String name = text(row.substring(0, row.indexOf("</th>"))).replaceAll("(, on level ground)?.$", "");
            assertThat(words).contains(name);
            // the picture has two figures of what the table has three
            String lux = text(all(row, "(?s)<td[^>]*>(.*?)</td>").get(0)).strip();
            double inTable = value(lux);
            assertThat(all(words, "([0-9.]+(?:\u00a0?\\s*×\u00a0?\\s*10−\\d+)?)[\u00a0 ]lx").stream()
                            .mapToDouble(FirstLookPageTest::value))
                    .as("%s lx of %s", lux, name)
                    .anyMatch(drawn -> Math.abs(drawn / inTable - 1) < 0.051);
        }
        // brightest first
        assertThat(rows.stream()
                        .map(row ->
                                -value(text(all(row, "(?s)<td[^>]*>(.*?)</td>").get(0))))
                        .toList())
                .isSorted();
    }

    private static double value(String written) {
        return Double.parseDouble(
                written.replaceAll("[\u00a0\\s]", "").replace("×10−", "e-").replace('−', '-'));
    }

    @Test
    void speaksFeetAndFootcandlesWhereAskedAndTakesThemBack() throws IOException {
        String body = get("/?count=24&lumens=5200&mountingHeightM=6.096&distanceM=762.1524&units=us");

        assertThat(body)
                .contains("What you would see, 2\u00a0501\u00a0ft away", "ft up,", "ft away,")
                .contains("id=\"mountingHeightM\" name=\"mountingHeightFt\" value=\"20\"")
                .contains("id=\"distanceM\" name=\"distanceFt\" value=\"2500.5\"")
                .contains("id=\"eyeHeightM\" name=\"eyeHeightFt\" value=\"\"")
                .contains("<input type=\"hidden\" name=\"units\" value=\"us\">")
                .containsPattern("class=\"app-key-line__unit\">fc<")
                .doesNotContainPattern("class=\"app-key-line__unit\">lx<");

        assertThat(Wire.get(
                                port,
                                "/?form=sentence&units=us&count=24&lumens=5200&mountingHeightFt=20&distanceFt=2500.5&eyeHeightFt=")
                        .send()
                        .header("Location"))
                .isEqualTo("/?count=24&lumens=5200&mountingHeightM=6.096&distanceM=762.1524&units=us");
    }

    @Test
    void tellsFaultsInFeetOnAPageInFeet() throws IOException {
        String body = get("/?distanceM=0.3048&mountingHeightM=high&units=us");

        assertThat(body)
                .contains(
                        "Distance to the lights: “1” is out of bounds. Enter a number from 3.281 to 656\u00a0167\u00a0ft")
                .contains("Enter a number from 0 to 1\u00a0640\u00a0ft, such as 19.7.")
                .contains("name=\"distanceFt\" value=\"1\"", "name=\"mountingHeightFt\" value=\"high\"");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"day", "dark", "telescope"})
    void comesInEveryTheme(String theme) throws IOException {
        assertThat(get(ANSWER + "&theme=" + theme))
                .contains("data-theme=\"" + theme + "\"")
                .contains("<input type=\"hidden\" name=\"theme\" value=\"" + theme + "\">")
                .containsPattern("aria-current=\"true\"[^>]*>" + theme + "<");
    }

    @Test
    void saysWhatIsNotSeenInWordsThatPromiseNothing() throws IOException {
        String body = get("/?shape=diffuse-up&count=24");

        assertThat(body).contains("no direct light by this data", "Light still arrives from the ground and the sky.");
        assertThat(text(body).toLowerCase(Locale.ROOT))
                .doesNotContain(" safe", "negligible", "no light ", "certificate", "score");
    }

    private String get(String path) throws IOException {
        return Wire.get(port, path).send().body();
    }

    private static List<String> all(String text, String pattern) {
        return Pattern.compile(pattern)
                .matcher(text)
                .results()
                .map((MatchResult found) -> found.group(1))
                .toList();
    }

    private static String text(String markup) {
        return markup.replaceAll("<[^>]+>", "").replace("&nbsp;", "\u00a0");
    }
}
