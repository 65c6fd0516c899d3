package skytally.project.lights;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.time.Clock;
import java.time.LocalDate;
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
import skytally.project.LuminaireType;
import skytally.project.Placement;
import skytally.project.Scheme;
import skytally.project.ShapeFromWords;
import skytally.project.Values;
import skytally.project.entry.Heading;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Reading;
import skytally.project.entry.Typed;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.ValuesForm;
import skytally.project.entry.WhoCookie;
import skytally.project.entry.Words;

/** One type of the schedule: its values, its mark, and its removal. */
@Controller
@RequestMapping("/projects/{id}/lights/{schemeMark}/types/{mark}")
class TypeController {

    private static final String PAGE = "project/lights/type";
    private static final List<Field> FIELDS = Fields.of(Field.Subject.TYPE);

    private final ProjectDesk desk;
    private final ValuesEditor editor;
    private final Words words;
    private final Clock clock = Clock.systemDefaultZone();

    TypeController(ProjectDesk desk, ValuesEditor editor, Words words) {
        this.desk = desk;
        this.editor = editor;
        this.words = words;
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
        LuminaireType type = Schemes.type(scheme, mark);
        ValuesForm form = editor.form(kept, FIELDS, type.values(), Heading.of(typed, request));
        return with(desk.page(PAGE, kept, typed), scheme, type, form, mark);
    }

    @PostMapping(params = "doing=save")
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
        LuminaireType type = Schemes.type(scheme, mark);
        Heading heading = Heading.of(typed, request);
        Reading reading = editor.read(kept, FIELDS, type.values(), typed, heading, Set.of());
        if (!reading.isValid()) {
            return with(desk.refusal(PAGE, kept), scheme, type, reading.form(), mark);
        }
        Values values = ShapeFromWords.added(
                type.values(), reading.values(), LocalDate.now(clock).toString());
        LuminaireType changed = new LuminaireType(mark, values);
        desk.save(
                kept,
                kept.project().withScheme(scheme.with(replaced(scheme, type, changed), scheme.placements())),
                heading.who(),
                "saving.type",
                mark,
                scheme.name());
        WhoCookie.keep(response, heading.who());
        String done = values.equals(reading.values()) ? "saved" : "saved-shape";
        return desk.on(kept, done, heading, "lights", scheme.mark(), "types", mark);
    }

    @PostMapping(params = "doing=rename")
    ModelAndView rename(
            @PathVariable UUID id,
            @PathVariable String schemeMark,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Scheme scheme = Schemes.scheme(kept, schemeMark);
        LuminaireType type = Schemes.type(scheme, mark);
        String other = typed.text("mark");
        Scheme changed;
        try {
            changed = scheme.with(
                    replaced(scheme, type, new LuminaireType(other, type.values())),
                    scheme.placements().stream()
                            .map(light -> light.type().equals(mark)
                                    ? new Placement(light.mark(), other, light.values())
                                    : light)
                            .toList());
        } catch (IllegalArgumentException refused) {
            ValuesForm form = editor.form(kept, FIELDS, type.values(), Heading.of(new Typed(sent), request));
            Reading reading =
                    editor.refused(new Reading(type.values(), form), "mark", String.valueOf(refused.getMessage()));
            return with(desk.refusal(PAGE, kept), scheme, type, reading.form(), other);
        }
        desk.save(
                kept,
                kept.project().withScheme(changed),
                WhoCookie.in(request),
                "saving.type.renamed",
                mark,
                other,
                scheme.name());
        return desk.on(kept, "type-renamed", "lights", scheme.mark(), "types", other);
    }

    @PostMapping(params = "doing=remove")
    ModelAndView remove(
            @PathVariable UUID id,
            @PathVariable String schemeMark,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        KeptProject kept = desk.openForChange(id, new Typed(sent));
        Scheme scheme = Schemes.scheme(kept, schemeMark);
        LuminaireType type = Schemes.type(scheme, mark);
        Scheme changed = scheme.with(
                scheme.types().stream().filter(other -> !other.equals(type)).toList(),
                scheme.placements().stream()
                        .filter(light -> !light.type().equals(mark))
                        .toList());
        desk.save(
                kept,
                kept.project().withScheme(changed),
                WhoCookie.in(request),
                "saving.type.removed",
                mark,
                scheme.name());
        return desk.on(kept, "type-removed", "lights");
    }

    private static List<LuminaireType> replaced(Scheme scheme, LuminaireType type, LuminaireType other) {
        return scheme.types().stream()
                .map(one -> one.equals(type) ? other : one)
                .toList();
    }

    private ModelAndView with(ModelAndView page, Scheme scheme, LuminaireType type, ValuesForm form, String mark) {
        return page.addObject("form", form)
                .addObject("scheme", scheme)
                .addObject("type", type)
                .addObject("mark", mark)
                .addObject("groups", TypeGroup.of(form.rows()))
                .addObject("hang", TypeHang.of(type, scheme.placementsOf(type.mark()), words))
                .addObject("placed", scheme.placementsOf(type.mark()).size())
                .addObject("said", type.values().byField().size())
                .addObject("tally", Schedule.tally(List.of(type.values())));
    }
}
