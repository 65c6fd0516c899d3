package skytally.project.site;

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
import skytally.project.entry.Heading;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Reading;
import skytally.project.entry.Tally;
import skytally.project.entry.Typed;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.ValuesForm;
import skytally.project.entry.WhoCookie;

/** What is said of the site. */
@Controller
@RequestMapping("/projects/{id}/site")
class SiteController {

    private static final List<Field> FIELDS = Fields.of(Field.Subject.SITE);

    private final ProjectDesk desk;
    private final ValuesEditor editor;

    SiteController(ProjectDesk desk, ValuesEditor editor) {
        this.desk = desk;
        this.editor = editor;
    }

    @GetMapping
    ModelAndView page(
            @PathVariable UUID id, @RequestParam MultiValueMap<String, String> sent, HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.open(id);
        return with(
                desk.page("project/site/page", kept, typed),
                kept,
                editor.form(kept, FIELDS, kept.project().site(), Heading.of(typed, request)));
    }

    @PostMapping
    ModelAndView save(
            @PathVariable UUID id,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request,
            HttpServletResponse response) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Heading heading = Heading.of(typed, request);
        Reading reading = editor.read(kept, FIELDS, kept.project().site(), typed, heading, Set.of());
        if (!reading.isValid()) {
            return with(desk.refusal("project/site/page", kept), kept, reading.form());
        }
        desk.save(kept, kept.project().withSite(reading.values()), heading.who(), "saving.site");
        WhoCookie.keep(response, heading.who());
        return desk.on(kept, "saved", heading, "site");
    }

    private static ModelAndView with(ModelAndView page, KeptProject kept, ValuesForm form) {
        return page.addObject("form", form)
                .addObject("tally", Tally.of(FIELDS, List.of(kept.project().site())));
    }
}
