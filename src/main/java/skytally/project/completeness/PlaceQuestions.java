package skytally.project.completeness;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import skytally.geometry.Position;
import skytally.notation.QuantityFormat;
import skytally.project.Place;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.entry.Spot;
import skytally.scene.State;

/** What is asked of the places people look from. */
final class PlaceQuestions {

    /** An eye this far above its ground is behind an upstairs window; common practice, no source. */
    private static final double UPSTAIRS_M = 3;

    private final Project project;
    private final List<Spot> lights;

    PlaceQuestions(Project project, Scheme scheme) {
        this.project = project;
        this.lights = scheme.placements().stream()
                .map(Placement::values)
                .flatMap(values -> Spot.of(values).stream())
                .toList();
    }

    /** The nearest window that is upstairs, or may be. */
    Answer window() {
        List<Place> windows = ofKind("home-window").toList();
        Optional<Place> nearest = windows.stream()
                .filter(place -> Told.number(place.values(), "eyeHeight").orElse(UPSTAIRS_M) >= UPSTAIRS_M)
                .min(Comparator.comparingDouble(this::nearestLightM));
        if (nearest.isEmpty()) {
            return answer(Question.WINDOW, Reply.NO, windows.isEmpty() ? "none" : "downstairs", windows.size());
        }
        return window(nearest.get());
    }

    private Answer window(Place place) {
        if (isOpen(place, "eyeHeight")) {
            return at(place, Question.WINDOW, Reply.NOT_KNOWN, "height", "#eyeHeight", name(place));
        }
        String height = Told.typed(place.values(), "eyeHeight");
        if (Spot.of(place.values()).isEmpty()) {
            return at(place, Question.WINDOW, Reply.NOT_KNOWN, "nowhere", "", name(place), height);
        }
        if (isOpen(place, "facing")) {
            return at(place, Question.WINDOW, Reply.NOT_KNOWN, "facing", "#facing", name(place), height);
        }
        return at(
                place,
                Question.WINDOW,
                Reply.YES,
                lights.isEmpty() ? "from-reference" : "nearest",
                "",
                name(place),
                height,
                Told.typed(place.values(), "facing"),
                Told.metres(nearestLightM(place)));
    }

    /** Along the ground to the nearest light of the plan, or to the reference point where it has none. */
    private double nearestLightM(Place place) {
        return Spot.of(place.values()).stream()
                .flatMapToDouble(spot -> Stream.concat(
                                lights.stream(), lights.isEmpty() ? Stream.of(new Spot(0, 0)) : Stream.empty())
                        .mapToDouble(light -> at(light).groundDistanceTo(at(spot))))
                .min()
                .orElse(Double.POSITIVE_INFINITY);
    }

    Answer observatory() {
        List<Place> named =
                Stream.concat(ofKind("observatory"), ofKind("reserve-boundary")).toList();
        Optional<Place> placed = named.stream()
                .filter(place -> Spot.of(place.values()).isPresent())
                .min(Comparator.comparingDouble(PlaceQuestions::fromReferenceM));
        if (named.isEmpty()) {
            long viewing = ofKind("viewing-place").count();
            return answer(Question.OBSERVATORY, Reply.NO, viewing == 0 ? "none" : "only-viewing", viewing);
        }
        if (placed.isEmpty()) {
            return at(named.get(0), Question.OBSERVATORY, Reply.NOT_KNOWN, "nowhere", "", name(named.get(0)));
        }
        Place nearest = placed.get();
        Spot spot = Spot.of(nearest.values()).orElseThrow();
        double bearing = (StrictMath.toDegrees(new Position(0, 0, 0).bearingTo(at(spot))) + 360) % 360;
        return at(
                nearest,
                Question.OBSERVATORY,
                Reply.YES,
                named.size() == 1 ? "named" : "named-and-more",
                "",
                name(nearest),
                Told.metres(fromReferenceM(nearest)),
                QuantityFormat.decimals(bearing, 0).plain(),
                named.size() - 1);
    }

    private static double fromReferenceM(Place place) {
        return new Position(0, 0, 0).groundDistanceTo(at(Spot.of(place.values()).orElseThrow()));
    }

    private static Position at(Spot spot) {
        return new Position(spot.eastM(), spot.northM(), 0);
    }

    private Stream<Place> ofKind(String kind) {
        return project.places().stream()
                .filter(place -> place.values().text("kind").equals(kind));
    }

    private static boolean isOpen(Place place, String field) {
        return place.values().get(field).inUse().state() == State.NOT_KNOWN;
    }

    private static String name(Place place) {
        String what = place.values().text("what");
        return what.isEmpty() ? place.mark() : place.mark() + ", " + what;
    }

    private static Answer answer(Question question, Reply reply, String says, Object... with) {
        return new Answer(question, reply, says, List.of(with), "places", "places", "");
    }

    private static Answer at(Place place, Question question, Reply reply, String says, String anchor, Object... with) {
        return new Answer(
                question, reply, says, List.of(with), "places/" + place.mark() + anchor, "place", place.mark());
    }
}
