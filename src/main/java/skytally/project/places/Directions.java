package skytally.project.places;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import skytally.notation.NumberReader;
import skytally.project.Bounds;
import skytally.project.Place.GroundPoint;
import skytally.project.Place.HorizonPoint;
import skytally.project.Place.NamedLook;
import skytally.project.entry.Words;

/**
 * What is looked at, the skyline and the ground, typed as lines of text.
 *
 * @param looks   named directions
 * @param horizon points of the skyline, rising in bearing
 * @param ground  points of the ground toward the place, rising in distance
 * @param faults  what could not be read, by the name of its text
 */
record Directions(List<NamedLook> looks, List<HorizonPoint> horizon, List<GroundPoint> ground, List<Unread> faults) {

    /** A line that could not be read, and why. */
    record Unread(String text, String message) {}

    static Directions read(String looks, String horizon, String ground, Words words) {
        List<Unread> faults = new ArrayList<>();
        List<NamedLook> named = new ArrayList<>();
        List<HorizonPoint> points = new ArrayList<>();
        each("looks", looks, faults, words, (name, bearing, altitude) -> {
            if (name.isEmpty()) {
                throw new IllegalArgumentException(words.say("place.fault.name"));
            }
            named.add(new NamedLook(name, bearing, altitude));
        });
        each("horizon", horizon, faults, words, (name, bearing, altitude) -> {
            if (!name.isEmpty()) {
                throw new IllegalArgumentException(words.say("place.fault.point"));
            }
            points.add(new HorizonPoint(bearing, altitude));
        });
        points.sort(Comparator.comparingDouble(HorizonPoint::bearingDeg));
        requireOnce("horizon", points, HorizonPoint::bearingDeg, faults, words);
        List<GroundPoint> heights = new ArrayList<>();
        each("ground", ground, faults, words, (name, distance, height) -> {
            if (!name.isEmpty()) {
                throw new IllegalArgumentException(words.say("place.fault.ground"));
            }
            heights.add(new GroundPoint(distance, height));
        });
        heights.sort(Comparator.comparingDouble(GroundPoint::distanceM));
        requireOnce("ground", heights, GroundPoint::distanceM, faults, words);
        return new Directions(List.copyOf(named), List.copyOf(points), List.copyOf(heights), List.copyOf(faults));
    }

    private static <T> void requireOnce(
            String text, List<T> points, ToDoubleFunction<T> along, List<Unread> faults, Words words) {
        for (int i = 1; i < points.size(); i++) {
            double here = along.applyAsDouble(points.get(i));
            if (here == along.applyAsDouble(points.get(i - 1))) {
                faults.add(new Unread(text, words.say("place.fault.twice." + text, written(here))));
            }
        }
    }

    static String looks(List<NamedLook> looks) {
        return looks.stream()
                .map(look -> look.name() + " " + written(look.bearingDeg()) + " " + written(look.altitudeDeg()))
                .collect(Collectors.joining("\n"));
    }

    static String horizon(List<HorizonPoint> points) {
        return points.stream()
                .map(point -> written(point.bearingDeg()) + " " + written(point.altitudeDeg()))
                .collect(Collectors.joining("\n"));
    }

    static String ground(List<GroundPoint> points) {
        return points.stream()
                .map(point -> written(point.distanceM()) + " " + written(point.heightM()))
                .collect(Collectors.joining("\n"));
    }

    private interface Line {

        void take(String name, double first, double second);
    }

    /** Each line ends in two numbers; what stands before them is a name. */
    private static void each(String text, String typed, List<Unread> faults, Words words, Line line) {
        if (typed.length() > Bounds.TEXT) {
            faults.add(new Unread(text, words.say("place.fault.long", String.valueOf(Bounds.TEXT))));
            return;
        }
        List<String> lines = typed.lines().toList();
        if (lines.size() > Bounds.LINES) {
            faults.add(new Unread(text, words.say("place.fault.lines", String.valueOf(Bounds.LINES))));
            return;
        }
        for (int i = 0; i < lines.size(); i++) {
            String one = lines.get(i).strip();
            if (one.isEmpty()) {
                continue;
            }
            try {
                List<String> parts = List.of(one.split("\\s+"));
                int last = parts.size() - 1;
                Optional<Double> second = number(parts.get(last));
                Optional<Double> first = last < 1 ? Optional.empty() : number(parts.get(last - 1));
                if (second.isEmpty() || first.isEmpty()) {
                    throw new IllegalArgumentException(words.say("place.fault." + text));
                }
                line.take(String.join(" ", parts.subList(0, last - 1)), first.get(), second.get());
            } catch (IllegalArgumentException unreadable) {
                String shown = one.length() > 40 ? one.substring(0, 40) + "…" : one;
                faults.add(new Unread(
                        text, words.say("place.fault.line", i + 1, shown, String.valueOf(unreadable.getMessage()))));
            }
        }
    }

    private static Optional<Double> number(String typed) {
        String bare = typed.endsWith("°") ? typed.substring(0, typed.length() - 1) : typed;
        return NumberReader.read(bare, false) instanceof NumberReader.Number number
                ? Optional.of(number.value().doubleValue())
                : Optional.empty();
    }

    private static String written(double number) {
        return BigDecimal.valueOf(number).stripTrailingZeros().toPlainString();
    }
}
