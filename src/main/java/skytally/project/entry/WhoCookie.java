package skytally.project.entry;

import jakarta.servlet.http.Cookie;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import org.springframework.http.HttpHeaders;
import org.springframework.http.ResponseCookie;
import org.springframework.web.util.UriUtils;
import org.springframework.web.util.WebUtils;

/** The name of whoever types in this browser, so that it is typed once. */
public final class WhoCookie {

    private static final String NAME = "skytally-who";
    private static final int LONGEST = 200;

    private WhoCookie() {}

    /** The name, or empty. */
    public static String in(HttpServletRequest request) {
        Cookie cookie = WebUtils.getCookie(request, NAME);
        if (cookie == null) {
            return "";
        }
        try {
            String who = UriUtils.decode(cookie.getValue(), StandardCharsets.UTF_8);
            return who.length() > LONGEST ? "" : who;
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
}
