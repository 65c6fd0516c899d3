package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;
import org.springframework.web.util.HtmlUtils;

@ServerTest
@DisplayName("The token of a form")
class FormTokenPageTest {

    private static final Pattern HIDDEN =
            Pattern.compile("<input type=\"hidden\" name=\"([^\"]*)\" value=\"([^\"]*)\"\\s*/?>");
    private static final Pattern ACTION = Pattern.compile("<form [^>]*action=\"([^\"]*)\"");

    @LocalServerPort
    private int port;

    @Test
    void isInEveryFormAndLetsItThrough() throws Exception {
        Wire.Answer page = Wire.get(port, "/test/form").send();

        Wire.Answer taken = Wire.post(port, "/test/form", hiddenFields(page) + "&typed=something")
                .header("Cookie", cookie(page))
                .send();

        assertThat(taken.status()).isEqualTo(200);
        assertThat(taken.body()).contains("typed=[something]");
    }

    @Test
    void whenExpiredGivesBackEverythingTypedAndAButtonThatSendsItToTheSameAddress() throws Exception {
        String markup = "<script>alert('1')</script>\" & ü\r\nsecond line";
        String typed = "note=" + encoded(markup) + "&both=body&twice=a&twice=b&empty=&_csrf=long-gone";

        Wire.Answer expired = Wire.post(port, "/test/form?both=address&q=%C3%BC+%26", typed)
                .header("Cookie", "skytally-form=a-token-from-another-day")
                .header("Sec-Fetch-Site", "same-origin")
                .header("Origin", "http://localhost:" + port)
                .send();

        assertThat(expired.status()).isEqualTo(403);
        assertThat(expired.body())
                .contains("The form had expired", "nothing is lost", "Send it again")
                .contains("&lt;script&gt;alert(&#39;1&#39;)&lt;/script&gt;&quot; &amp; ü")
                .doesNotContain("<script>", "long-gone", "a-token-from-another-day");
        String action = action(expired);
        assertThat(action).isEqualTo("/test/form?both=address&q=%C3%BC+%26");

        Wire.Answer taken = Wire.post(port, action, hiddenFields(expired))
                .header("Cookie", "skytally-form=a-token-from-another-day")
                .header("Sec-Fetch-Site", "same-origin")
                .send();

        assertThat(taken.status()).isEqualTo(200);
        assertThat(taken.body().split("\n(?=\\w+=)"))
                .containsExactlyInAnyOrder(
                        "note=[" + markup + "]", "both=[address, body]", "twice=[a, b]", "empty=[]", "q=[ü &]");
    }

    @Test
    void whenMissingWithItsCookieGivesANewCookieToSendAgainWith() throws Exception {
        Wire.Answer expired = Wire.post(port, "/test/form", "typed=kept").send();

        assertThat(expired.status()).isEqualTo(403);
        Wire.Answer taken = Wire.post(port, action(expired), hiddenFields(expired))
                .header("Cookie", cookie(expired))
                .send();
        assertThat(taken.status()).isEqualTo(200);
        assertThat(taken.body()).isEqualTo("typed=[kept]");
    }

    @Test
    void whenExpiredOnAnUploadGivesBackTheTextAndSaysThatFilesMustBeChosenAgain() throws Exception {
        String boundary = "----edge";
        Wire.Answer expired = Wire.of(port, "POST", "/test/form")
                .header("Content-Type", "multipart/form-data; boundary=" + boundary)
                .body("--" + boundary
                        + "\r\nContent-Disposition: form-data; name=\"note\"\r\n\r\ntyped beside a file\r\n--"
                        + boundary
                        + "\r\nContent-Disposition: form-data; name=\"file\"; filename=\"a.ies\"\r\n\r\nIESNA\r\n--"
                        + boundary + "--\r\n")
                .send();

        assertThat(expired.status()).isEqualTo(403);
        assertThat(expired.body())
                .contains("name=\"note\" value=\"typed beside a file\"")
                .contains("enctype=\"multipart/form-data\"")
                .contains("A file cannot be given back")
                .doesNotContain("IESNA");
    }

    @Test
    void mustBeTheOneOfTheCookie() throws Exception {
        Wire.Answer mine = Wire.get(port, "/test/form").send();
        Wire.Answer anothers = Wire.get(port, "/test/form").send();

        assertThat(Wire.post(port, "/test/form", hiddenFields(anothers))
                        .header("Cookie", cookie(mine))
                        .send()
                        .status())
                .isEqualTo(403);
    }

    @Test
    void whenMissingIsToldToAProgramWithoutTheForm() throws Exception {
        Wire.Answer expired = Wire.post(port, "/test/form", "typed=kept")
                .header("Accept", "application/json")
                .send();

        assertThat(expired.status()).isEqualTo(403);
        assertThat(expired.header("Content-Type")).isEqualTo("application/problem+json");
        assertThat(expired.body()).contains("The form had expired").doesNotContain("kept\"");
    }

    @Test
    void cannotBeSentOnToAnotherServerByAnAddressThatLooksLikeOne() throws Exception {
        Wire.Answer refused =
                Wire.post(port, "//evil.example/test/form", "typed=kept").send();

        assertThat(refused.status()).isEqualTo(400);
        assertThat(refused.body()).doesNotContain("evil.example");
    }

    private static String cookie(Wire.Answer answer) {
        return answer.cookies().get(0).split(";")[0];
    }

    private static String action(Wire.Answer page) {
        Matcher found = ACTION.matcher(page.body());
        assertThat(found.find()).as("a form in the page").isTrue();
        return HtmlUtils.htmlUnescape(found.group(1));
    }

    /** What a browser would send of the page's hidden fields. */
    private static String hiddenFields(Wire.Answer page) {
        String fields = HIDDEN.matcher(page.body())
                .results()
                .map(one -> encoded(HtmlUtils.htmlUnescape(one.group(1))) + "="
                        + encoded(HtmlUtils.htmlUnescape(one.group(2))))
                .collect(Collectors.joining("&"));
        assertThat(fields).contains("_csrf=");
        return fields;
    }

    private static String encoded(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8);
    }
}
