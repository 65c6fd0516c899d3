package skytally.project.shelf;

import jakarta.servlet.http.Cookie;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.net.URLDecoder;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import org.springframework.http.HttpHeaders;
import org.springframework.http.ResponseCookie;
import org.springframework.web.util.WebUtils;
import skytally.project.Saving;
import skytally.web.InvalidInputException;

/** The name a person types once for the history: no account, only a cookie of the browser that fills it in again. */
final class TypedName {

    /** Of the field in every form that saves. */
    static final String FIELD = "who";

    private static final String COOKIE = "skytally-name";

    private TypedName() {}

    /** The name last typed in this browser, or empty. */
    static String last(HttpServletRequest request) {
        Cookie cookie = WebUtils.getCookie(request, COOKIE);
        if (cookie == null) {
            return "";
        }
        try {
            String name = URLDecoder.decode(cookie.getValue(), StandardCharsets.UTF_8);
            return name.length() > Saving.LONGEST_WHO ? "" : name;
        } catch (IllegalArgumentException notOurs) {
            return "";
        }
    }

    /**
     * The name as typed now, remembered for the next form.
     *
     * @throws InvalidInputException if it is longer than its field takes
     */
    static String taken(String typed, HttpServletResponse response) {
        String name = typed.strip();
        if (name.length() > Saving.LONGEST_WHO) {
            throw new InvalidInputException(List.of(new InvalidInputException.Fault(
                    FIELD, "The name has more than " + Saving.LONGEST_WHO + " characters. Shorten it.")));
        }
        ResponseCookie cookie = ResponseCookie.from(COOKIE, URLEncoder.encode(name, StandardCharsets.UTF_8))
                .path("/")
                .maxAge(Duration.ofDays(365))
                .sameSite("Strict")
                .httpOnly(true)
                .build();
        response.addHeader(HttpHeaders.SET_COOKIE, cookie.toString());
        return name;
    }
}
