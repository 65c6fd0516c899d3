package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.validation.Valid;
import jakarta.validation.constraints.Positive;
import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.springframework.boot.autoconfigure.condition.ConditionalOnProperty;
import org.springframework.context.MessageSource;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.validation.BindingResult;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.ModelAttribute;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.ResponseBody;
import org.springframework.web.server.ResponseStatusException;

/** Pages that do nothing but what the tests of the house need, there only where {@code test-pages} is set. */
@Controller
@ConditionalOnProperty("test-pages")
class TestPages {

    static final String SECRET = "what-the-exception-says";

    /** What the sample form takes. */
    record Sample(@Nullable @Positive BigDecimal heightM) {}

    private final MessageSource messages;

    TestPages(MessageSource messages) {
        this.messages = messages;
    }

    @GetMapping("/test/form")
    String form(@Valid @ModelAttribute("sample") Sample sample, BindingResult found) {
        return "test/form";
    }

    @GetMapping("/test/sentence")
    String sentence(@Valid @ModelAttribute("sample") Sample sample, BindingResult found, Model model) {
        model.addAttribute("faults", InvalidInputException.faults(found, messages));
        return "test/sentence";
    }

    @GetMapping("/test/plain")
    String plain() {
        return "test/plain";
    }

    @PostMapping(path = "/test/form", produces = "text/plain;charset=UTF-8")
    @ResponseBody
    String taken(HttpServletRequest request) {
        return request.getParameterMap().entrySet().stream()
                .filter(one -> !one.getKey().equals("_csrf"))
                .map(one -> one.getKey() + "=" + Arrays.toString(one.getValue()))
                .collect(Collectors.joining("\n"));
    }

    @GetMapping("/test/fails")
    String fails() {
        throw new IllegalStateException(SECRET);
    }

    @GetMapping("/test/fails-in-the-template")
    String failsInTheTemplate() {
        return "test/there-is-no-such-template-" + SECRET;
    }

    @GetMapping("/test/clash")
    String clash() {
        throw new ResponseStatusException(HttpStatus.CONFLICT, SECRET);
    }

    @GetMapping("/test/invalid")
    String invalid() {
        throw new InvalidInputException(List.of(
                new InvalidInputException.Fault("distanceM", "Enter the distance in metres, such as 800"),
                new InvalidInputException.Fault("lumens", "The light must be 0 lm or more")));
    }

    @GetMapping("/test/switches")
    @ResponseBody
    String switches(Switches switches) {
        return switches.units().word() + " " + switches.theme().word();
    }
}
