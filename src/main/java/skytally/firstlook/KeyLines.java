package skytally.firstlook;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment.Topic;
import skytally.assessment.Figure;
import skytally.assessment.Likeness;
import skytally.assessment.Range;
import skytally.atmosphere.Clearness;
import skytally.figures.LikenessWords;
import skytally.figures.NumberRow;
import skytally.figures.Quantity;
import skytally.figures.RangeText;
import skytally.firstlook.FirstLookPage.KeyLine;
import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.web.Switches.Units;

/** The answers of the first look, each a number with what it means. */
final class KeyLines {

    private final Answer answer;
    private final Units units;
    private final int count;

    KeyLines(Answer answer, Units units) {
        this.answer = answer;
        this.units = units;
        this.count = answer.sentence().count();
    }

    List<KeyLine> all() {
        List<KeyLine> lines = new ArrayList<>();
        lines.add(oneLamp());
        if (count > 1) {
            lines.add(together());
        }
        lines.add(veil());
        lines.add(skyGlow());
        lines.add(faintestStar());
        return lines;
    }

    private KeyLine oneLamp() {
        String what = count > 1 ? "Light at your eye from one lamp, the brightest" : "Light at your eye";
        List<String> says = new ArrayList<>();
        says.add(comparison("direct/one-lamp-illuminance", "direct/one-lamp-star-overhead"));
        if (count == 1) {
            says.add(onWindow());
        }
        return light(what, "direct/one-lamp-illuminance", "direct/one-lamp-magnitude", says);
    }

    private KeyLine together() {
        String what = "All " + written(count) + " together, if they stood at one point";
        return light(
                what,
                "direct/illuminance",
                "direct/magnitude",
                List.of(comparison("direct/illuminance", "direct/star-overhead"), onWindow()));
    }

    private KeyLine light(String what, String measure, String magnitude, List<String> says) {
        double lux = likely(measure);
        List<Quantity> also = new ArrayList<>();
        if (lux > 0) {
            also.add(Quantity.lightOtherwise(lux, 2, units));
            if (isComparedWithStars()) {
                also.add(new Quantity(
                        new Written(
                                "magnitude "
                                        + QuantityFormat.decimals(likely(magnitude), 1)
                                                .digits(),
                                0),
                        ""));
            }
        }
        return new KeyLine(
                what,
                door(measure),
                lux > 0 ? Quantity.light(lux, 2, units) : null,
                "no direct light by this data",
                also,
                range(measure, value -> Quantity.light(value, 2, units)),
                says);
    }

    private boolean isComparedWithStars() {
        return !answer.assessment().has(Topic.NOT_A_POINT)
                && !answer.assessment().has(Topic.BRIGHTER_THAN_MOON);
    }

    /** In stars and planets where the lamp is a point fainter than the Moon; else in full Moons, and why. */
    private String comparison(String measure, String star) {
        Figure figure = figure(measure);
        if (figure.likely() == 0) {
            return answer.assessment().has(Topic.NO_DIRECT_LIGHT)
                    ? "Light still arrives from the ground and the sky."
                    : "";
        }
        Optional<Likeness> found = answer.assessment().likeness(figure);
        if (found.isEmpty()) {
            return "Fainter than the faintest star under a natural sky.";
        }
        Likeness like = found.get();
        if (like.inMoons()) {
            return "That is " + LikenessWords.of(like) + "; no star is compared, as noted below.";
        }
        return "About " + LikenessWords.of(like) + "; equal to a star of magnitude "
                + QuantityFormat.decimals(likely(star), 1).digits() + " overhead.";
    }

    private String onWindow() {
        double lux = likely("direct/window-illuminance");
        return lux == 0
                ? ""
                : "On an upright window facing them, outside of the glass: " + Quantity.light(lux, 2, units) + " ("
                        + Quantity.lightOtherwise(lux, 2, units) + ").";
    }

    private KeyLine veil() {
        double skies = likely("beside/glare/natural-skies");
        double halo = likely("beside/glare/halo");
        String angle = angle();
        Optional<Range> brightness = figure("beside/glare/veil-brightness").range();
        List<String> says = new ArrayList<>();
        if (brightness.isPresent()) {
            String howMany = QuantityFormat.significant(skies, 2).plain()
                    + (skies >= 1.5 ? " natural skies of 22.0" : " of a natural sky of 22.0");
            says.add("That is " + howMany + ", laid inside your eye over the sky already there; a hand held before"
                    + " the lamps removes it.");
        }
        if (halo > 0) {
            says.add("The air there, lit by the lamps, glows with at least " + Quantity.luminance(halo, 2)
                    + " on top, for cameras too.");
        }
        return new KeyLine(
                "The veil the lamps draw over what you see " + angle + " beside them",
                door("beside/glare/veil-brightness"),
                brightness
                        .map(range -> Quantity.skyBrightness(range.likely(), 1))
                        .orElse(null),
                "no veil",
                brightness.isPresent() ? List.of(Quantity.luminance(likely("beside/glare/veil"), 2)) : List.of(),
                range("beside/glare/veil-brightness", value -> Quantity.skyBrightness(value, 1)),
                says);
    }

    private KeyLine skyGlow() {
        double increase = likely("zenith/sky/increase");
        String toward = "Toward the lights, 30° up: at least "
                + Quantity.increase(likely("toward-site/sky/increase")).plain()
                + ", from " + brightness("toward-site/sky/natural-brightness") + " to "
                + brightness("toward-site/sky/brightness") + "\u00a0mag/arcsec².";
        return new KeyLine(
                "Sky glow overhead, on a clear night: at least",
                door("zenith/sky/increase"),
                new Quantity(Quantity.increase(increase).number(), "% over the natural sky"),
                "none",
                List.of(new Quantity(
                        new Written(
                                brightness("zenith/sky/natural-brightness") + " to "
                                        + brightness("zenith/sky/brightness"),
                                0),
                        "mag/arcsec²")),
                range("zenith/sky/increase", Quantity::increase),
                List.of(
                        toward,
                        otherAirs(),
                        "Of a fixed natural sky of 22.0 mag/arcsec² (a larger number is a darker sky). At solar maximum"
                                + " nature is up to 0.4 mag brighter, and the same light a smaller share of it. Over the"
                                + " sky as it is tonight: not known, without a reading."));
    }

    /** A far result is never given in one air alone. */
    private String otherAirs() {
        if (answer.airs().isEmpty()) {
            return "";
        }
        List<String> each = new ArrayList<>();
        for (Clearness air : Clearness.values()) {
            Figure there = answer.airs().get(air);
            if (there != null) {
                each.add("in " + air.words() + " air " + Quantity.increase(there.likely()));
            }
        }
        return "So far away the haze decides. Overhead, " + String.join(", ", each) + ".";
    }

    private KeyLine faintestStar() {
        Figure after = figure("zenith/eye/limit");
        String stars = figure("zenith/eye/stars")
                .range()
                .flatMap(with -> figure("zenith/eye/stars-natural")
                        .range()
                        .map(before -> starsLost(before.likely(), with.likely())))
                .orElse("");
        return new KeyLine(
                "Faintest star overhead, with no lamp in view",
                door("zenith/eye/limit"),
                Quantity.magnitude(after.likely(), 2),
                "",
                List.of(new Quantity(
                        new Written(
                                QuantityFormat.decimals(likely("zenith/eye/limit-natural"), 2)
                                                .digits() + " by nature",
                                0),
                        "")),
                range("zenith/eye/limit", value -> Quantity.magnitude(value, 2)),
                List.of("To a typical eye; keen eyes see 0.4 fainter, others 0.2 less. " + stars, withLampsInView()));
    }

    private String withLampsInView() {
        return likely("direct/illuminance") > 0
                ? "With the lights in view, " + angle() + " beside them: "
                        + QuantityFormat.decimals(likely("beside/eye/limit-in-view"), 2)
                                .digits() + "."
                : "";
    }

    private String angle() {
        return QuantityFormat.asTyped(answer.sentence().number(Blank.GLARE_ANGLE))
                        .plain() + "°";
    }

    private static String starsLost(double before, double after) {
        double lost = before - after;
        String some = "about " + QuantityFormat.significant(before, 2).plain() + " stars above the horizon";
        return lost < 1.5
                ? "Of " + some + " none is lost that could be counted."
                : "Of " + some + ", about "
                        + QuantityFormat.significant(Math.rint(lost), lost < 10 ? 1 : 2)
                                .plain() + " are lost.";
    }

    private String brightness(String measure) {
        return QuantityFormat.decimals(likely(measure), 2).digits();
    }

    private static String written(int whole) {
        return QuantityFormat.decimals(whole, 0).digits();
    }

    private Figure figure(String measure) {
        return answer.figure(measure);
    }

    private double likely(String measure) {
        return figure(measure).likely();
    }

    private String door(String measure) {
        return NumberRow.door(figure(measure));
    }

    private @Nullable RangeText range(String measure, DoubleFunction<Quantity> written) {
        return RangeText.of(figure(measure), written).orElse(null);
    }
}
