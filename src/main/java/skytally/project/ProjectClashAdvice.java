package skytally.project;

import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.springframework.core.Ordered;
import org.springframework.core.annotation.Order;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ExceptionHandler;

/**
 * Tells that somebody saved the same project first, by the page of status 409. A controller whose form can give back
 * what was typed handles the clash itself, and comes before this.
 */
@ControllerAdvice
@Order(Ordered.LOWEST_PRECEDENCE)
class ProjectClashAdvice {

    @ExceptionHandler({ProjectClashException.class, OptimisticLockingFailureException.class})
    void tell(HttpServletResponse response) throws IOException {
        response.sendError(HttpServletResponse.SC_CONFLICT);
    }
}
