package skytally.web;

import jakarta.servlet.http.Cookie;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Stream;
import org.apache.catalina.connector.Request;
import org.apache.catalina.connector.Response;
import org.apache.catalina.valves.ErrorReportValve;
import org.jspecify.annotations.Nullable;

/**
 * The page for a request that the server could not even read, and for a failure of the page that tells failures. It
 * has the look of the others, needs nothing of what made them, and names neither the server nor a reason that came
 * from it. Whoever asks for JSON and not for a page gets the same as a problem.
 */
public final class BareErrorPage extends ErrorReportValve {

    private static final String UNREADABLE = "The request could not be read";
    private static final String FAULT_HERE = "Something went wrong here";

    private static final String[] OF_UNREADABLE = {
        "What was sent is not a request this server can read, or its address is too long.",
        "Nothing was changed; what was saved is still saved.",
        "Go back and shorten what you typed, or begin again at the <a href=\"/\">first page</a>."
    };

    private static final String[] OF_FAULT_HERE = {
        "The fault is in this program, not in what you did, and is written in its log.",
        "What was saved before is still saved.",
        "Go back and try once more, or begin again at the <a href=\"/\">first page</a>."
    };

    private static String page(String title, String[] told, String theme) {
        return String.format(Locale.ROOT, """
                <!doctype html>
                <html lang="en" data-theme="%s">
                <head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
                <title>%s · Skytally</title>
                <link rel="stylesheet" href="/css/tokens.css"><link rel="stylesheet" href="/css/base.css">
                <link rel="stylesheet" href="/css/layout.css"><link rel="stylesheet" href="/css/components/notice.css">
                </head>
                <body>
                <div class="app-sheet">
                <header><div class="app-head"><a class="app-head__name" href="/">Skytally</a></div>
                <p class="app-run"></p></header>
                <main id="main">
                <div class="app-title"><h1>%s</h1></div>
                <dl class="app-told"><dt>What happened</dt><dd>%s</dd><dt>What is kept</dt><dd>%s</dd>
                <dt>What to do</dt><dd>%s</dd></dl>
                </main>
                </div>
                </body>
                </html>
                """, theme, title, title, told[0], told[1], told[2]);
    }

    private static String problem(int status, String title, String[] told) {
        return String.format(
                Locale.ROOT,
                "{\"type\":\"about:blank\",\"title\":\"%s\",\"status\":%d,\"detail\":\"%s\"}",
                title,
                status,
                told[0]);
    }

    @Override
    protected void report(Request request, Response response, @Nullable Throwable cause) {
        int status = response.getStatus();
        if (status < HttpServletResponse.SC_BAD_REQUEST
                || response.getContentWritten() > 0
                || !response.setErrorReported()) {
            return;
        }
        boolean ours = status >= HttpServletResponse.SC_INTERNAL_SERVER_ERROR;
        boolean data = wantsData(request);
        PageHeadersFilter.HEADERS.forEach(response::setHeader);
        response.setContentType(data ? "application/problem+json" : "text/html");
        response.setCharacterEncoding("UTF-8");
        String title = ours ? FAULT_HERE : UNREADABLE;
        String[] told = ours ? OF_FAULT_HERE : OF_UNREADABLE;
        try {
            response.getReporter().write(data ? problem(status, title, told) : page(title, told, theme(request)));
            response.finishResponse();
        } catch (IOException browserGone) {
            throw new UncheckedIOException("The answer to an unreadable request could not be sent", browserGone);
        }
    }

    private static boolean wantsData(Request request) {
        String accepted = request.getHeader("Accept");
        return accepted != null && accepted.contains("json") && !accepted.contains("html");
    }

    /** As last chosen, where so much of the request could be read; never what was sent itself. */
    private static String theme(Request request) {
        Cookie[] cookies = request.getCookies();
        return Stream.ofNullable(cookies)
                .flatMap(Arrays::stream)
                .filter(cookie -> cookie.getName().equals(Switches.THEME_COOKIE))
                .flatMap(cookie -> Arrays.stream(Switches.Theme.values())
                        .map(Switches.Theme::word)
                        .filter(word -> word.equals(cookie.getValue())))
                .findFirst()
                .orElse(Switches.Theme.DAY.word());
    }
}
