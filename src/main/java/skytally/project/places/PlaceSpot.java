package skytally.project.places;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import org.springframework.stereotype.Component;
import skytally.notation.QuantityFormat;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Field.Subject;
import skytally.project.Globe;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.project.entry.AskedFields;
import skytally.project.entry.Spot;
import skytally.project.entry.ValueWords;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.Words;

/** Puts a place where a distance and a bearing say, or a latitude and a longitude. */
@Component
class PlaceSpot {

    static final String DISTANCE = "distance";
    static final String LATITUDE = "latitude";

    private static final String DIRECTION = "direction";
    private static final String LONGITUDE = "longitude";
    private static final double FARTHEST_M = 1_000_000;

    private final Field distance;
    private final Field direction;
    private final Field latitude;
    private final Field longitude;
    private final ValueWords valueWords;
    private final Words words;

    PlaceSpot(AskedFields asked, ValueWords valueWords, Words words) {
        this.distance = asked.distance(Subject.PLACE, DISTANCE);
        this.direction = asked.bearing(Subject.PLACE, DIRECTION);
        this.latitude = asked.angle(Subject.PLACE, LATITUDE, 90);
        this.longitude = asked.angle(Subject.PLACE, LONGITUDE, 180);
        this.valueWords = valueWords;
        this.words = words;
    }

    /** How a position is typed. */
    enum Way {
        GRID,
        POLAR,
        GLOBE;

        String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** What is typed for a way that the position is worked out from. */
    List<Field> fields(Way way) {
        return switch (way) {
            case GRID -> List.of();
            case POLAR -> List.of(distance, direction);
            case GLOBE -> List.of(latitude, longitude);
        };
    }

    Set<String> required(Way way) {
        return switch (way) {
            case GRID -> Set.of();
            case POLAR -> Set.of(DISTANCE, DIRECTION);
            case GLOBE -> Set.of(LATITUDE, LONGITUDE);
        };
    }

    /** Values without what the position is worked out from. */
    static Values kept(Values read) {
        Map<String, Stated> kept = new TreeMap<>(read.byField());
        Set.of(DISTANCE, DIRECTION, LATITUDE, LONGITUDE).forEach(kept::remove);
        return new Values(kept);
    }

    /**
     * The values with the position worked out; the grid says from what was typed.
     *
     * @throws IllegalArgumentException if it cannot be, with what to do
     */
    Values put(Values values, Values typed, Way way, Values site) {
        return switch (way) {
            case GRID -> values;
            case POLAR -> byWay(values, typed);
            case GLOBE -> onGlobe(values, typed, site);
        };
    }

    private Values byWay(Values values, Values typed) {
        Claim away = typed.get(DISTANCE).inUse();
        Claim toward = typed.get(DIRECTION).inUse();
        Spot spot = new Spot(0, 0)
                .at(
                        Amount.of(away).orElseThrow().doubleValue(),
                        Amount.of(toward).orElseThrow().doubleValue());
        String how =
                words.say("position.how.polar", valueWords.value(distance, away), valueWords.value(direction, toward));
        return at(values, away, spot, how);
    }

    private Values onGlobe(Values values, Values typed, Values site) {
        Globe globe = Globe.of(site).orElseThrow(() -> new IllegalArgumentException(words.say("place.fault.globe")));
        Claim north = typed.get(LATITUDE).inUse();
        Claim east = typed.get(LONGITUDE).inUse();
        Globe.Way way = globe.to(
                Amount.of(north).orElseThrow().doubleValue(),
                Amount.of(east).orElseThrow().doubleValue());
        if (way.distanceM() > FARTHEST_M) {
            throw new IllegalArgumentException(words.say(
                    "place.fault.far",
                    QuantityFormat.atMost(way.distanceM() / 1000, 3).plain()));
        }
        String how = words.say(
                "position.how.globe",
                valueWords.value(latitude, north),
                valueWords.value(longitude, east),
                site.text(LATITUDE),
                site.text(LONGITUDE));
        return at(values, north, new Spot(0, 0).at(way.distanceM(), way.bearingDeg()), how);
    }

    private static Values at(Values values, Claim basis, Spot spot, String how) {
        return values.with("east", stated(values.get("east"), basis, spot.eastM(), how))
                .with("north", stated(values.get("north"), basis, spot.northM(), how));
    }

    private static Stated stated(Stated before, Claim basis, double metres, String how) {
        return before.claimed(ValuesEditor.workedOut(basis, Spot.metres(metres), "m", how));
    }

    /** Where a place is, in each of the ways it could be typed. */
    Whereabouts whereabouts(Values place, Values site) {
        Optional<Spot> spot = Spot.of(place);
        if (spot.isEmpty()) {
            String none = words.say("position.none");
            return new Whereabouts(none, none, none);
        }
        Spot here = spot.get();
        return new Whereabouts(
                words.say("position.grid", metres(here.eastM()), metres(here.northM())),
                here.fromReference(words),
                Globe.of(site)
                        .map(globe -> globe.at(new Globe.Way(here.distanceM(), here.bearingDeg())))
                        .map(this::written)
                        .orElseGet(() -> words.say("position.globe.none")));
    }

    private static String metres(double metres) {
        return QuantityFormat.decimals(metres, 1).plain();
    }

    private String written(Globe.LatLong point) {
        return words.say(
                "position.globe",
                degrees(point.latitudeDeg()),
                words.say(point.latitudeDeg() < 0 ? "position.south" : "position.north"),
                degrees(point.longitudeDeg()),
                words.say(point.longitudeDeg() < 0 ? "position.west" : "position.east"));
    }

    /** Five decimals of a degree are about a metre. */
    private static String degrees(double degrees) {
        return QuantityFormat.decimals(Math.abs(degrees), 5).plain();
    }

    /**
     * Where a place is.
     *
     * @param grid  east and north of the reference point
     * @param polar distance and bearing from it
     * @param globe latitude and longitude, or that the site says none
     */
    record Whereabouts(String grid, String polar, String globe) {}
}
