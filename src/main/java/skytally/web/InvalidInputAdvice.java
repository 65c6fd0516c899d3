package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import java.net.URI;
import java.util.Locale;
import org.springframework.context.MessageSource;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.http.ProblemDetail;
import org.springframework.http.ResponseEntity;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ExceptionHandler;

/** Tells a program which fields of what it sent cannot be used. */
@ControllerAdvice
class InvalidInputAdvice {

    private final MessageSource messages;

    InvalidInputAdvice(MessageSource messages) {
        this.messages = messages;
    }

    @ExceptionHandler
    ResponseEntity<ProblemDetail> tell(InvalidInputException invalid, HttpServletRequest request) {
        ProblemDetail problem = ProblemDetail.forStatusAndDetail(
                HttpStatus.BAD_REQUEST, messages.getMessage("problem.invalid-input.detail", null, Locale.ENGLISH));
        problem.setTitle(messages.getMessage("problem.invalid-input.title", null, Locale.ENGLISH));
        problem.setInstance(URI.create(request.getRequestURI()));
        problem.setProperty("errors", invalid.faults());
        return ResponseEntity.badRequest()
                .contentType(MediaType.APPLICATION_PROBLEM_JSON)
                .body(problem);
    }
}
