package skytally.project;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.luminaire.FittedShape;
import skytally.photometry.LuminousFlux;
import skytally.project.Field.Subject;
import skytally.scene.Known;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.OpenScene;
import skytally.scene.Property;
import skytally.scene.Scene;
import skytally.scene.Surroundings;
import skytally.spectrum.SpectralClasses;

/**
 * Draws the scene of one scheme of a project, and is the only class that does: typed units become SI, a light's own
 * height and tilt come before its type's, and what is not known is stood in for by the catalogue.
 *
 * <p>Heights are reckoned from the lowest ground of any light or place, so that none is negative. Existing lights stay
 * unless they are marked as removed. A type without lumens and without watts is left out and named; a light without a
 * position stands at the reference point and is named. A light that is not the same all round and has no bearing faces
 * true north and is named: to turn it toward each place in turn would be a different proposal for each of them.
 */
public final class SceneDrawing {

    private static final double GLARE_ANGLE_RAD = Math.toRadians(10);
    private static final double LOW_SKY_RAD = Math.toRadians(30);

    private final Project project;
    private final Period period;
    private final double baseM;
    private final List<Lamp> lamps = new ArrayList<>();
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
        draw(scheme, false);
        if (scheme.kind() != Scheme.Kind.EXISTING) {
            project.schemes().stream()
                    .filter(other -> other.kind() == Scheme.Kind.EXISTING)
                    .forEach(existing -> draw(existing, true));
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

    /** The scene of one scheme in one period of the night. */
    public static Drawn of(Project project, Scheme scheme, Period period) {
        SceneDrawing drawing = new SceneDrawing(project, scheme, period);
        Scene scene = new Scene(drawing.lamps, drawing.observers(), drawing.surroundings());
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

    private void draw(Scheme scheme, boolean asExisting) {
        Map<String, List<Placement>> byType = new HashMap<>();
        scheme.placements()
                .forEach(light -> byType.computeIfAbsent(light.type(), type -> new ArrayList<>())
                        .add(light));
        for (LuminaireType type : scheme.types()) {
            boolean removed = type.values().text("fate").equals("removed");
            if (!(asExisting && removed)) {
                draw(type, byType.getOrDefault(type.mark(), List.of()), asExisting);
            }
        }
    }

    private void draw(LuminaireType type, List<Placement> lights, boolean asExisting) {
        TypeLight light = TypeLight.of(type.values());
        if (light.lumens().isEmpty()) {
            leftOut.add(type.mark());
            return;
        }
        String mark = asExisting ? "existing-" + type.mark() : type.mark();
        LampType drawn = new LampType(mark, type.values(), light, light.lumens().get());
        int count = number(Subject.TYPE, "count", type.values()).stream()
                .mapToInt(stated -> (int) stated)
                .findFirst()
                .orElse(lights.size());
        for (Placement placed : lights) {
            lamps.add(drawn.hung(placed));
        }
        if (count > lights.size()) {
            unplaced.add(type.mark());
            lamps.add(drawn.atReference(count - lights.size()));
        }
        if (drawn.lacksBearing) {
            unaimed.add(type.mark());
        }
        known.put(mark, drawn.states());
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
            return lamp(placed.mark(), 1, at, placed.values());
        }

        Lamp atReference(int count) {
            double height = siteGroundM() - baseM + required("mountingHeight").number();
            return lamp(mark + "-unplaced", count, new Position(0, 0, height), Values.NONE);
        }

        private double own(Placement placed, String field) {
            return number(Subject.LIGHT, field, placed.values())
                    .orElse(required(field).number());
        }

        private Lamp lamp(String lampMark, int count, Position at, Values own) {
            lacksBearing |= light.lacksBearing(own);
            FittedShape shape = light.shape();
            double size = number(Subject.TYPE, "luminousSize", values)
                    .orElse(shape.shape().luminousSizeM());
            return new Lamp(
                    lampMark,
                    mark,
                    count,
                    at,
                    light.hang(own),
                    new LuminousFlux(
                            lumens.value() * required(period.outputField).number() / 100),
                    shape.light(),
                    SpectralClasses.byId(spectralClass.text()).orElseThrow().spectrum(),
                    size,
                    shape.nearestM(size));
        }
    }

    private double siteGroundM() {
        return number(Subject.SITE, "groundHeight", project.site()).orElse(0);
    }

    private Surroundings surroundings() {
        Reading air = Reading.of(Subject.SITE, "air", project.site()).orElseThrow();
        Reading ground =
                Reading.of(Subject.SITE, "groundReflectance", project.site()).orElseThrow();
        Clearness clearness = Clearness.byId(air.text()).orElseThrow();
        for (Place place : project.places()) {
            Map<Property, Known> states = known.computeIfAbsent(place.mark(), mark -> new HashMap<>());
            states.put(Property.AIR, air.known());
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
        states.put(Property.LOOK_ANGLE, Known.assumed("a choice: level, 10° beside the site's reference point"));
        double ground = number(Subject.PLACE, "groundHeight", place.values()).orElse(siteGroundM());
        Position at = new Position(east, north, ground - baseM + eye.number());
        double toSite = at.bearingTo(new Position(0, 0, 0));
        double facing =
                Math.toRadians(number(Subject.PLACE, "facing", place.values()).orElse(Math.toDegrees(toSite)));
        List<Look> looks = new ArrayList<>();
        looks.add(new Look(Look.BESIDE, Look.Purpose.GLARE, Direction.toward(toSite + GLARE_ANGLE_RAD, 0)));
        looks.add(new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP));
        looks.add(new Look(Look.TOWARD_SITE, Look.Purpose.SKY, Direction.toward(toSite, LOW_SKY_RAD)));
        for (Place.NamedLook look : place.looks()) {
            looks.add(new Look(
                    look.name(),
                    Look.Purpose.SKY,
                    Direction.toward(Math.toRadians(look.bearingDeg()), Math.toRadians(look.altitudeDeg()))));
        }
        return new Observer(place.mark(), at, Direction.toward(facing, 0), looks);
    }

    private static OptionalDouble number(Subject subject, String field, Values values) {
        return Reading.of(subject, field, values).stream()
                .mapToDouble(Reading::number)
                .findFirst();
    }
}
