package skytally.project.plan;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import skytally.charts.SitePlan;
import skytally.charts.SitePlan.Frame;
import skytally.charts.SitePlan.Light;
import skytally.charts.SitePlan.Point;
import skytally.charts.SitePlan.Unit;
import skytally.geometry.Position;
import skytally.notation.QuantityFormat;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Place;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Units;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.project.entry.Spot;
import skytally.project.entry.Words;
import skytally.scene.State;

/**
 * The plan of one scheme.
 *
 * @param schemes  each that may be drawn, by a link
 * @param pictures the plan of the site, and that of all places where some lie far from it; none without a position
 * @param places   every place with a position
 * @param lights   a stretch of the lights with a position
 * @param from     the first of them, counted from 0
 * @param count    of all lights with a position
 * @param before   where the stretch before begins, or nothing
 * @param after    where the next one begins, or nothing
 * @param unit     of the tables
 * @param unplaced what has no position, in a sentence; or empty
 */
record PlanPage(
        List<Choice> schemes,
        List<Picture> pictures,
        List<Row> places,
        List<Row> lights,
        int from,
        int count,
        @Nullable Integer before,
        @Nullable Integer after,
        String unit,
        String unplaced) {

    private static final int ROWS = 100;
    private static final double WIDE = 500;
    private static final double NARROW = 300;

    /** Places within this share of the site's extent beside it are on its own plan. */
    private static final double BESIDE = 0.6;

    private static final double LEAST_BESIDE_M = 50;

    /** What lies farther is no corner of a site. */
    private static final double FARTHEST_M = 1_000_000;

    private static final Pattern CORNER = Pattern.compile("(-?\\d+(?:\\.\\d+)?)[\\s,]+(-?\\d+(?:\\.\\d+)?)");

    /** A scheme that may be drawn. */
    record Choice(String mark, String name, boolean current) {}

    /** A plan, wide and narrow. */
    record Picture(String id, String name, String says, String wide, String narrow) {}

    /** A thing with its position. */
    record Row(String mark, String what, String east, String north, String distance, String bearing, String href) {}

    /** A light with what it is a light of. */
    private record Hung(Scheme scheme, LuminaireType type, Placement light, Spot spot) {}

    static PlanPage of(Project project, Scheme scheme, Unit unit, int from, Words words) {
        List<Hung> hung = hung(project, scheme);
        List<Place> placed = project.places().stream()
                .filter(place -> Spot.of(place.values()).isPresent())
                .toList();
        int first = Math.min(from, Math.max(0, (hung.size() - 1) / ROWS * ROWS));
        int end = Math.min(hung.size(), first + ROWS);
        String base = "/projects/" + project.id();
        return new PlanPage(
                project.schemes().stream()
                        .filter(one -> one.equals(scheme) || !one.types().isEmpty())
                        .map(one -> new Choice(one.mark(), one.name(), one.equals(scheme)))
                        .toList(),
                pictures(outline(project.site()), hung, placed, unit, words),
                placed.stream().map(place -> row(place, unit, base, words)).toList(),
                hung.subList(first, end).stream()
                        .map(one -> row(one, unit, base))
                        .toList(),
                first,
                hung.size(),
                first == 0 ? null : Math.max(0, first - ROWS),
                end < hung.size() ? end : null,
                unit == Unit.METRES ? "m" : "ft",
                unplaced(project, scheme, placed.size(), words));
    }

    /** The lights of the scheme, and those that are there already and stay. */
    private static List<Hung> hung(Project project, Scheme scheme) {
        Stream<Scheme> existing =
                project.schemes().stream().filter(one -> one.kind() == Scheme.Kind.EXISTING && !one.equals(scheme));
        return Stream.concat(Stream.of(scheme), existing)
                .flatMap(one -> hung(one, !one.equals(scheme)))
                .toList();
    }

    private static Stream<Hung> hung(Scheme scheme, boolean onlyKept) {
        Map<String, LuminaireType> types = scheme.types().stream()
                .filter(type -> !(onlyKept && type.values().text("fate").equals("removed")))
                .collect(Collectors.toMap(LuminaireType::mark, Function.identity()));
        return scheme.placements().stream()
                .filter(light -> types.containsKey(light.type()))
                .flatMap(light -> Spot.of(light.values()).stream()
                        .map(spot -> new Hung(scheme, Objects.requireNonNull(types.get(light.type())), light, spot)));
    }

    /** Pairs of numbers, east and north, however they are set apart. */
    private static List<Point> outline(Values site) {
        Claim claim = site.get("outline").inUse();
        List<Point> corners = new ArrayList<>();
        Matcher pairs = CORNER.matcher(claim.value().replace('−', '-'));
        while (pairs.find()) {
            corners.add(new Point(metres(pairs.group(1), claim.unit()), metres(pairs.group(2), claim.unit())));
        }
        return corners.stream()
                .filter(corner -> Math.hypot(corner.eastM(), corner.northM()) <= FARTHEST_M)
                .toList();
    }

    private static double metres(String number, String unit) {
        return Units.inFirst(new BigDecimal(number), unit).doubleValue();
    }

    private static List<Picture> pictures(
            List<Point> outline, List<Hung> hung, List<Place> placed, Unit unit, Words words) {
        List<Light> lights = hung.stream().map(PlanPage::light).toList();
        List<SitePlan.Place> places = placed.stream().map(PlanPage::place).toList();
        List<Point> site =
                Stream.concat(outline.stream(), lights.stream().map(Light::at)).toList();
        if (site.isEmpty() && places.isEmpty()) {
            return List.of();
        }
        if (site.isEmpty()) {
            Frame all = Frame.around(withReference(places.stream().map(SitePlan.Place::at)));
            return List.of(
                    picture("plan-all", new SitePlan(all, unit, outline, lights, places, null), hung, places, words));
        }
        Frame ground = Frame.around(site);
        Frame reach = grown(ground);
        List<Point> near = Stream.concat(
                        site.stream(), places.stream().map(SitePlan.Place::at).filter(reach::holds))
                .toList();
        Frame whole = Frame.around(near);
        List<Picture> pictures = new ArrayList<>();
        List<SitePlan.Place> shown =
                places.stream().filter(place -> whole.holds(place.at())).toList();
        pictures.add(
                picture("plan-site", new SitePlan(whole, unit, outline, lights, places, null), hung, shown, words));
        if (shown.size() < places.size()) {
            Frame all = Frame.around(
                    withReference(Stream.concat(near.stream(), places.stream().map(SitePlan.Place::at))));
            pictures.add(picture(
                    "plan-all", new SitePlan(all, unit, outline, List.of(), places, whole), hung, places, words));
        }
        return pictures;
    }

    private static Frame grown(Frame frame) {
        double beside = Math.max(
                LEAST_BESIDE_M, BESIDE * Math.max(frame.eastM() - frame.westM(), frame.northM() - frame.southM()));
        return new Frame(
                frame.westM() - beside, frame.eastM() + beside, frame.southM() - beside, frame.northM() + beside);
    }

    private static List<Point> withReference(Stream<Point> points) {
        return Stream.concat(points, Stream.of(new Point(0, 0))).toList();
    }

    private static Picture picture(String id, SitePlan plan, List<Hung> hung, List<SitePlan.Place> shown, Words words) {
        String name = words.say("plan." + id);
        String says = words.say("plan." + id + ".says", hung.size(), shown.size(), plan.ringStep(), plan.blockLength());
        return new Picture(
                id, name, says, plan.svg(id + "-wide", name, says, WIDE), plan.svg(id + "-narrow", name, says, NARROW));
    }

    private static Light light(Hung hung) {
        Double bearing = Stream.of(hung.light().values(), hung.type().values())
                .map(values -> values.get("bearing").inUse())
                .filter(claim -> claim.state() != State.NOT_KNOWN)
                .findFirst()
                .flatMap(Amount::of)
                .map(Number::doubleValue)
                .orElse(null);
        return new Light(
                new Point(hung.spot().eastM(), hung.spot().northM()),
                bearing,
                hung.scheme().kind() == Scheme.Kind.EXISTING);
    }

    private static SitePlan.Place place(Place place) {
        Spot spot = Spot.of(place.values()).orElseThrow();
        return new SitePlan.Place(place.mark(), new Point(spot.eastM(), spot.northM()));
    }

    private static Row row(Place place, Unit unit, String base, Words words) {
        Values values = place.values();
        String what = Stream.of(
                        values.text("what"),
                        values.text("kind").isEmpty()
                                ? ""
                                : words.find("choice.kind." + values.text("kind"))
                                        .orElse(values.text("kind")))
                .filter(part -> !part.isEmpty())
                .collect(Collectors.joining("; "));
        return row(place.mark(), what, Spot.of(values).orElseThrow(), unit, base + "/places/" + place.mark());
    }

    private static Row row(Hung hung, Unit unit, String base) {
        String what = Stream.of(
                        hung.type().mark(),
                        hung.type().values().text("use"),
                        hung.scheme().name())
                .filter(part -> !part.isEmpty())
                .collect(Collectors.joining(", "));
        return row(
                hung.light().mark(),
                what,
                hung.spot(),
                unit,
                base + "/lights/" + hung.scheme().mark() + "/positions/"
                        + hung.light().mark());
    }

    private static Row row(String mark, String what, Spot spot, Unit unit, String href) {
        Position reference = new Position(0, 0, 0);
        Position here = new Position(spot.eastM(), spot.northM(), 0);
        double bearing = (StrictMath.toDegrees(reference.bearingTo(here)) + 360) % 360;
        return new Row(
                mark,
                what,
                length(spot.eastM(), unit),
                length(spot.northM(), unit),
                length(reference.groundDistanceTo(here), unit),
                QuantityFormat.decimals(bearing, 1).plain(),
                href);
    }

    private static String length(double metres, Unit unit) {
        double perUnit = unit == Unit.METRES ? 1 : 0.3048;
        return QuantityFormat.decimals(metres / perUnit, 1).plain();
    }

    private static String unplaced(Project project, Scheme scheme, int placed, Words words) {
        int lights = scheme.placements().size()
                - (int) scheme.placements().stream()
                        .filter(light -> Spot.of(light.values()).isPresent())
                        .count();
        int places = project.places().size() - placed;
        return lights + places == 0 ? "" : words.say("plan.unplaced", lights, places);
    }

    /** The scheme asked for, or the proposal, or whatever there is. */
    static Optional<Scheme> asked(Project project, String mark) {
        return project.scheme(mark)
                .or(() -> project.schemes().stream()
                        .filter(scheme -> scheme.kind() == Scheme.Kind.PROPOSED)
                        .findFirst())
                .or(() -> project.schemes().stream().findFirst());
    }
}
