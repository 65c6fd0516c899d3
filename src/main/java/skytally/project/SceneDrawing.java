package skytally.project;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.luminaire.FittedShape;
import skytally.photometry.LuminousFlux;
import skytally.project.Field.Subject;
import skytally.scene.GroundLine;
import skytally.scene.Known;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.OpenScene;
import skytally.scene.Pane;
import skytally.scene.Present;
import skytally.scene.Property;
import skytally.scene.Scene;
import skytally.scene.Surroundings;
import skytally.spectrum.SpectralClasses;

/**
 * Draws the scene of one scheme of a project, and is the only class that does: typed units become SI, a light's own
 * height and tilt come before its type's, and what is not known is stood in for by the catalogue.
 *
 * <p>Outputs are those stated; where none is, those that the hours give. Heights are reckoned from the lowest ground of
 * any light or place, so that none is negative. Existing lights stay unless they are marked as removed. A type without
 * lumens and without watts, or without a count and a position, is left out and named; a light without a position counts
 * for the sky alone, from the middle of the site (or the reference point where no outline is known), and is named. A
 * light that is not the same all round and has no bearing faces true north and is named: to turn it toward each place in
 * turn would be a different proposal for each of them.
 */
public final class SceneDrawing {

    private static final double GLARE_ANGLE_RAD = Math.toRadians(10);
    private static final double NEAREST_LAMP_M = 0.1;
    private static final double LOW_SKY_RAD = Math.toRadians(30);
    /** A driver looks this far below the level (CIE 140 and EN 13201-3, from memory). */
    private static final double ROAD_DIP_RAD = Math.toRadians(1);

    /** Before the mark of a type that is there already, beside the types of a scheme. */
    public static final String EXISTING = "existing-";

    private static final List<String> COMPASS = List.of("north", "east", "south", "west");

    private final Project project;
    private final Period period;
    private final double baseM;
    private final List<Lamp> lamps = new ArrayList<>();
    private final List<Lamp> adrift = new ArrayList<>();
    private final List<Lamp> present = new ArrayList<>();
    private final List<String> leftOut = new ArrayList<>();
    private final List<String> unplaced = new ArrayList<>();
    private final List<String> unaimed = new ArrayList<>();
    private final Map<String, Map<Property, Known>> known = new HashMap<>();

    /** Before the curfew or after it: which of a type's outputs counts. */
    public enum Period {
        EARLY("earlyOutput"),
        LATE("lateOutput");

        private final String outputField;

        Period(String outputField) {
            this.outputField = outputField;
        }
    }

    private SceneDrawing(Project project, Scheme scheme, Period period) {
        this.project = project;
        this.period = period;
        this.baseM = lowestGroundM(project, scheme);
        draw(scheme);
        if (scheme.kind() != Scheme.Kind.EXISTING) {
            project.schemes().stream()
                    .filter(other -> other.kind() == Scheme.Kind.EXISTING)
                    .forEach(this::drawBeside);
        }
    }

    /**
     * What was drawn.
     *
     * @param scene    to be assessed; without ranges
     * @param leftOut  marks of types that could not be reckoned with, so that sums are "at least"
     * @param unplaced marks of types some of whose lights have no position
     * @param unaimed  marks of types some of whose lights face nobody knows where, although it matters
     */
    public record Drawn(OpenScene scene, List<String> leftOut, List<String> unplaced, List<String> unaimed) {}

    /** The scene of one scheme in one period of the night, in the air the project states. */
    public static Drawn of(Project project, Scheme scheme, Period period) {
        return of(project, scheme, period, Optional.empty());
    }

    /** The same in another air. */
    public static Drawn of(Project project, Scheme scheme, Period period, Optional<Clearness> air) {
        SceneDrawing drawing = new SceneDrawing(project, scheme, period);
        Scene scene = new Scene(
                drawing.lamps,
                drawing.adrift,
                drawing.observers(),
                drawing.surroundings(air),
                Optional.of(drawing.present()),
                drawing.boundary());
        return new Drawn(
                drawing.open(scene),
                List.copyOf(drawing.leftOut),
                List.copyOf(drawing.unplaced),
                List.copyOf(drawing.unaimed));
    }

    private OpenScene open(Scene scene) {
        Map<String, Map<Property, Known>> states = Map.copyOf(known);
        return new OpenScene() {
            @Override
            public List<String> guesses() {
                return List.of();
            }

            @Override
            public Scene drawn(Map<String, End> ends) {
                return scene;
            }

            @Override
            public Known known(Property property, String mark) {
                return states.getOrDefault(mark, Map.of())
                        .getOrDefault(property, Known.workedOut("the project's values"));
            }
        };
    }

    private static double lowestGroundM(Project project, Scheme scheme) {
        double site = number(Subject.SITE, "groundHeight", project.site()).orElse(0);
        Stream<Values> lights = Stream.concat(
                        Stream.of(scheme),
                        project.schemes().stream().filter(other -> other.kind() == Scheme.Kind.EXISTING))
                .flatMap(each -> each.placements().stream())
                .map(Placement::values);
        double lights0 = lights.mapToDouble(
                        each -> number(Subject.LIGHT, "groundHeight", each).orElse(site))
                .min()
                .orElse(site);
        double places = project.places().stream()
                .mapToDouble(place ->
                        number(Subject.PLACE, "groundHeight", place.values()).orElse(site))
                .min()
                .orElse(site);
        return Math.min(site, Math.min(lights0, places));
    }

    /** The lights of one type, as far as it can be reckoned with. */
    private record Drawing(List<Lamp> placed, List<Lamp> adrift) {

        static final Drawing NOTHING = new Drawing(List.of(), List.of());
    }

    private void draw(Scheme scheme) {
        Map<String, List<Placement>> byType = byType(scheme);
        for (LuminaireType type : scheme.types()) {
            Drawing drawn = drawn(type, type.mark(), byType.getOrDefault(type.mark(), List.of()));
            lamps.addAll(drawn.placed());
            adrift.addAll(drawn.adrift());
            if (scheme.kind() == Scheme.Kind.EXISTING) {
                present.addAll(drawn.placed());
                present.addAll(drawn.adrift());
            }
        }
    }

    /** What is there now, under marks of its own beside a scheme; it stays unless it is marked as removed. */
    private void drawBeside(Scheme existing) {
        Map<String, List<Placement>> byType = byType(existing);
        for (LuminaireType type : existing.types()) {
            Drawing drawn = drawn(type, EXISTING + type.mark(), byType.getOrDefault(type.mark(), List.of()));
            present.addAll(drawn.placed());
            present.addAll(drawn.adrift());
            if (!type.values().text("fate").equals("removed")) {
                lamps.addAll(drawn.placed());
                adrift.addAll(drawn.adrift());
            }
        }
    }

    private static Map<String, List<Placement>> byType(Scheme scheme) {
        Map<String, List<Placement>> byType = new HashMap<>();
        scheme.placements()
                .forEach(light -> byType.computeIfAbsent(light.type(), type -> new ArrayList<>())
                        .add(light));
        return byType;
    }

    private Drawing drawn(LuminaireType type, String mark, List<Placement> lights) {
        TypeLight light = TypeLight.of(type.values());
        OptionalDouble stated = number(Subject.TYPE, "count", type.values());
        if (light.lumens().isEmpty() || (stated.isEmpty() && lights.isEmpty())) {
            leftOut.add(mark);
            return Drawing.NOTHING;
        }
        LampType lamp = new LampType(mark, type.values(), light, light.lumens().get());
        int count = (int) stated.orElse(lights.size());
        List<Lamp> placed = lights.stream().map(lamp::hung).toList();
        List<Lamp> rest = count > placed.size() ? List.of(lamp.atCentre(count - placed.size())) : List.of();
        if (!rest.isEmpty()) {
            unplaced.add(mark);
        }
        if (lamp.lacksBearing) {
            unaimed.add(mark);
        }
        known.put(mark, lamp.states());
        return new Drawing(placed, rest);
    }

    /** What all lights of one type have in common. */
    private final class LampType {

        private final String mark;
        private final Values values;
        private final TypeLight light;
        private final TypeLight.Amount lumens;
        private final Reading spectralClass;
        private boolean lacksBearing;

        LampType(String mark, Values values, TypeLight light, TypeLight.Amount lumens) {
            this.mark = mark;
            this.values = values;
            this.light = light;
            this.lumens = lumens;
            this.spectralClass = required("spectralClass");
        }

        private Reading required(String field) {
            return Reading.of(Subject.TYPE, field, values).orElseThrow();
        }

        Map<Property, Known> states() {
            Map<Property, Known> states = new HashMap<>();
            states.put(Property.LUMENS, lumens.known());
            states.put(Property.SHAPE, light.shapeKnown());
            states.put(Property.SPECTRUM, spectralClass.known());
            states.put(Property.TILT, light.tiltKnown());
            states.put(Property.BEARING, light.bearingKnown(lacksBearing));
            states.put(Property.MOUNTING_HEIGHT, required("mountingHeight").known());
            states.put(Property.COUNT, Known.workedOut("the lights of the plan"));
            return states;
        }

        Lamp hung(Placement placed) {
            double ground =
                    number(Subject.LIGHT, "groundHeight", placed.values()).orElse(siteGroundM());
            Position at = new Position(
                    number(Subject.LIGHT, "east", placed.values()).orElse(0),
                    number(Subject.LIGHT, "north", placed.values()).orElse(0),
                    ground - baseM + own(placed, "mountingHeight"));
            return lamp(placed.mark(), 1, at, ground - baseM, placed.values());
        }

        Lamp atCentre(int count) {
            double ground = siteGroundM() - baseM;
            Outline.Corner centre =
                    Outline.of(project.site()).map(Outline::centroid).orElse(new Outline.Corner(0, 0));
            Position at = new Position(
                    centre.eastM(),
                    centre.northM(),
                    ground + required("mountingHeight").number());
            return lamp(mark + "-unplaced", count, at, ground, Values.NONE);
        }

        private double output() {
            return OutputByHours.reading(period.outputField, values, project.site())
                    .number();
        }

        private double own(Placement placed, String field) {
            return number(Subject.LIGHT, field, placed.values())
                    .orElse(required(field).number());
        }

        private Lamp lamp(String lampMark, int count, Position at, double groundM, Values own) {
            lacksBearing |= light.lacksBearing(own);
            FittedShape shape = light.shape();
            double size = number(Subject.TYPE, "luminousSize", values)
                    .orElse(shape.shape().luminousSizeM());
            return new Lamp(
                    lampMark,
                    mark,
                    count,
                    at,
                    groundM,
                    light.hang(own),
                    new LuminousFlux(lumens.value() * output() / 100),
                    shape.light(),
                    SpectralClasses.byId(spectralClass.text()).orElseThrow().spectrum(),
                    size,
                    shape.nearestM(size));
        }
    }

    private double siteGroundM() {
        return number(Subject.SITE, "groundHeight", project.site()).orElse(0);
    }

    private Surroundings surroundings(Optional<Clearness> chosen) {
        Reading air = Reading.of(Subject.SITE, "air", project.site()).orElseThrow();
        Reading ground =
                Reading.of(Subject.SITE, "groundReflectance", project.site()).orElseThrow();
        Clearness clearness = chosen.orElseGet(() -> Clearness.byId(air.text()).orElseThrow());
        for (Place place : project.places()) {
            Map<Property, Known> states = known.computeIfAbsent(place.mark(), mark -> new HashMap<>());
            states.put(Property.AIR, chosen.isPresent() ? Known.assumed("the air chosen for this page") : air.known());
            states.put(Property.GROUND, ground.known());
        }
        return new Surroundings(
                new Atmosphere(Aerosol.ofDepth(clearness.aerosolDepthAt550()), Math.max(0, baseM)), ground.number());
    }

    private List<Observer> observers() {
        List<Observer> observers = new ArrayList<>();
        for (Place place : project.places()) {
            OptionalDouble east = number(Subject.PLACE, "east", place.values());
            OptionalDouble north = number(Subject.PLACE, "north", place.values());
            if (east.isPresent() && north.isPresent()) {
                observers.add(observer(place, east.getAsDouble(), north.getAsDouble()));
            }
        }
        return observers;
    }

    private Observer observer(Place place, double east, double north) {
        Reading eye = Reading.of(Subject.PLACE, "eyeHeight", place.values()).orElseThrow();
        Map<Property, Known> states = known.computeIfAbsent(place.mark(), mark -> new HashMap<>());
        states.put(Property.EYE_HEIGHT, eye.known());
        states.put(
                Property.LOOK_ANGLE,
                Known.assumed(
                        "a choice: level, 10° beside the brightest light, on the side where the veil is the weaker"));
        double ground = number(Subject.PLACE, "groundHeight", place.values()).orElse(siteGroundM());
        Position at = clearOfLamps(new Position(east, north, ground - baseM + eye.number()));
        double toSite = at.bearingTo(new Position(0, 0, 0));
        double facing =
                Math.toRadians(number(Subject.PLACE, "facing", place.values()).orElse(Math.toDegrees(toSite)));
        List<Look> looks = new ArrayList<>();
        looks.add(new Look(Look.BESIDE, Look.Purpose.GLARE, Direction.toward(toSite + GLARE_ANGLE_RAD, 0)));
        looks.add(new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP));
        looks.add(new Look(Look.TOWARD_SITE, Look.Purpose.SKY, Direction.toward(toSite, LOW_SKY_RAD)));
        for (int i = 0; i < COMPASS.size(); i++) {
            looks.add(new Look(COMPASS.get(i), Look.Purpose.SKY, Direction.toward(i * Math.PI / 2, LOW_SKY_RAD)));
        }
        for (Place.NamedLook look : place.looks()) {
            looks.add(new Look(
                    freeId(look.name(), looks),
                    Look.Purpose.SKY,
                    Direction.toward(Math.toRadians(look.bearingDeg()), Math.toRadians(look.altitudeDeg()))));
        }
        if (place.values().text("kind").equals("road-user")) {
            double travel = number(Subject.PLACE, "travelDirection", place.values()).stream()
                    .map(Math::toRadians)
                    .findFirst()
                    .orElse(facing);
            looks.add(new Look(Look.TRAVEL, Look.Purpose.ROAD, Direction.toward(travel, -ROAD_DIP_RAD)));
        }
        return new Observer(
                place.mark(),
                at,
                Direction.toward(facing, 0),
                looks,
                pane(place.values()),
                roadLuminance(place.values()),
                groundToward(place));
    }

    /** A name of its own among the directions of a place, for people may give two the same, or that of one of ours. */
    private static String freeId(String name, List<Look> looks) {
        String plain = name.replace('/', '-');
        Set<String> taken = looks.stream().map(Look::id).collect(Collectors.toSet());
        String id = plain;
        for (int number = 2; taken.contains(id); number++) {
            id = plain + " (" + number + ")";
        }
        return id;
    }

    /** An eye that sits in a lamp is moved up out of it. */
    private Position clearOfLamps(Position eye) {
        boolean inside = lamps.stream()
                .anyMatch(lamp -> Math.hypot(
                                lamp.position().groundDistanceTo(eye),
                                lamp.position().heightM() - eye.heightM())
                        < NEAREST_LAMP_M);
        return inside ? clearOfLamps(new Position(eye.eastM(), eye.northM(), eye.heightM() + 2 * NEAREST_LAMP_M)) : eye;
    }

    private GroundLine groundToward(Place place) {
        return new GroundLine(place.ground().stream()
                .map(point -> new GroundLine.Point(point.distanceM(), point.heightM() - baseM))
                .toList());
    }

    /** Corners of the property line, at the height of the site's ground. */
    private List<Position> boundary() {
        return Outline.of(project.site()).map(Outline::corners).orElse(List.of()).stream()
                .map(corner -> new Position(corner.eastM(), corner.northM(), siteGroundM() - baseM))
                .toList();
    }

    private static Optional<Pane> pane(Values values) {
        OptionalDouble width = number(Subject.PLACE, "width", values);
        OptionalDouble height = number(Subject.PLACE, "height", values);
        return width.isPresent() && height.isPresent()
                ? Optional.of(new Pane(width.getAsDouble(), height.getAsDouble()))
                : Optional.empty();
    }

    /** As stated, or by the class of the road. */
    private static OptionalDouble roadLuminance(Values values) {
        OptionalDouble stated = number(Subject.PLACE, "adaptationLuminance", values);
        return stated.isPresent()
                ? stated
                : RoadClass.byId(values.text("roadClass")).stream()
                        .mapToDouble(RoadClass::adaptationCdM2)
                        .findFirst();
    }

    /** The lamps that are there, kept or not, and what was read of the sky. */
    private Present present() {
        return new Present(present, number(Subject.SITE, "existingZenithBrightness", project.site()));
    }

    private static OptionalDouble number(Subject subject, String field, Values values) {
        return Reading.of(subject, field, values).stream()
                .mapToDouble(Reading::number)
                .findFirst();
    }
}
