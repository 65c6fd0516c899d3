package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.system.CapturedOutput;
import org.springframework.boot.test.system.OutputCaptureExtension;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@ExtendWith(OutputCaptureExtension.class)
@DisplayName("A failure")
class ErrorsPageTest {

    private static final Pattern INCIDENT = Pattern.compile("[2-9A-HJ-NP-Z]{4}-[2-9A-HJ-NP-Z]{4}");

    @LocalServerPort
    private int port;

    @ParameterizedTest(name = "{0} {1} is {2}: {3}")
    @CsvSource({
        "GET, /test/plain?a=%zz, 400, The request could not be read",
        "GET, /actuator/env, 403, This is not open",
        "GET, /there-is-no-such-page, 404, There is no such page",
        "GET, /error, 404, There is no such page",
        "GET, /css/none.css, 404, There is no such page",
        "HEAD, /there-is-no-such-page, 404, ''",
        "GET, /test/clash, 409, It was changed in the meantime",
        "GET, /test/fails, 500, Something went wrong here",
        "GET, /test/fails-in-the-template, 500, Something went wrong here"
    })
    void isToldToAPersonInThreeParts(String method, String path, int status, String title) throws Exception {
        Wire.Answer answer = Wire.of(port, method, path)
                .header("Accept", "text/html,application/xhtml+xml,application/xml;q=0.9,*/*;q=0.8")
                .send();

        assertThat(answer.status()).isEqualTo(status);
        assertThat(answer.header("Content-Type")).isEqualTo("text/html;charset=UTF-8");
        assertThat(answer.header("Vary")).contains("Accept");
        assertThat(answer.body()).contains(title).doesNotContain(TestPages.SECRET, "Exception", "null");
        if (method.equals("GET")) {
            assertThat(answer.body())
                    .contains("<h1>" + title + "</h1>", "<title>" + title + " · Skytally</title>")
                    .contains("What happened", "What is kept", "What to do");
        }
    }

    /** The server refuses these before any page is asked. */
    @ParameterizedTest
    @ValueSource(strings = {"/%00", "/a%2Fb", "/a%5Cb", "/?a[]=1", "/?a=\"", "/{id}"})
    void looksTheSameWhereTheServerCouldNotReadTheAddress(String path) throws Exception {
        Wire.Answer page = Wire.get(port, path)
                .header("Accept", "text/html,*/*;q=0.8")
                .header("Cookie", "skytally-theme=telescope")
                .send();
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.header("Content-Type")).isEqualTo("text/html;charset=UTF-8");
        assertThat(page.header("Content-Security-Policy")).isEqualTo(PageHeadersFilter.CONTENT_SECURITY_POLICY);
        assertThat(page.body())
                .contains("<h1>The request could not be read</h1>", "What happened", "What is kept", "What to do")
                .contains(
                        "href=\"/css/tokens.css\"",
                        "class=\"app-told\"",
                        path.startsWith("/%") ? "telescope" : "data-theme")
                .doesNotContainIgnoringCase("tomcat")
                .doesNotContain("Exception", "<script", " style=");
    }

    /** Where the first line of the request could be read, and what is asked for with it. */
    @ParameterizedTest
    @ValueSource(strings = {"/%00", "/a%2Fb", "/a%5Cb"})
    void isAProblemForAProgramWhereTheServerCouldNotReadTheAddress(String path) throws Exception {
        Wire.Answer data =
                Wire.get(port, path).header("Accept", "application/json").send();
        assertThat(data.status()).isEqualTo(400);
        assertThat(data.header("Content-Type")).isEqualTo("application/problem+json;charset=UTF-8");
        assertThat(data.body())
                .startsWith("{\"type\":\"about:blank\",\"title\":\"The request could not be read\",\"status\":400,");
    }

    @Test
    void toSendToAPageThatTakesNothingIsToldAsThat() throws Exception {
        Wire.Answer page = Wire.get(port, "/test/form").send();
        Matcher token = Pattern.compile("name=\"_csrf\" value=\"([^\"]+)\"").matcher(page.body());
        assertThat(token.find()).isTrue();

        Wire.Answer answer = Wire.post(port, "/test/plain", "_csrf=" + token.group(1))
                .header("Cookie", page.cookies().get(0).split(";")[0])
                .send();

        assertThat(answer.status()).isEqualTo(405);
        assertThat(answer.header("Allow")).contains("GET");
        assertThat(answer.body()).contains("This page does not take that");
    }

    @ParameterizedTest(name = "{0} is {1}: {2}")
    @CsvSource({
        "/test/plain?a=%zz, 400, The request could not be read",
        "/actuator/env, 403, This is not open",
        "/there-is-no-such-page, 404, There is no such page",
        "/test/clash, 409, It was changed in the meantime",
        "/test/fails, 500, Something went wrong here",
        "/test/fails-in-the-template, 500, Something went wrong here"
    })
    void isToldToAProgramAsAProblem(String path, int status, String title) throws Exception {
        for (String accepted : new String[] {
            "application/json", "application/problem+json", "text/html;q=0.5, application/json", "application/*"
        }) {
            Wire.Answer answer = Wire.get(port, path).header("Accept", accepted).send();

            assertThat(answer.status()).isEqualTo(status);
            assertThat(answer.header("Content-Type")).isEqualTo("application/problem+json");
            assertThat(answer.body())
                    .contains("\"status\":" + status, "\"title\":\"" + title + "\"", "\"detail\":")
                    .contains("\"instance\":\"" + path.replaceAll("\\?.*", "") + "\"")
                    .doesNotContain("Exception", "%zz");
        }
    }

    @ParameterizedTest(name = "Accept: {0}")
    @ValueSource(strings = {"*/*", "text/html", "text/html, application/json", "image/png", "not a type at all"})
    void isAPageForWhoeverDoesNotAskForJson(String accepted) throws Exception {
        Wire.Answer answer = Wire.get(port, "/there-is-no-such-page")
                .header("Accept", accepted)
                .send();

        assertThat(answer.status()).isEqualTo(404);
        assertThat(answer.header("Content-Type")).isEqualTo("text/html;charset=UTF-8");
    }

    @Test
    void ofOursHasANumberThatIsInTheLogWithTheException(CapturedOutput log) throws Exception {
        Wire.Answer page = Wire.get(port, "/test/fails").send();
        Wire.Answer problem = Wire.get(port, "/test/fails")
                .header("Accept", "application/json")
                .send();

        for (Wire.Answer answer : new Wire.Answer[] {page, problem}) {
            Matcher number = INCIDENT.matcher(answer.body());
            assertThat(number.find()).isTrue();
            assertThat(log).contains("Incident " + number.group() + ": GET /test/fails was answered with 500");
        }
        assertThat(log).contains(TestPages.SECRET);
        assertThat(problem.body()).containsPattern("\"incident\":\"" + INCIDENT + "\"");
    }

    @Test
    void ofSomebodyElsesHasNone() throws Exception {
        assertThat(Wire.get(port, "/there-is-no-such-page").send().body()).doesNotContain("Incident number");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {
                "/test/plain",
                "/test/form",
                "/test/fails",
                "/there-is-no-such-page",
                "/test/clash",
                "/actuator/env"
            })
    void leavesNoQueryInTheLog(String path, CapturedOutput log) throws Exception {
        Wire.get(port, path + "?note=what-somebody-typed").send();

        assertThat(log).doesNotContain("what-somebody-typed");
    }

    @Test
    void inWhatWasSentIsToldToAProgramFieldByField() throws Exception {
        Wire.Answer answer = Wire.get(port, "/test/invalid")
                .header("Accept", "application/json")
                .send();

        assertThat(answer.status()).isEqualTo(400);
        assertThat(answer.header("Content-Type")).isEqualTo("application/problem+json");
        assertThat(answer.body())
                .contains("\"title\":\"Invalid input\"", "\"status\":400", "\"instance\":\"/test/invalid\"")
                .contains(
                        "\"errors\":[{\"field\":\"distanceM\",\"message\":\"Enter the distance in metres, such as 800\"},"
                                + "{\"field\":\"lumens\",\"message\":\"The light must be 0 lm or more\"}]");
    }
}
