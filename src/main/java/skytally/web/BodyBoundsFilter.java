package skytally.web;

import jakarta.servlet.FilterChain;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.Locale;
import org.apache.tomcat.util.http.InvalidParameterException;
import org.springframework.util.unit.DataSize;
import org.springframework.web.filter.OncePerRequestFilter;

/**
 * Refuses, before anybody asks for a parameter, a request that is too large or whose parameters cannot be read.
 * Left to the first reader, the same faults would look like faults of the page.
 */
final class BodyBoundsFilter extends OncePerRequestFilter {

    private final DataSize form;
    private final DataSize upload;

    BodyBoundsFilter(DataSize form, DataSize upload) {
        this.form = form;
        this.upload = upload;
    }

    @Override
    protected void doFilterInternal(HttpServletRequest request, HttpServletResponse response, FilterChain chain)
            throws ServletException, IOException {
        DataSize allowed = isUpload(request) ? upload : form;
        if (request.getContentLengthLong() > allowed.toBytes()) {
            response.sendError(HttpServletResponse.SC_REQUEST_ENTITY_TOO_LARGE);
            return;
        }
        int fault = faultOfParameters(request);
        if (fault != 0) {
            response.sendError(fault);
            return;
        }
        chain.doFilter(request, response);
    }

    static boolean isUpload(HttpServletRequest request) {
        String type = request.getContentType();
        return type != null && type.toLowerCase(Locale.ROOT).startsWith("multipart/form-data");
    }

    private static int faultOfParameters(HttpServletRequest request) {
        try {
            request.getParameterMap();
            return 0;
        } catch (InvalidParameterException unreadable) {
            return unreadable.getErrorCode();
        }
    }
}
