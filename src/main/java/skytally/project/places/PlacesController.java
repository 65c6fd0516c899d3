package skytally.project.places;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.UUID;
import java.util.stream.Stream;
import org.springframework.stereotype.Controller;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.Field;
import skytally.project.Field.Subject;
import skytally.project.Fields;
import skytally.project.KeptProject;
import skytally.project.Place;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.entry.Cell;
import skytally.project.entry.Heading;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Reading;
import skytally.project.entry.Spot;
import skytally.project.entry.Typed;
import skytally.project.entry.ValueWords;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.ValuesForm;
import skytally.project.entry.WhoCookie;
import skytally.project.entry.Words;

/** The places people look from, and a new one. */
@Controller
@RequestMapping("/projects/{id}/places")
class PlacesController {

    private static final String PAGE = "project/places/page";
    private static final String POLAR = "polar";
    private static final List<String> WAYS = List.of("grid", POLAR);
    private static final List<Field> COLUMNS =
            fields("what", "kind", "east", "north", "groundHeight", "eyeHeight", "facing");

    private final ProjectDesk desk;
    private final ValuesEditor editor;
    private final PlaceSpot spot;
    private final ValueWords valueWords;
    private final Words words;

    PlacesController(ProjectDesk desk, ValuesEditor editor, PlaceSpot spot, ValueWords valueWords, Words words) {
        this.desk = desk;
        this.editor = editor;
        this.spot = spot;
        this.valueWords = valueWords;
        this.words = words;
    }

    /**
     * A place in the table.
     *
     * @param mark  of it
     * @param cells its values
     * @param polar distance and bearing from the reference point, or that it has no position
     * @param looks how many directions are looked at from it
     */
    record Line(String mark, List<Cell> cells, String polar, int looks) {}

    @GetMapping
    ModelAndView page(
            @PathVariable UUID id, @RequestParam MultiValueMap<String, String> sent, HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.open(id);
        ValuesForm form = editor.form(kept, asked(typed), Values.NONE, Heading.of(typed, request));
        return with(desk.page(PAGE, kept, typed), kept, typed, form);
    }

    @PostMapping
    ModelAndView add(
            @PathVariable UUID id,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request,
            HttpServletResponse response) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Heading heading = Heading.of(typed, request);
        boolean polar = isPolar(typed);
        Set<String> required = polar ? Set.of(PlaceSpot.DISTANCE, PlaceSpot.DIRECTION) : Set.of();
        Reading reading = editor.read(kept, asked(typed), Values.NONE, typed, heading, required);
        String mark = typed.text("mark");
        if (reading.isValid()) {
            try {
                Values values = polar ? spot.put(kept(reading.values()), reading.values()) : reading.values();
                List<Place> more = new ArrayList<>(kept.project().places());
                more.add(new Place(mark, values, List.of(), List.of()));
                desk.save(kept, kept.project().withPlaces(more), heading.who(), "saving.place.added", mark);
                WhoCookie.keep(response, heading.who());
                return desk.on(kept, "place-added", heading, "places");
            } catch (IllegalArgumentException refused) {
                reading = editor.refused(reading, "mark", String.valueOf(refused.getMessage()));
            }
        }
        return with(desk.refusal(PAGE, kept), kept, typed, reading.form());
    }

    private static List<Field> fields(String... names) {
        return Stream.of(names)
                .map(name -> Fields.find(Subject.PLACE, name).orElseThrow())
                .toList();
    }

    private List<Field> asked(Typed typed) {
        List<Field> where = isPolar(typed) ? spot.fields() : fields("east", "north");
        return Stream.of(fields("what", "kind"), where, fields("groundHeight", "eyeHeight", "facing"))
                .flatMap(List::stream)
                .toList();
    }

    private static boolean isPolar(Typed typed) {
        return typed.text("add").equals(POLAR);
    }

    /** Without what the position is worked out from. */
    private static Values kept(Values read) {
        Map<String, Stated> kept = new TreeMap<>(read.byField());
        kept.remove(PlaceSpot.DISTANCE);
        kept.remove(PlaceSpot.DIRECTION);
        return new Values(kept);
    }

    private ModelAndView with(ModelAndView page, KeptProject kept, Typed typed, ValuesForm form) {
        return page.addObject("form", form)
                .addObject(
                        "lines",
                        kept.project().places().stream().map(this::line).toList())
                .addObject("mark", typed.text("mark"))
                .addObject("ways", WAYS)
                .addObject("wayChosen", isPolar(typed) ? POLAR : WAYS.get(0));
    }

    private Line line(Place place) {
        return new Line(
                place.mark(),
                COLUMNS.stream()
                        .map(field -> valueWords.cell(
                                words.say("place.column." + field.name()),
                                field,
                                place.values().get(field.name())))
                        .toList(),
                Spot.of(place.values())
                        .map(where -> where.fromReference(words))
                        .orElseGet(() -> words.say("position.none")),
                place.looks().size());
    }
}
