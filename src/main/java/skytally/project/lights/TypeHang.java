package skytally.project.lights;

import java.util.ArrayList;
import java.util.DoubleSummaryStatistics;
import java.util.List;
import java.util.Optional;
import skytally.charts.TiltPicture;
import skytally.notation.QuantityFormat;
import skytally.project.LuminaireType;
import skytally.project.Placement;
import skytally.project.ShapeFromWords;
import skytally.project.Stated;
import skytally.project.TypeLight;
import skytally.project.Values;
import skytally.project.entry.Words;

/**
 * How a type hangs and shines as what is stored of it has it: a picture, what it comes to in sentences, and its lumens.
 *
 * @param svg     the picture
 * @param differs what the share stated and the shape have against each other; empty where they agree
 * @param says    the picture in sentences, and what is missing
 * @param shape   the shape it is reckoned as, and why
 * @param lumens  what leaves each, and why
 */
record TypeHang(String svg, String differs, List<String> says, String shape, String lumens) {

    static TypeHang of(LuminaireType type, List<Placement> placed, Words words) {
        TypeLight light = TypeLight.of(type.values());
        String up = words.say(
                "type.hang.up",
                Shares.degrees(light.tiltDeg()),
                Shares.percent(light.upwardShare()),
                Shares.percent(light.lowShare()));
        String fit = Shares.fit(light.shape(), words);
        List<String> says = new ArrayList<>(List.of(up));
        if (!light.shape().differs()) {
            says.add(fit);
        }
        says.addAll(missing(light, type.values(), placed, words));
        return new TypeHang(
                picture(type.mark(), light, up, words).svg(),
                light.shape().differs() ? fit : "",
                List.copyOf(says),
                words.say(
                        "type.shape.is",
                        light.shape().shape().words(),
                        light.shapeKnown().state().words()),
                lumens(light, words));
    }

    private static TiltPicture picture(String mark, TypeLight light, String says, Words words) {
        return new TiltPicture(
                "tilt",
                light.shape().light(),
                light.tiltDeg(),
                light.rollDeg(),
                words.say("type.picture.title", mark),
                says + " " + words.say("type.picture.says"),
                new TiltPicture.Words(
                        words.say("type.picture.level"),
                        light.tiltDeg() == 0 ? "" : Shares.degrees(light.tiltDeg()),
                        words.say("type.picture.ahead")));
    }

    private static List<String> missing(TypeLight light, Values values, List<Placement> placed, Words words) {
        List<String> missing = new ArrayList<>();
        ownTilts(light, placed, words).ifPresent(missing::add);
        long unaimed =
                placed.stream().filter(one -> light.lacksBearing(one.values())).count();
        if (unaimed > 0) {
            missing.add(words.say("type.bearing.placed", unaimed, placed.size()));
        } else if (light.lacksBearing(Values.NONE) && placed.isEmpty()) {
            missing.add(words.say("type.bearing.none"));
        }
        String named = values.text("shapeWords");
        boolean read = ShapeFromWords.of(named).isPresent();
        if (!named.isEmpty() && !read) {
            missing.add(words.say("type.words.unknown"));
        }
        if (read && values.get("shape").equals(Stated.NOTHING)) {
            missing.add(words.say("type.shape.words"));
        }
        return missing;
    }

    /** The lights of the plan that are tilted otherwise than their type: how far, and what all of them send up. */
    private static Optional<String> ownTilts(TypeLight light, List<Placement> placed, Words words) {
        long own = placed.stream()
                .filter(one -> light.tiltDeg(one.values()) != light.tiltDeg())
                .count();
        if (own == 0) {
            return Optional.empty();
        }
        List<Values> lights = placed.stream().map(Placement::values).toList();
        DoubleSummaryStatistics tilts =
                lights.stream().mapToDouble(light::tiltDeg).summaryStatistics();
        return Optional.of(words.say(
                "type.tilt.own",
                own,
                placed.size(),
                Shares.degrees(tilts.getMin()),
                Shares.degrees(tilts.getMax()),
                Shares.percent(light.upwardShare(lights))));
    }

    private static String lumens(TypeLight light, Words words) {
        return light.lumens()
                .map(leaving -> words.say(
                        "type.lumens",
                        QuantityFormat.atMost(leaving.value(), 6).plain(),
                        leaving.known().state().words(),
                        leaving.known().from()))
                .orElseGet(() -> words.say("type.lumens.none"));
    }
}
