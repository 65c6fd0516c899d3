package skytally.project.entry;

import jakarta.servlet.http.Cookie;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import org.springframework.http.HttpHeaders;
import org.springframework.http.ResponseCookie;
import org.springframework.web.util.UriUtils;
import org.springframework.web.util.WebUtils;
import skytally.project.Saving;
import skytally.web.InvalidInputException;

/** The name of whoever types in this browser, so that it is typed once: no account, only a cookie. */
public final class WhoCookie {

    /** Of the field in every form that saves. */
    private static final String FIELD = "who";

    private static final String NAME = "skytally-who";

    private WhoCookie() {}

    /** The name, or empty. */
    public static String in(HttpServletRequest request) {
        Cookie cookie = WebUtils.getCookie(request, NAME);
        if (cookie == null) {
            return "";
        }
        try {
            String who = UriUtils.decode(cookie.getValue(), StandardCharsets.UTF_8);
            return who.length() > Saving.LONGEST_WHO ? "" : who;
        } catch (IllegalArgumentException spoiled) {
            return "";
        }
    }

    /** Remembers it, or forgets it when it is empty. */
    public static void keep(HttpServletResponse response, String who) {
        response.addHeader(
                HttpHeaders.SET_COOKIE,
                ResponseCookie.from(NAME, UriUtils.encode(who, StandardCharsets.UTF_8))
                        .path("/")
                        .httpOnly(true)
                        .sameSite("Lax")
                        .maxAge(who.isEmpty() ? Duration.ZERO : Duration.ofDays(365))
                        .build()
                        .toString());
    }

    /**
     * The name as typed now, remembered for the next form.
     *
     * @throws InvalidInputException if it is longer than its field takes
     */
    public static String taken(String typed, HttpServletResponse response) {
        String who = typed.strip();
        if (who.length() > Saving.LONGEST_WHO) {
            throw new InvalidInputException(List.of(new InvalidInputException.Fault(
                    FIELD, "The name has more than " + Saving.LONGEST_WHO + " characters. Shorten it.")));
        }
        keep(response, who);
        return who;
    }
}
