package skytally.web;

import jakarta.servlet.FilterChain;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.net.URI;
import java.util.Locale;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.springframework.web.filter.OncePerRequestFilter;

/**
 * Refuses what a page elsewhere asks of this server. A link on another page may be followed to one of ours, as a
 * whole page, because an answer's address is there to be quoted; nothing else crosses: no picture, no frame, no
 * script's request, and nothing that could change what is kept.
 *
 * <p>Browsers say in {@code Sec-Fetch-Site} where a request comes from. For those that do not, {@code Origin} and
 * {@code Referer} are compared with the name we were asked by. A program that sends none of them is not a browser
 * with somebody's cookies in it, and goes on to the check of the form token.
 */
final class CrossSiteFilter extends OncePerRequestFilter {

    private static final Set<String> SAFE_METHODS = Set.of("GET", "HEAD");
    private static final Set<String> FROM_HERE = Set.of("same-origin", "none");

    @Override
    protected void doFilterInternal(HttpServletRequest request, HttpServletResponse response, FilterChain chain)
            throws ServletException, IOException {
        boolean safe = SAFE_METHODS.contains(request.getMethod());
        if (safe ? mayRead(request) : mayChange(request)) {
            chain.doFilter(request, response);
        } else {
            Refusal.CROSS_SITE.send(request, response);
        }
    }

    private static boolean mayRead(HttpServletRequest request) {
        String site = request.getHeader("Sec-Fetch-Site");
        boolean wholePage = "navigate".equals(request.getHeader("Sec-Fetch-Mode"))
                && "document".equals(request.getHeader("Sec-Fetch-Dest"));
        return site == null || FROM_HERE.contains(site) || wholePage;
    }

    private static boolean mayChange(HttpServletRequest request) {
        String site = request.getHeader("Sec-Fetch-Site");
        if (site != null && !FROM_HERE.contains(site)) {
            return false;
        }
        String origin = request.getHeader("Origin");
        if (origin != null) {
            return isOurs(origin, request);
        }
        String referer = request.getHeader("Referer");
        return referer == null || isOurs(referer, request);
    }

    private static boolean isOurs(String address, HttpServletRequest request) {
        String host = request.getHeader("Host");
        String from = authority(address);
        return host != null && from != null && from.equals(host.toLowerCase(Locale.ROOT));
    }

    private static @Nullable String authority(String address) {
        try {
            String authority = URI.create(address).getRawAuthority();
            return authority == null ? null : authority.toLowerCase(Locale.ROOT);
        } catch (IllegalArgumentException notAnAddress) {
            return null;
        }
    }
}
