package skytally.project.entry;

import jakarta.servlet.RequestDispatcher;
import jakarta.servlet.http.HttpServletRequest;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.springframework.dao.ConcurrencyFailureException;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ExceptionHandler;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.server.ResponseStatusException;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.Party;
import skytally.project.ProjectClashException;

/** When somebody saved the same project first: nothing is saved, and what was typed is shown to be copied. */
@Controller
class ClashPages {

    private static final String PATH = "/projects/clash";
    private static final String UNIT = "-unit";

    /** What a form sends beside what was typed. */
    private static final Set<String> NOT_TYPED = Set.of("_csrf", "version", "doing");

    private final Words words;

    ClashPages(Words words) {
        this.words = words;
    }

    /** Something that was typed: where, and what. */
    record TypedLine(String label, String text) {}

    /** Leads to the page, which as a page of its own has everything the layout shows. */
    @ControllerAdvice
    static class Advice {

        @ExceptionHandler({ProjectClashException.class, ConcurrencyFailureException.class})
        String clash() {
            return "forward:" + PATH;
        }
    }

    @RequestMapping(PATH)
    ModelAndView tell(HttpServletRequest request) {
        Object from = request.getAttribute(RequestDispatcher.FORWARD_REQUEST_URI);
        if (!(from instanceof String address)) {
            throw new ResponseStatusException(HttpStatus.NOT_FOUND);
        }
        ModelAndView page = new ModelAndView("project/clash", HttpStatus.CONFLICT);
        page.addObject("anew", address);
        page.addObject("typed", typed(request.getParameterMap()));
        return page;
    }

    private List<TypedLine> typed(Map<String, String[]> sent) {
        List<TypedLine> lines = new ArrayList<>();
        sent.forEach((name, values) -> {
            if (!NOT_TYPED.contains(name) && !name.endsWith("-used") && !isUnitOfNothing(name, sent)) {
                Arrays.stream(values)
                        .filter(value -> !value.isBlank())
                        .forEach(value -> lines.add(new TypedLine(label(name), inWords(name, value))));
            }
        });
        return lines;
    }

    /** A unit is always sent; beside an empty box nobody chose it. */
    private static boolean isUnitOfNothing(String name, Map<String, String[]> sent) {
        String[] values = name.endsWith(UNIT) ? sent.get(name.substring(0, name.length() - UNIT.length())) : null;
        return values != null && Arrays.stream(values).allMatch(String::isBlank);
    }

    private static String inWords(String name, String value) {
        return name.equals("party") ? Party.byId(value).map(Party::words).orElse(value) : value;
    }

    private String label(String name) {
        int hyphen = name.lastIndexOf('-');
        String field = hyphen < 0 ? name : name.substring(0, hyphen);
        String label = Fields.all().stream()
                .filter(one -> one.name().equals(field))
                .map(Field::label)
                .findFirst()
                .or(() -> words.find("typed." + field))
                .orElse(field);
        return hyphen < 0
                ? label
                : label + ", "
                        + words.find("typed.part" + name.substring(hyphen)).orElse(name.substring(hyphen + 1));
    }
}
