package skytally.project.lights;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
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
import skytally.project.KeptProject;
import skytally.project.LuminaireType;
import skytally.project.Outline;
import skytally.project.Placement;
import skytally.project.Scheme;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.project.entry.AskedFields;
import skytally.project.entry.Heading;
import skytally.project.entry.Option;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Reading;
import skytally.project.entry.Spot;
import skytally.project.entry.Typed;
import skytally.project.entry.ValueWords;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.ValuesForm;
import skytally.project.entry.WhoCookie;
import skytally.project.entry.Words;

/** The lights of one scheme on the plan: all of them, more of them, fewer of them. */
@Controller
@RequestMapping("/projects/{id}/lights/{schemeMark}/positions")
class PositionsController {

    private static final String PAGE = "project/lights/positions";

    private final ProjectDesk desk;
    private final ValuesEditor editor;
    private final AskedFields asked;
    private final Layout layout;
    private final ValueWords valueWords;
    private final Words words;

    PositionsController(
            ProjectDesk desk,
            ValuesEditor editor,
            AskedFields asked,
            Layout layout,
            ValueWords valueWords,
            Words words) {
        this.desk = desk;
        this.editor = editor;
        this.asked = asked;
        this.layout = layout;
        this.valueWords = valueWords;
        this.words = words;
    }

    @GetMapping
    ModelAndView page(
            @PathVariable UUID id,
            @PathVariable String schemeMark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.open(id);
        Scheme scheme = Schemes.scheme(kept, schemeMark);
        List<Field> fields = Way.of(typed.text("add")).fields(asked);
        ValuesForm form = editor.form(kept, fields, Values.NONE, Heading.of(typed, request));
        return with(desk.page(PAGE, kept, typed), kept, scheme, typed, form);
    }

    @PostMapping(params = "doing=add")
    ModelAndView add(
            @PathVariable UUID id,
            @PathVariable String schemeMark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request,
            HttpServletResponse response) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Scheme scheme = Schemes.scheme(kept, schemeMark);
        Way way = Way.of(typed.text("add"));
        Heading heading = Heading.of(typed, request);
        Reading reading = editor.read(kept, way.fields(asked), Values.NONE, typed, heading, way.required());
        String type = typed.text("type");
        if (scheme.type(type).isEmpty()) {
            reading = editor.refused(reading, "type", words.say("position.fault.type"));
        }
        if (reading.isValid()
                && !reading.values().text("aim").isEmpty()
                && !reading.values().text("bearing").isEmpty()) {
            reading = editor.refused(reading, "aim", words.say("position.fault.aim"));
        }
        if (reading.isValid()) {
            try {
                List<Placement> more = layout.lights(
                        way, scheme, scheme.type(type).orElseThrow(), typed.text("mark"), reading.values());
                List<Placement> all = new ArrayList<>(scheme.placements());
                all.addAll(more);
                desk.save(
                        kept,
                        kept.project().withScheme(scheme.with(scheme.types(), all)),
                        heading.who(),
                        "saving.lights.added",
                        more.size(),
                        type,
                        scheme.name());
                WhoCookie.keep(response, heading.who());
                return desk.on(kept, "lights-added", more.size(), heading, "lights", scheme.mark(), "positions");
            } catch (IllegalArgumentException refused) {
                reading = editor.refused(reading, faulty(way, reading.values()), String.valueOf(refused.getMessage()));
            }
        }
        return with(desk.refusal(PAGE, kept), kept, scheme, typed, reading.form());
    }

    @PostMapping(params = "doing=remove")
    ModelAndView remove(
            @PathVariable UUID id,
            @PathVariable String schemeMark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Scheme scheme = Schemes.scheme(kept, schemeMark);
        Set<String> gone = Set.copyOf(typed.all("light"));
        List<Placement> left = scheme.placements().stream()
                .filter(light -> !gone.contains(light.mark()))
                .toList();
        int removed = scheme.placements().size() - left.size();
        desk.save(
                kept,
                kept.project().withScheme(scheme.with(scheme.types(), left)),
                WhoCookie.in(request),
                "saving.lights.removed",
                removed,
                scheme.name());
        return desk.on(
                kept,
                removed == 0 ? "lights-none" : "lights-removed",
                removed,
                Heading.NONE,
                "lights",
                scheme.mark(),
                "positions");
    }

    /** The box most likely at fault for what could not be made. */
    private static String faulty(Way way, Values said) {
        if (!said.text("heads").isEmpty()) {
            return "heads";
        }
        return switch (way) {
            case GRID, POLAR -> "mark";
            case ROW, RING -> "howMany";
            case BLOCK -> "rows";
        };
    }

    private ModelAndView with(ModelAndView page, KeptProject kept, Scheme scheme, Typed typed, ValuesForm form) {
        String type = typed.text("type");
        return page.addObject("form", form)
                .addObject("scheme", scheme)
                .addObject("plan", Plan.of(scheme, shown(scheme, typed), pageNumber(typed), valueWords, words))
                .addObject(
                        "counts",
                        scheme.types().stream()
                                .map(one -> count(scheme, one, kept.project().site()))
                                .toList())
                .addObject(
                        "types",
                        scheme.types().stream()
                                .map(one -> new Option(one.mark(), named(one)))
                                .toList())
                .addObject("typeChosen", type)
                .addObject("mark", typed.text("mark"))
                .addObject("ways", Way.words())
                .addObject("wayChosen", Way.of(typed.text("add")).word());
    }

    /** A type narrows the table only where it is asked for by an address, not by the form for more lights. */
    private static String shown(Scheme scheme, Typed typed) {
        String type = typed.text("type");
        return typed.has("add") || scheme.type(type).isEmpty() ? "" : type;
    }

    private static int pageNumber(Typed typed) {
        String page = typed.text("page");
        return page.matches("\\d{1,6}") ? Integer.parseInt(page) : 0;
    }

    private static String named(LuminaireType type) {
        String use = type.values().text("use");
        return use.isEmpty() ? type.mark() : type.mark() + " " + use;
    }

    private String count(Scheme scheme, LuminaireType type, Values site) {
        Optional<BigDecimal> scheduled = Amount.of(type.values().get("count").inUse());
        int placed = scheme.placementsOf(type.mark()).size();
        if (scheduled.isEmpty()) {
            return words.say("positions.count.open", type.mark(), placed);
        }
        int missing = scheduled.get().intValue() - placed;
        String count =
                words.say("positions.count", type.mark(), placed, type.values().text("count"));
        return missing <= 0 ? count : words.say("positions.count.centre", count, missing, centre(site));
    }

    private String centre(Values site) {
        return Outline.of(site)
                .map(Outline::centroid)
                .map(corner -> words.say("positions.centre", Spot.metres(corner.eastM()), Spot.metres(corner.northM())))
                .orElseGet(() -> words.say("positions.centre.none"));
    }
}
