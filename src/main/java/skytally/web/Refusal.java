package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.jspecify.annotations.Nullable;

/** Why the house itself turned a request away, where the status alone does not say it. */
enum Refusal {
    HOST(HttpServletResponse.SC_BAD_REQUEST, "host"),
    CROSS_SITE(HttpServletResponse.SC_FORBIDDEN, "cross-site"),
    FORM_EXPIRED(HttpServletResponse.SC_FORBIDDEN, "form-expired");

    private static final String ATTRIBUTE = Refusal.class.getName();

    private final int status;
    private final String words;

    Refusal(int status, String words) {
        this.status = status;
        this.words = words;
    }

    /** Ends the request with this refusal; {@link ErrorPages} tells it. */
    void send(HttpServletRequest request, HttpServletResponse response) throws IOException {
        request.setAttribute(ATTRIBUTE, this);
        response.sendError(status);
    }

    /** The part of the message keys that belongs to it. */
    String words() {
        return words;
    }

    static @Nullable Refusal of(HttpServletRequest request) {
        return (Refusal) request.getAttribute(ATTRIBUTE);
    }
}
