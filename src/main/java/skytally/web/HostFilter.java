package skytally.web;

import jakarta.servlet.FilterChain;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.Collection;
import java.util.Locale;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.springframework.web.filter.OncePerRequestFilter;

/**
 * Answers only to the names of this computer and to those configured. A page elsewhere can make its own name lead
 * to this computer, and would then count as ours in the browser; by the name it used it is refused.
 */
final class HostFilter extends OncePerRequestFilter {

    private static final Pattern NAME_AND_PORT = Pattern.compile("(\\[[0-9a-fA-F:.]+]|[^:\\[\\]]+)(?::[0-9]{1,5})?");

    private final Set<String> names;

    HostFilter(Collection<String> configured) {
        names = Stream.concat(Stream.of("localhost", "127.0.0.1", "[::1]"), configured.stream())
                .map(name -> name.toLowerCase(Locale.ROOT))
                .collect(Collectors.toUnmodifiableSet());
    }

    @Override
    protected void doFilterInternal(HttpServletRequest request, HttpServletResponse response, FilterChain chain)
            throws ServletException, IOException {
        if (isOurs(request.getHeader("Host"))) {
            chain.doFilter(request, response);
        } else {
            Refusal.HOST.send(request, response);
        }
    }

    private boolean isOurs(@Nullable String host) {
        if (host == null) {
            return false;
        }
        Matcher parts = NAME_AND_PORT.matcher(host);
        return parts.matches() && names.contains(parts.group(1).toLowerCase(Locale.ROOT));
    }
}
