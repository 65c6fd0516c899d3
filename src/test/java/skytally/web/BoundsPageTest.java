package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@DisplayName("The bounds of a request")
class BoundsPageTest {

    private static final int MEGABYTE = 1024 * 1024;

    @LocalServerPort
    private int port;

    @Test
    void ofAFormIsTwoMegabytes() throws Exception {
        Wire.Answer under = Wire.post(port, "/test/form", "note=" + "a".repeat(2 * MEGABYTE - 100))
                .send();
        Wire.Answer over = Wire.post(port, "/test/form", "note=" + "a".repeat(2 * MEGABYTE))
                .send();

        // The lesser one comes as far as the check of its token.
        assertThat(under.status()).isEqualTo(403);
        assertThat(under.body()).contains("Send it again");
        tooMuch(over);
    }

    @Test
    void ofAFormHoldsWhenItsLengthIsNotAnnounced() throws Exception {
        String much = "note=" + "a".repeat(3 * MEGABYTE);
        tooMuch(Wire.post(port, "/test/form", Integer.toHexString(much.length()) + "\r\n" + much + "\r\n0\r\n\r\n")
                .without("Content-Length")
                .header("Transfer-Encoding", "chunked")
                .send());
    }

    @Test
    void ofAnUploadIsTwentyFiveMegabytesAndTheRefusalIsHeardToTheEnd() throws Exception {
        tooMuch(upload(26 * MEGABYTE).send());
        tooMuch(upload(60 * MEGABYTE).send());
        assertThat(upload(20 * MEGABYTE).send().status()).isEqualTo(403);
    }

    @Test
    void ofAFormsFieldsIsTwoThousand() throws Exception {
        tooManyOrTooMuch(Wire.post(
                        port,
                        "/test/form",
                        IntStream.range(0, 3000).mapToObj(i -> "f" + i + "=1").collect(Collectors.joining("&")))
                .send());
    }

    @Test
    void ofAnAddressLetsTenThousandCharactersOfMarkupThrough() throws Exception {
        assertThat(Wire.get(port, "/test/plain?note=" + "%3C".repeat(10_000))
                        .send()
                        .status())
                .isEqualTo(200);
    }

    @Test
    void ofAnAddressIsAnsweredInOurWordsToo() throws Exception {
        Wire.Answer answer =
                Wire.get(port, "/test/plain?note=" + "a".repeat(70_000)).send();

        assertThat(answer.status()).isBetween(400, 499);
        assertThat(answer.body())
                .contains("The request could not be read", "<a href=\"/\">first page</a>")
                .doesNotContainIgnoringCase("tomcat")
                .doesNotContain("Exception", "java.", "aaaa");
    }

    @Test
    void areNotWhatIsWrongWithAHalfWrittenEscape() throws Exception {
        Wire.Answer answer = Wire.get(port, "/test/plain?note=%zz").send();

        assertThat(answer.status()).isEqualTo(400);
        assertThat(answer.body()).contains("The request could not be read").doesNotContain("Exception", "%zz");
    }

    private Wire upload(int size) {
        String boundary = "edge";
        return Wire.of(port, "POST", "/test/form")
                .header("Content-Type", "multipart/form-data; boundary=" + boundary)
                .body("--" + boundary + "\r\nContent-Disposition: form-data; name=\"file\"; filename=\"a.ies\"\r\n\r\n"
                        + "a".repeat(size) + "\r\n--" + boundary + "--\r\n");
    }

    private static void tooMuch(Wire.Answer answer) {
        assertThat(answer.status()).isEqualTo(413);
        assertThat(answer.body())
                .contains("Too much at once", "2 MB for a form, 25 MB with a file")
                .doesNotContain("aaaa");
    }

    private static void tooManyOrTooMuch(Wire.Answer answer) {
        assertThat(answer.status()).isIn(400, 413);
        assertThat(answer.body()).contains("What is kept").doesNotContain("Exception", "f2999");
    }
}
