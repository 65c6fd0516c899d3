package skytally.web;

import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Locale;
import org.apache.catalina.connector.Request;
import org.apache.catalina.connector.Response;
import org.apache.catalina.valves.ErrorReportValve;
import org.jspecify.annotations.Nullable;

/**
 * The page for a request that the server could not even read, and for a failure of the page that tells failures.
 * It is bare, and names neither the server nor a reason that came from it.
 */
public final class BareErrorPage extends ErrorReportValve {

    private static final String UNREADABLE = page("The request could not be read", """
            <p>What was sent is not a request this server can read, or its address is too long.
            Nothing was changed; what was saved is still saved.</p>
            <p>Go back and shorten what you typed, or begin again at the <a href="/">first page</a>.</p>
            """);

    private static final String FAULT_HERE = page("Something went wrong here", """
            <p>The fault is in this program, not in what you did, and is written in its log.
            What was saved before is still saved.</p>
            <p>Go back and try once more, or begin again at the <a href="/">first page</a>.</p>
            """);

    private static String page(String title, String body) {
        return String.format(Locale.ROOT, """
                <!doctype html>
                <html lang="en">
                <head><meta charset="utf-8"><title>%1$s · Skytally</title></head>
                <body>
                <h1>%1$s</h1>
                %2$s</body>
                </html>
                """, title, body);
    }

    @Override
    protected void report(Request request, Response response, @Nullable Throwable cause) {
        int status = response.getStatus();
        if (status < HttpServletResponse.SC_BAD_REQUEST
                || response.getContentWritten() > 0
                || !response.setErrorReported()) {
            return;
        }
        PageHeadersFilter.HEADERS.forEach(response::setHeader);
        response.setContentType("text/html");
        response.setCharacterEncoding("UTF-8");
        try {
            response.getReporter()
                    .write(status >= HttpServletResponse.SC_INTERNAL_SERVER_ERROR ? FAULT_HERE : UNREADABLE);
            response.finishResponse();
        } catch (IOException browserGone) {
            throw new UncheckedIOException("The answer to an unreadable request could not be sent", browserGone);
        }
    }
}
