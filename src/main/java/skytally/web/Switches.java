package skytally.web;

import jakarta.servlet.http.Cookie;
import jakarta.servlet.http.HttpServletRequest;
import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.springframework.web.util.UriComponentsBuilder;
import org.springframework.web.util.WebUtils;

/**
 * What a person has chosen about how pages are shown, never about what is computed.
 *
 * @param units what lengths and light are written in
 * @param theme how the page is coloured
 */
public record Switches(Units units, Theme theme) {

    static final String THEME_COOKIE = "skytally-theme";

    /** One choice of a switch, known in addresses, pages and messages by its word. */
    public interface Choice {

        /** As in an address: {@code ?units=us}. */
        String word();
    }

    /** What lengths and light are written in. */
    public enum Units implements Choice {
        /** Metres and lux. */
        METRIC,
        /** Feet and footcandles. */
        US;

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** How the page is coloured. */
    public enum Theme implements Choice {
        /** Dark ink on paper. */
        DAY,
        /** Light ink on a dark ground. */
        DARK,
        /** Dim red on black, for eyes that are used to the night. */
        TELESCOPE;

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /**
     * The switches of a request: those in its address; for the theme, else the one the browser was last switched to;
     * else metric and day. A word that is no choice is passed over.
     */
    public static Switches of(HttpServletRequest request) {
        return new Switches(
                asked(request, "units", Units.values()).orElse(Units.METRIC),
                themeAsked(request).or(() -> themeKept(request)).orElse(Theme.DAY));
    }

    static Optional<Theme> themeAsked(HttpServletRequest request) {
        return asked(request, "theme", Theme.values());
    }

    private static Optional<Theme> themeKept(HttpServletRequest request) {
        Cookie cookie = WebUtils.getCookie(request, THEME_COOKIE);
        return cookie == null ? Optional.empty() : choice(cookie.getValue(), Theme.values());
    }

    /** Read from the address itself, because a refused request's parameters cannot be asked for. */
    private static <T extends Choice> Optional<T> asked(HttpServletRequest request, String name, T[] choices) {
        String word = UriComponentsBuilder.newInstance()
                .query(request.getQueryString())
                .build()
                .getQueryParams()
                .getFirst(name);
        return choice(word, choices);
    }

    private static <T extends Choice> Optional<T> choice(@Nullable String word, T[] choices) {
        return Arrays.stream(choices).filter(one -> one.word().equals(word)).findFirst();
    }
}
