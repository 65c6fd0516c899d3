package skytally.web;

import jakarta.servlet.FilterChain;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.Map;
import org.springframework.web.filter.OncePerRequestFilter;

/**
 * Puts the headers that bound what a browser may do with a page on every answer, the refusals of later filters
 * included: for those, the headers of the security chain would come too late.
 */
final class PageHeadersFilter extends OncePerRequestFilter {

    /** No script, no frame of ours elsewhere, nothing from anywhere but here. */
    static final String CONTENT_SECURITY_POLICY =
            "default-src 'none'; style-src 'self'; font-src 'self'; img-src 'self';"
                    + " form-action 'self'; base-uri 'none'; frame-ancestors 'self'";

    static final Map<String, String> HEADERS = Map.of(
            "Content-Security-Policy", CONTENT_SECURITY_POLICY,
            "X-Content-Type-Options", "nosniff",
            "X-Frame-Options", "SAMEORIGIN",
            "Referrer-Policy", "same-origin",
            "Permissions-Policy", "camera=(), display-capture=(), geolocation=(), microphone=(), payment=(), usb=()",
            "Cross-Origin-Opener-Policy", "same-origin",
            "Cross-Origin-Resource-Policy", "same-origin",
            // Pages are asked for anew; what carries a hash in its address replaces this.
            "Cache-Control", "no-cache");

    @Override
    protected void doFilterInternal(HttpServletRequest request, HttpServletResponse response, FilterChain chain)
            throws ServletException, IOException {
        HEADERS.forEach(response::setHeader);
        chain.doFilter(request, response);
    }
}
