package skytally.web;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Requests written byte by byte, because HTTP clients will not send what these tests are about: a false Host, a
 * browser's own headers, a request that is none.
 */
public final class Wire {

    private static final String END = "\r\n";

    private final int port;
    private final String firstLine;
    private final Map<String, String> headers = new LinkedHashMap<>();
    private byte[] body = {};

    private Wire(int port, String firstLine) {
        this.port = port;
        this.firstLine = firstLine;
        header("Host", "localhost:" + port);
        header("Connection", "close");
    }

    public static Wire get(int port, String path) {
        return new Wire(port, "GET " + path + " HTTP/1.1");
    }

    public static Wire post(int port, String path, String form) {
        Wire wire = new Wire(port, "POST " + path + " HTTP/1.1");
        wire.header("Content-Type", "application/x-www-form-urlencoded");
        return wire.body(form);
    }

    public static Wire of(int port, String method, String path) {
        return new Wire(port, method + " " + path + " HTTP/1.1");
    }

    public Wire header(String name, String value) {
        headers.put(name, value);
        return this;
    }

    public Wire without(String name) {
        headers.remove(name);
        return this;
    }

    public Wire body(String text) {
        body = text.getBytes(StandardCharsets.UTF_8);
        return header("Content-Length", String.valueOf(body.length));
    }

    public Answer send() throws IOException {
        StringBuilder head = new StringBuilder(firstLine).append(END);
        headers.forEach(
                (name, value) -> head.append(name).append(": ").append(value).append(END));
        try (Socket socket = new Socket("127.0.0.1", port)) {
            socket.setSoTimeout(60_000);
            socket.getOutputStream().write(head.append(END).toString().getBytes(StandardCharsets.UTF_8));
            socket.getOutputStream().write(body);
            socket.getOutputStream().flush();
            return Answer.read(socket.getInputStream().readAllBytes());
        }
    }

    /** What came back. */
    public record Answer(int status, Map<String, List<String>> headers, String body) {

        private static Answer read(byte[] all) {
            // One char a byte, until the length of each chunk has been counted.
            String text = new String(all, StandardCharsets.ISO_8859_1);
            int end = text.indexOf(END + END);
            List<String> lines = text.substring(0, end).lines().toList();
            Map<String, List<String>> headers = new LinkedHashMap<>();
            lines.stream()
                    .skip(1)
                    .forEach(line -> headers.computeIfAbsent(
                                    line.substring(0, line.indexOf(':')).toLowerCase(Locale.ROOT),
                                    name -> new ArrayList<>())
                            .add(line.substring(line.indexOf(':') + 1).strip()));
            String body = text.substring(end + 4);
            if (headers.containsKey("transfer-encoding")) {
                body = unchunked(body);
            }
            return new Answer(
                    Integer.parseInt(lines.get(0).split(" ")[1]),
                    headers,
                    new String(body.getBytes(StandardCharsets.ISO_8859_1), StandardCharsets.UTF_8));
        }

        private static String unchunked(String body) {
            ByteArrayOutputStream whole = new ByteArrayOutputStream();
            int at = 0;
            while (true) {
                int lineEnd = body.indexOf(END, at);
                int length = Integer.parseInt(body.substring(at, lineEnd).strip(), 16);
                if (length == 0) {
                    return whole.toString(StandardCharsets.ISO_8859_1);
                }
                whole.writeBytes(
                        body.substring(lineEnd + 2, lineEnd + 2 + length).getBytes(StandardCharsets.ISO_8859_1));
                at = lineEnd + 2 + length + 2;
            }
        }

        /** The only header of that name, or a failure. */
        public String header(String name) {
            List<String> values = headers.getOrDefault(name.toLowerCase(Locale.ROOT), List.of());
            if (values.size() != 1) {
                throw new AssertionError("Expected one header " + name + " but there were " + values);
            }
            return values.get(0);
        }

        public List<String> cookies() {
            return headers.getOrDefault("set-cookie", List.of());
        }
    }
}
