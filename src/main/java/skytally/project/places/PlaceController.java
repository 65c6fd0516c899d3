package skytally.project.places;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.util.List;
import java.util.Set;
import java.util.UUID;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.server.ResponseStatusException;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.KeptProject;
import skytally.project.Place;
import skytally.project.Project;
import skytally.project.Values;
import skytally.project.entry.Heading;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Reading;
import skytally.project.entry.Typed;
import skytally.project.entry.ValueRow;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.ValuesForm;
import skytally.project.entry.WhoCookie;
import skytally.project.entry.Words;
import skytally.web.InvalidInputException.Fault;

/** One place: its values, what is looked at from it, its mark, and its removal. */
@Controller
@RequestMapping("/projects/{id}/places/{mark}")
class PlaceController {

    private static final String PAGE = "project/places/place";
    private static final List<Field> FIELDS = Fields.of(Field.Subject.PLACE);

    private final ProjectDesk desk;
    private final ValuesEditor editor;
    private final PlaceSpot spot;
    private final Words words;

    PlaceController(ProjectDesk desk, ValuesEditor editor, PlaceSpot spot, Words words) {
        this.desk = desk;
        this.editor = editor;
        this.spot = spot;
        this.words = words;
    }

    @GetMapping
    ModelAndView page(
            @PathVariable UUID id,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.open(id);
        return untouched(desk.page(PAGE, kept, typed), kept, place(kept, mark), Heading.of(typed, request), mark, null);
    }

    @PostMapping(params = "doing=save")
    ModelAndView save(
            @PathVariable UUID id,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request,
            HttpServletResponse response) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Place place = place(kept, mark);
        Heading heading = Heading.of(typed, request);
        Reading reading = editor.read(kept, FIELDS, place.values(), typed, heading, Set.of());
        PlaceSpot.Way way = wayTyped(typed);
        Reading move = editor.read(kept, moves(), Values.NONE, typed, heading, spot.required(way));
        for (Fault fault : move.form().faults()) {
            if (reading.form().faults().stream().noneMatch(fault::equals)) {
                reading = editor.refused(reading, fault.field(), fault.message());
            }
        }
        Directions directions =
                Directions.read(typed.text("looks"), typed.text("horizon"), typed.text("ground"), words);
        for (Directions.Unread unread : directions.faults()) {
            reading = editor.refused(reading, unread.text(), unread.message());
        }
        Values values = reading.values();
        if (reading.isValid() && way != PlaceSpot.Way.GRID) {
            String at = spot.fields(way).get(0).name();
            if (isPutByGridToo(place, values) || isTypedInTwoWays(typed)) {
                reading = editor.refused(reading, at, words.say("place.fault.both"));
            } else {
                try {
                    values = spot.put(values, move.values(), way, kept.project().site());
                } catch (IllegalArgumentException refused) {
                    reading = editor.refused(reading, at, String.valueOf(refused.getMessage()));
                }
            }
        }
        if (!reading.isValid()) {
            return with(
                    desk.refusal(PAGE, kept),
                    kept,
                    place,
                    reading.form(),
                    move.form().rows(),
                    mark,
                    new Texts(typed.text("looks"), typed.text("horizon"), typed.text("ground")));
        }
        Place changed = new Place(mark, values, directions.looks(), directions.horizon(), directions.ground());
        desk.save(kept, replaced(kept.project(), place, changed), heading.who(), "saving.place", mark);
        WhoCookie.keep(response, heading.who());
        return desk.on(kept, "saved", heading, "places", mark);
    }

    @PostMapping(params = "doing=rename")
    ModelAndView rename(
            @PathVariable UUID id,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Place place = place(kept, mark);
        String other = typed.text("mark");
        Project changed;
        try {
            changed = replaced(kept.project(), place, place.called(other));
        } catch (IllegalArgumentException refused) {
            return untouched(
                    desk.refusal(PAGE, kept),
                    kept,
                    place,
                    Heading.of(typed, request),
                    other,
                    String.valueOf(refused.getMessage()));
        }
        desk.save(kept, changed, WhoCookie.in(request), "saving.place.renamed", mark, other);
        return desk.on(kept, "place-renamed", "places", other);
    }

    @PostMapping(params = "doing=remove")
    ModelAndView remove(
            @PathVariable UUID id,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        KeptProject kept = desk.openForChange(id, new Typed(sent));
        Place place = place(kept, mark);
        Project changed = kept.project()
                .withPlaces(kept.project().places().stream()
                        .filter(other -> !other.equals(place))
                        .toList());
        desk.save(kept, changed, WhoCookie.in(request), "saving.place.removed", mark);
        return desk.on(kept, "place-removed", "places");
    }

    private static Place place(KeptProject kept, String mark) {
        return kept.project().place(mark).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    private static Project replaced(Project project, Place place, Place other) {
        return project.withPlaces(project.places().stream()
                .map(one -> one.equals(place) ? other : one)
                .toList());
    }

    private List<Field> moves() {
        return Stream.of(PlaceSpot.Way.POLAR, PlaceSpot.Way.GLOBE)
                .flatMap(way -> spot.fields(way).stream())
                .toList();
    }

    /** The way something is typed in; the grid if it is in none of the others. */
    private PlaceSpot.Way wayTyped(Typed typed) {
        return Stream.of(PlaceSpot.Way.POLAR, PlaceSpot.Way.GLOBE)
                .filter(way -> isTyped(way, typed))
                .findFirst()
                .orElse(PlaceSpot.Way.GRID);
    }

    private boolean isTypedInTwoWays(Typed typed) {
        return isTyped(PlaceSpot.Way.POLAR, typed) && isTyped(PlaceSpot.Way.GLOBE, typed);
    }

    private boolean isTyped(PlaceSpot.Way way, Typed typed) {
        return spot.fields(way).stream()
                .anyMatch(field -> !typed.text(field.name()).isEmpty());
    }

    private static boolean isPutByGridToo(Place place, Values values) {
        return !values.get("east").equals(place.values().get("east"))
                || !values.get("north").equals(place.values().get("north"));
    }

    private ModelAndView untouched(
            ModelAndView page,
            KeptProject kept,
            Place place,
            Heading heading,
            String mark,
            @Nullable String markFault) {
        ValuesForm form = editor.form(kept, FIELDS, place.values(), heading);
        ValuesForm told = markFault == null
                ? form
                : editor.refused(new Reading(place.values(), form), "mark", markFault)
                        .form();
        List<ValueRow> move = editor.form(kept, moves(), Values.NONE, heading).rows();
        return with(
                page,
                kept,
                place,
                told,
                move,
                mark,
                new Texts(
                        Directions.looks(place.looks()),
                        Directions.horizon(place.horizon()),
                        Directions.ground(place.ground())));
    }

    /** What stands in the boxes of several lines. */
    public record Texts(String looks, String horizon, String ground) {}

    private ModelAndView with(
            ModelAndView page,
            KeptProject kept,
            Place place,
            ValuesForm form,
            List<ValueRow> move,
            String mark,
            Texts texts) {
        return page.addObject("form", form)
                .addObject("place", place)
                .addObject("move", move)
                .addObject("mark", mark)
                .addObject("texts", texts)
                .addObject("said", place.values().byField().size())
                .addObject(
                        "where", spot.whereabouts(place.values(), kept.project().site()));
    }
}
