package skytally.web;

import jakarta.servlet.RequestDispatcher;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.net.URI;
import java.security.SecureRandom;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.boot.webmvc.error.ErrorController;
import org.springframework.context.MessageSource;
import org.springframework.http.HttpHeaders;
import org.springframework.http.HttpStatusCode;
import org.springframework.http.InvalidMediaTypeException;
import org.springframework.http.MediaType;
import org.springframework.http.ProblemDetail;
import org.springframework.http.ResponseEntity;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.servlet.ModelAndView;

/**
 * Tells every failure: what happened, what is kept, what to do. Never the text of an exception: of a failure of
 * ours the page gives a number, and the log has the same number with the exception.
 */
@Controller
class ErrorPages implements ErrorController {

    private static final Logger LOG = LoggerFactory.getLogger(ErrorPages.class);

    /** The statuses that have words of their own; the others borrow those of 400 or 500. */
    private static final Set<Integer> TOLD = Set.of(400, 403, 404, 405, 409, 413);

    /** Letters and digits that cannot be taken for one another when read aloud. */
    private static final String INCIDENT_LETTERS = "23456789ABCDEFGHJKLMNPQRSTUVWXYZ";

    private static final SecureRandom RANDOM = new SecureRandom();

    private final MessageSource messages;

    ErrorPages(MessageSource messages) {
        this.messages = messages;
    }

    @RequestMapping("${spring.web.error.path:/error}")
    Object tell(HttpServletRequest request, HttpServletResponse response) {
        int status = status(request);
        String words = "error." + kind(request, status);
        String incident = status >= 500 ? writeDown(request, status) : null;
        response.addHeader(HttpHeaders.VARY, HttpHeaders.ACCEPT);
        if (wantsData(request)) {
            return problem(request, status, words, incident);
        }
        ModelAndView page = new ModelAndView("error/page", HttpStatusCode.valueOf(status));
        page.addObject("words", words);
        page.addObject("incident", incident);
        page.addObject("resend", ResendForm.in(request));
        return page;
    }

    private static int status(HttpServletRequest request) {
        Object status = request.getAttribute(RequestDispatcher.ERROR_STATUS_CODE);
        // Asked for by its address, it is a page like any other that does not exist.
        return status instanceof Integer known ? known : HttpServletResponse.SC_NOT_FOUND;
    }

    private static String kind(HttpServletRequest request, int status) {
        Refusal refusal = Refusal.of(request);
        if (refusal != null) {
            return refusal.words();
        }
        return String.valueOf(TOLD.contains(status) ? status : status >= 500 ? 500 : 400);
    }

    private static String writeDown(HttpServletRequest request, int status) {
        StringBuilder number = new StringBuilder();
        for (int i = 0; i < 8; i++) {
            number.append(i == 4 ? "-" : "").append(INCIDENT_LETTERS.charAt(RANDOM.nextInt(INCIDENT_LETTERS.length())));
        }
        LOG.error(
                "Incident {}: {} {} was answered with {}",
                number,
                request.getMethod(),
                path(request),
                status,
                (Throwable) request.getAttribute(RequestDispatcher.ERROR_EXCEPTION));
        return number.toString();
    }

    private ResponseEntity<ProblemDetail> problem(
            HttpServletRequest request, int status, String words, @Nullable String incident) {
        ProblemDetail problem = ProblemDetail.forStatus(status);
        problem.setTitle(say(words + ".title"));
        problem.setDetail(say(words + ".happened") + " " + say(words + ".do"));
        problem.setInstance(URI.create(path(request)));
        if (incident != null) {
            problem.setProperty("incident", incident);
        }
        return ResponseEntity.status(status)
                .contentType(MediaType.APPLICATION_PROBLEM_JSON)
                .body(problem);
    }

    private String say(String key) {
        return messages.getMessage(key, null, Locale.ENGLISH);
    }

    /** The path asked for, as sent and so percent-encoded; never the query, which is what somebody typed. */
    private static String path(HttpServletRequest request) {
        Object path = request.getAttribute(RequestDispatcher.ERROR_REQUEST_URI);
        return path instanceof String asked ? asked : request.getRequestURI();
    }

    /** Whether JSON is asked for, and more than a page is. */
    private static boolean wantsData(HttpServletRequest request) {
        List<MediaType> accepted;
        try {
            accepted = MediaType.parseMediaTypes(request.getHeader(HttpHeaders.ACCEPT));
        } catch (InvalidMediaTypeException unreadable) {
            return false;
        }
        double page = quality(accepted, MediaType.TEXT_HTML);
        return quality(accepted, MediaType.APPLICATION_JSON) > page
                || quality(accepted, MediaType.APPLICATION_PROBLEM_JSON) > page;
    }

    private static double quality(List<MediaType> accepted, MediaType offered) {
        return accepted.stream()
                .filter(one -> one.includes(offered))
                .max(Comparator.comparingInt(ErrorPages::exactness))
                .map(MediaType::getQualityValue)
                .orElse(0.0);
    }

    private static int exactness(MediaType range) {
        return range.isWildcardType() ? 0 : range.isWildcardSubtype() ? 1 : 2;
    }
}
