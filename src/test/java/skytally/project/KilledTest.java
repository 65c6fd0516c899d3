package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.IOException;
import java.net.CookieManager;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import skytally.SkytallyApplication;

/**
 * Kills the running server in the middle of saves that come in over HTTP, again and again, on one data directory: what
 * an answer said was saved is there when it starts again.
 */
@DisplayName("A save that was acknowledged")
class KilledTest {

    private static final int KILLS = 20;
    private static final int PEOPLE = 3;
    private static final Pattern TOKEN = Pattern.compile("name=\"_csrf\" value=\"([^\"]+)\"");
    private static final Pattern READY = Pattern.compile("ready at http://localhost:(\\d+)");
    private static final Pattern LISTED = Pattern.compile("href=\"/projects/([0-9a-f-]{36})\">([^<]*)</a>");

    /** Of no importance to what is tested, only that each kill comes at another moment and always the same ones. */
    private final Random moments = new Random(20);

    /** By id, the title that was acknowledged last. */
    private final Map<String, String> acknowledged = new ConcurrentHashMap<>();

    @TempDir
    private Path temporary;

    @Test
    void isFoundAfterTheServerWasKilled() throws Exception {
        for (int kill = 0; kill < KILLS; kill++) {
            Process server = start();
            try {
                int port = port(server);
                assertKept(port, kill);
                CountDownLatch begun = new CountDownLatch(4 + kill % 3);
                List<Thread> people = savers(port, kill, begun);
                begun.await();
                Thread.sleep(moments.nextInt(40));
                assertThat(server.toHandle().destroyForcibly()).isTrue();
                assertThat(server.waitFor()).isNotZero();
                for (Thread person : people) {
                    person.join();
                }
            } finally {
                server.destroyForcibly();
            }
        }
        Process server = start();
        try {
            int port = port(server);
            assertKept(port, KILLS);
            assertThat(acknowledged).hasSizeGreaterThan(2 * KILLS);
            assertWhole(port);
        } finally {
            server.destroyForcibly();
        }
    }

    private Process start() throws IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-XX:TieredStopAtLevel=1",
                        "-XX:+UseSerialGC",
                        "-cp",
                        System.getProperty("java.class.path"),
                        SkytallyApplication.class.getName(),
                        "--server.port=0",
                        "--spring.main.lazy-initialization=true",
                        "--skytally.data-directory=" + temporary.resolve("data"))
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
    }

    /** Waits until it says that it is ready. */
    private static int port(Process server) throws IOException {
        BufferedReader says = server.inputReader();
        for (String line = says.readLine(); line != null; line = says.readLine()) {
            Matcher ready = READY.matcher(line);
            if (ready.find()) {
                return Integer.parseInt(ready.group(1));
            }
        }
        throw new AssertionError("The server ended before it was ready");
    }

    /** Each saves until the server is gone, and notes a save only when its answer has come. */
    private List<Thread> savers(int port, int kill, CountDownLatch begun) {
        List<Thread> people = new ArrayList<>();
        for (int i = 0; i < PEOPLE; i++) {
            String who = kill + " " + i;
            Thread person = new Thread(() -> {
                try {
                    Form form = new Form(port);
                    for (int number = 0; ; number++) {
                        String title = "first " + who + " " + number;
                        String id = form.saved("/projects", "title", title);
                        acknowledged.put(id, title);
                        begun.countDown();
                        String second = "second " + who + " " + number;
                        form.saved("/projects/" + id + "/title", "title", second, "version", "0");
                        acknowledged.put(id, second);
                        begun.countDown();
                    }
                } catch (IOException killed) {
                    // As it was meant to be. What was not answered was not acknowledged.
                } catch (InterruptedException stopped) {
                    Thread.currentThread().interrupt();
                }
            });
            person.start();
            people.add(person);
        }
        return people;
    }

    private void assertKept(int port, int kill) throws IOException, InterruptedException {
        Map<String, String> listed = new HashMap<>();
        Matcher lines = LISTED.matcher(new Form(port).page("/projects"));
        while (lines.find()) {
            listed.put(lines.group(1), lines.group(2));
        }
        acknowledged.forEach((id, title) -> {
            // A title on its way when the server was killed may have been saved without an answer.
            String onItsWay = title.replace("first", "second");
            assertThat(listed.get(id)).as("after %d kills", kill).isIn(title, onItsWay);
        });
    }

    /** Every project opens, and its history has what was saved. */
    private void assertWhole(int port) throws IOException, InterruptedException {
        Form form = new Form(port);
        for (Map.Entry<String, String> one : acknowledged.entrySet()) {
            String history = form.page("/projects/" + one.getKey() + "/history");
            assertThat(history).contains("Save 1: Made by its title");
            if (one.getValue().startsWith("second")) {
                assertThat(history).contains("Save 2: Renamed", one.getValue());
            }
            assertThat(form.page("/projects/" + one.getKey() + "/file")).contains("\"formatVersion\" : 1");
        }
    }

    /** Somebody with the token of one page. */
    private static final class Form {

        private final HttpClient client =
                HttpClient.newBuilder().cookieHandler(new CookieManager()).build();
        private final String origin;
        private final String token;

        Form(int port) throws IOException, InterruptedException {
            origin = "http://localhost:" + port;
            Matcher found = TOKEN.matcher(page("/projects"));
            assertThat(found.find()).isTrue();
            token = found.group(1);
        }

        String page(String path) throws IOException, InterruptedException {
            HttpResponse<String> answer = send(request(path).GET());
            assertThat(answer.statusCode()).as(path).isEqualTo(200);
            return answer.body();
        }

        /** The id of the project that the answer leads to, which it does only when it is saved. */
        String saved(String path, String... fields) throws IOException, InterruptedException {
            StringBuilder form = new StringBuilder("_csrf=" + encoded(token));
            for (int i = 0; i < fields.length; i += 2) {
                form.append('&').append(fields[i]).append('=').append(encoded(fields[i + 1]));
            }
            HttpResponse<String> answer = send(request(path)
                    .header("Content-Type", "application/x-www-form-urlencoded")
                    .POST(HttpRequest.BodyPublishers.ofString(form.toString())));
            assertThat(answer.statusCode()).as(path).isBetween(302, 303);
            String to = answer.headers().firstValue("Location").orElseThrow();
            return to.replaceAll("^.*/projects/([0-9a-f-]{36}).*$", "$1");
        }

        private HttpRequest.Builder request(String path) {
            return HttpRequest.newBuilder(URI.create(origin + path)).timeout(Duration.ofSeconds(60));
        }

        private HttpResponse<String> send(HttpRequest.Builder request) throws IOException, InterruptedException {
            return client.send(request.build(), HttpResponse.BodyHandlers.ofString(StandardCharsets.UTF_8));
        }

        private static String encoded(String text) {
            return URLEncoder.encode(text, StandardCharsets.UTF_8);
        }
    }
}
