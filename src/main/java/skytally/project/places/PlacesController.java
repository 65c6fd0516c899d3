package skytally.project.places;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
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
import skytally.project.Globe;
import skytally.project.KeptProject;
import skytally.project.Place;
import skytally.project.Values;
import skytally.project.entry.Cell;
import skytally.project.entry.Heading;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Reading;
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
    private static final List<Field> COLUMNS = fields("what", "kind", "groundHeight", "eyeHeight", "facing");

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
     * @param where it is, in each way
     * @param looks how many directions are looked at from it
     */
    record Line(String mark, List<Cell> cells, PlaceSpot.Whereabouts where, int looks) {}

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
        PlaceSpot.Way way = way(typed);
        Reading reading = editor.read(kept, asked(typed), Values.NONE, typed, heading, spot.required(way));
        Values values = reading.values();
        if (reading.isValid()) {
            try {
                values = spot.put(
                        PlaceSpot.kept(values), values, way, kept.project().site());
            } catch (IllegalArgumentException refused) {
                reading = editor.refused(reading, spot.fields(way).get(0).name(), String.valueOf(refused.getMessage()));
            }
        }
        String mark = typed.text("mark");
        if (reading.isValid()) {
            try {
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
        PlaceSpot.Way way = way(typed);
        List<Field> where = way == PlaceSpot.Way.GRID ? fields("east", "north") : spot.fields(way);
        return Stream.of(fields("what", "kind"), where, fields("groundHeight", "eyeHeight", "facing"))
                .flatMap(List::stream)
                .toList();
    }

    private static PlaceSpot.Way way(Typed typed) {
        return Arrays.stream(PlaceSpot.Way.values())
                .filter(way -> way.word().equals(typed.text("add")))
                .findFirst()
                .orElse(PlaceSpot.Way.GRID);
    }

    private ModelAndView with(ModelAndView page, KeptProject kept, Typed typed, ValuesForm form) {
        return page.addObject("form", form)
                .addObject(
                        "lines",
                        kept.project().places().stream()
                                .map(place -> line(place, kept.project().site()))
                                .toList())
                .addObject("mark", typed.text("mark"))
                .addObject(
                        "ways",
                        Arrays.stream(PlaceSpot.Way.values())
                                .map(PlaceSpot.Way::word)
                                .toList())
                .addObject("wayChosen", way(typed).word())
                .addObject("onGlobe", Globe.of(kept.project().site()).isPresent());
    }

    private Line line(Place place, Values site) {
        return new Line(
                place.mark(),
                COLUMNS.stream()
                        .map(field -> valueWords.cell(
                                words.say("place.column." + field.name()),
                                field,
                                place.values().get(field.name())))
                        .toList(),
                spot.whereabouts(place.values(), site),
                place.looks().size());
    }
}
