package skytally.project.shelf;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.net.CookieManager;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Somebody at the pages of a running server: follows redirects, keeps cookies, sends forms with their token. */
public final class Visitor {

    private static final Pattern TOKEN = Pattern.compile("name=\"_csrf\" value=\"([^\"]+)\"");
    private static final Pattern VERSION = Pattern.compile("name=\"version\" value=\"(\\d+)\"");

    private final int port;
    private final HttpClient client = HttpClient.newBuilder()
            .cookieHandler(new CookieManager())
            .followRedirects(HttpClient.Redirect.NORMAL)
            .connectTimeout(Duration.ofSeconds(30))
            .build();

    public Visitor(int port) {
        this.port = port;
    }

    /** A page as it came, after all redirects. */
    public record Page(int status, String path, String body, HttpResponse<byte[]> answer) {

        /** The version its form carries. */
        public String version() {
            return found(VERSION, body);
        }

        /** The id of the project at its address. */
        public String id() {
            return found(Pattern.compile("^/projects/([0-9a-f-]{36})"), path);
        }
    }

    private static String found(Pattern pattern, String text) {
        Matcher found = pattern.matcher(text);
        assertThat(found.find()).as("%s in %s", pattern, text).isTrue();
        return found.group(1);
    }

    public Page get(String path) throws Exception {
        return send(HttpRequest.newBuilder(address(path)).GET());
    }

    /** Sends a form; the token is taken from the list of projects. Names and values in turn. */
    public Page post(String path, String... fields) throws Exception {
        List<String> form = new ArrayList<>(List.of("_csrf=" + encoded(token())));
        for (int i = 0; i < fields.length; i += 2) {
            form.add(encoded(fields[i]) + "=" + encoded(fields[i + 1]));
        }
        return send(HttpRequest.newBuilder(address(path))
                .header("Content-Type", "application/x-www-form-urlencoded")
                .POST(HttpRequest.BodyPublishers.ofString(String.join("&", form))));
    }

    /** Sends a file by the form that opens one. */
    public Page upload(String name, byte[] file) throws Exception {
        String boundary = "----form-boundary";
        ByteArrayOutputStream body = new ByteArrayOutputStream();
        body.writeBytes(text("--" + boundary + "\r\nContent-Disposition: form-data; name=\"_csrf\"\r\n\r\n" + token()
                + "\r\n--" + boundary + "\r\nContent-Disposition: form-data; name=\"file\"; filename=\"" + name
                + "\"\r\nContent-Type: application/json\r\n\r\n"));
        body.writeBytes(file);
        body.writeBytes(text("\r\n--" + boundary + "--\r\n"));
        return send(HttpRequest.newBuilder(address("/projects/open"))
                .header("Content-Type", "multipart/form-data; boundary=" + boundary)
                .POST(HttpRequest.BodyPublishers.ofByteArray(body.toByteArray())));
    }

    private String token() throws Exception {
        return found(TOKEN, get("/projects").body());
    }

    private Page send(HttpRequest.Builder request) throws Exception {
        HttpResponse<byte[]> answer =
                client.send(request.timeout(Duration.ofSeconds(60)).build(), HttpResponse.BodyHandlers.ofByteArray());
        return new Page(
                answer.statusCode(),
                answer.uri().getPath()
                        + (answer.uri().getQuery() == null
                                ? ""
                                : "?" + answer.uri().getQuery()),
                new String(answer.body(), StandardCharsets.UTF_8),
                answer);
    }

    private URI address(String path) {
        return URI.create("http://localhost:" + port + path);
    }

    private static String encoded(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8);
    }

    private static byte[] text(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }
}
