package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.springframework.security.access.AccessDeniedException;
import org.springframework.security.web.access.AccessDeniedHandler;
import org.springframework.security.web.csrf.CsrfException;

/**
 * Refuses a form whose token is missing or expired, and gives back what was typed in it. What comes from another
 * site never gets here: {@link CrossSiteFilter} stands before.
 */
final class FormTokenRefusal implements AccessDeniedHandler {

    @Override
    public void handle(HttpServletRequest request, HttpServletResponse response, AccessDeniedException denied)
            throws IOException {
        if (denied instanceof CsrfException) {
            if (request.getMethod().equals("POST")) {
                ResendForm.of(request).keepIn(request);
            }
            Refusal.FORM_EXPIRED.send(request, response);
        } else {
            response.sendError(HttpServletResponse.SC_FORBIDDEN);
        }
    }
}
