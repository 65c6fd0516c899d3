package skytally.project;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.net.CookieManager;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Somebody at a browser, as far as pages and forms go: keeps cookies, follows redirections, sends form tokens. */
public final class Pages {

    private static final Pattern TOKEN = Pattern.compile("name=\"_csrf\" value=\"([^\"]+)\"");
    private static final Pattern VERSION = Pattern.compile("name=\"version\" value=\"([^\"]+)\"");

    private final HttpClient client = HttpClient.newBuilder()
            .cookieHandler(new CookieManager())
            .followRedirects(HttpClient.Redirect.NORMAL)
            .build();
    private final String origin;

    public Pages(int port) {
        origin = "http://localhost:" + port;
    }

    /** What came back in the end. */
    public record Page(int status, String path, String body) {

        /** The words of the page, without its marks. */
        public String words() {
            return body.replaceAll("(?s)<[^>]*>", " ").replace("&#39;", "'").replaceAll("[\\s\u00a0]+", " ");
        }

        String version() {
            return first(VERSION, body);
        }
    }

    public Page get(String path) throws IOException, InterruptedException {
        return send(HttpRequest.newBuilder(URI.create(origin + path)).GET());
    }

    /** Fills in the form on that page, as it stands now, and sends it there. */
    public Page post(String path, String... namesAndValues) throws IOException, InterruptedException {
        return postFrom(get(path), path, namesAndValues);
    }

    /** Fills in a form that was opened before. */
    public Page postFrom(Page opened, String path, String... namesAndValues) throws IOException, InterruptedException {
        List<String> all = new ArrayList<>(List.of("_csrf", first(TOKEN, opened.body()), "version", opened.version()));
        all.addAll(List.of(namesAndValues));
        StringBuilder body = new StringBuilder();
        for (int i = 0; i < all.size(); i += 2) {
            body.append(i == 0 ? "" : "&")
                    .append(all.get(i))
                    .append('=')
                    .append(URLEncoder.encode(all.get(i + 1), StandardCharsets.UTF_8));
        }
        return send(HttpRequest.newBuilder(URI.create(origin + path))
                .header("Content-Type", "application/x-www-form-urlencoded")
                .POST(HttpRequest.BodyPublishers.ofString(body.toString())));
    }

    /** Fills in the form on that page as it stands now, with a file in its input called file, and sends it to it. */
    public Page upload(String path, String fileName, byte[] bytes, String... namesAndValues)
            throws IOException, InterruptedException {
        List<String> all = new ArrayList<>(List.of("version", get(path).version()));
        all.addAll(List.of(namesAndValues));
        return uploadTo(path, path, fileName, bytes, all.toArray(String[]::new));
    }

    /** Sends a file to another address than that of the page its form stands on. */
    public Page uploadTo(String page, String path, String fileName, byte[] bytes, String... namesAndValues)
            throws IOException, InterruptedException {
        List<String> all =
                new ArrayList<>(List.of("_csrf", first(TOKEN, get(page).body())));
        all.addAll(List.of(namesAndValues));
        ByteArrayOutputStream body = new ByteArrayOutputStream();
        for (int i = 0; i < all.size(); i += 2) {
            body.writeBytes(("--part\r\nContent-Disposition: form-data; name=\"" + all.get(i) + "\"\r\n\r\n"
                            + all.get(i + 1) + "\r\n")
                    .getBytes(StandardCharsets.UTF_8));
        }
        body.writeBytes(("--part\r\nContent-Disposition: form-data; name=\"file\"; filename=\"" + fileName
                        + "\"\r\nContent-Type: text/html\r\n\r\n")
                .getBytes(StandardCharsets.UTF_8));
        body.writeBytes(bytes);
        body.writeBytes("\r\n--part--\r\n".getBytes(StandardCharsets.UTF_8));
        return send(HttpRequest.newBuilder(URI.create(origin + path))
                .header("Content-Type", "multipart/form-data; boundary=part")
                .POST(HttpRequest.BodyPublishers.ofByteArray(body.toByteArray())));
    }

    /** What stands at an address, byte for byte. */
    public HttpResponse<byte[]> bytes(String path) throws IOException, InterruptedException {
        return client.send(
                HttpRequest.newBuilder(URI.create(origin + path)).GET().build(),
                HttpResponse.BodyHandlers.ofByteArray());
    }

    private Page send(HttpRequest.Builder request) throws IOException, InterruptedException {
        HttpResponse<String> answer = client.send(
                request.header("Accept", "text/html").build(),
                HttpResponse.BodyHandlers.ofString(StandardCharsets.UTF_8));
        return new Page(answer.statusCode(), answer.uri().getPath(), answer.body());
    }

    private static String first(Pattern pattern, String body) {
        Matcher found = pattern.matcher(body);
        if (!found.find()) {
            throw new AssertionError("No " + pattern + " in " + body);
        }
        return found.group(1);
    }
}
