package skytally.project.lights;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.util.List;
import java.util.Set;
import java.util.UUID;
import org.springframework.stereotype.Controller;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.KeptProject;
import skytally.project.Placement;
import skytally.project.Scheme;
import skytally.project.entry.Heading;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Reading;
import skytally.project.entry.Typed;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.ValuesForm;
import skytally.project.entry.WhoCookie;

/** One light of the plan. */
@Controller
@RequestMapping("/projects/{id}/lights/{schemeMark}/positions/{mark}")
class LightController {

    private static final String PAGE = "project/lights/light";
    private static final List<Field> FIELDS = Fields.of(Field.Subject.LIGHT);

    private final ProjectDesk desk;
    private final ValuesEditor editor;

    LightController(ProjectDesk desk, ValuesEditor editor) {
        this.desk = desk;
        this.editor = editor;
    }

    @GetMapping
    ModelAndView page(
            @PathVariable UUID id,
            @PathVariable String schemeMark,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.open(id);
        Scheme scheme = Schemes.scheme(kept, schemeMark);
        Placement light = Schemes.light(scheme, mark);
        return with(
                desk.page(PAGE, kept, typed),
                scheme,
                light,
                editor.form(kept, FIELDS, light.values(), Heading.of(typed, request)));
    }

    @PostMapping
    ModelAndView save(
            @PathVariable UUID id,
            @PathVariable String schemeMark,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request,
            HttpServletResponse response) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Scheme scheme = Schemes.scheme(kept, schemeMark);
        Placement light = Schemes.light(scheme, mark);
        Heading heading = Heading.of(typed, request);
        Reading reading = editor.read(kept, FIELDS, light.values(), typed, heading, Set.of());
        if (!reading.isValid()) {
            return with(desk.refusal(PAGE, kept), scheme, light, reading.form());
        }
        Scheme changed = scheme.with(
                scheme.types(),
                scheme.placements().stream()
                        .map(one -> one.equals(light) ? new Placement(mark, light.type(), reading.values()) : one)
                        .toList());
        desk.save(kept, kept.project().withScheme(changed), heading.who(), "saving.light", mark, scheme.name());
        WhoCookie.keep(response, heading.who());
        return desk.on(kept, "saved", heading, "lights", scheme.mark(), "positions", mark);
    }

    private static ModelAndView with(ModelAndView page, Scheme scheme, Placement light, ValuesForm form) {
        return page.addObject("form", form).addObject("scheme", scheme).addObject("light", light);
    }
}
