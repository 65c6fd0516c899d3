package skytally.project.lights;

import jakarta.servlet.http.HttpServletRequest;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import org.springframework.stereotype.Controller;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.KeptProject;
import skytally.project.LuminaireType;
import skytally.project.Scheme;
import skytally.project.Values;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Typed;
import skytally.project.entry.ValueWords;
import skytally.project.entry.WhoCookie;
import skytally.project.entry.Words;
import skytally.web.InvalidInputException.Fault;

/** The schedules of all schemes, and a new type in one of them. */
@Controller
@RequestMapping("/projects/{id}/lights")
class LightsController {

    private static final String PAGE = "project/lights/page";

    private final ProjectDesk desk;
    private final ValueWords valueWords;
    private final Words words;

    LightsController(ProjectDesk desk, ValueWords valueWords, Words words) {
        this.desk = desk;
        this.valueWords = valueWords;
        this.words = words;
    }

    @GetMapping
    ModelAndView page(@PathVariable UUID id, @RequestParam MultiValueMap<String, String> sent) {
        KeptProject kept = desk.open(id);
        return with(desk.page(PAGE, kept, new Typed(sent)), kept, "", "", List.of());
    }

    @PostMapping
    ModelAndView add(
            @PathVariable UUID id, @RequestParam MultiValueMap<String, String> sent, HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Scheme scheme = Schemes.scheme(kept, typed.text("scheme"));
        String mark = typed.text("mark");
        Scheme changed;
        try {
            List<LuminaireType> more = new ArrayList<>(scheme.types());
            more.add(new LuminaireType(mark, Values.NONE));
            changed = scheme.with(more, scheme.placements());
        } catch (IllegalArgumentException refused) {
            Fault fault = new Fault("mark-" + scheme.mark(), String.valueOf(refused.getMessage()));
            return with(desk.refusal(PAGE, kept), kept, scheme.mark(), mark, List.of(fault));
        }
        desk.save(
                kept,
                kept.project().withScheme(changed),
                WhoCookie.in(request),
                "saving.type.added",
                mark,
                scheme.name());
        return desk.on(kept, "type-added", "lights", scheme.mark(), "types", mark);
    }

    private ModelAndView with(ModelAndView page, KeptProject kept, String refusedIn, String mark, List<Fault> faults) {
        return page.addObject("faults", faults)
                .addObject(
                        "schedules",
                        kept.project().schemes().stream()
                                .map(scheme -> Schedule.of(
                                        scheme, valueWords, words, scheme.mark().equals(refusedIn) ? mark : ""))
                                .toList());
    }
}
