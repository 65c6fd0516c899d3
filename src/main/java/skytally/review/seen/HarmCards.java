package skytally.review.seen;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.DoubleFunction;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.assessment.Likeness;
import skytally.assessment.SeenLamps;
import skytally.assessment.SeenLamps.SeenLamp;
import skytally.eye.Comparison;
import skytally.figures.LikenessWords;
import skytally.figures.NumberRow;
import skytally.figures.Quantity;
import skytally.figures.RangeText;
import skytally.notation.QuantityFormat;
import skytally.photometry.Illuminance;
import skytally.photometry.ZeroPoint;
import skytally.project.Place;
import skytally.review.Hour;
import skytally.review.Night;
import skytally.review.Review;
import skytally.review.Said;
import skytally.review.Whereabouts;
import skytally.scene.Observer;
import skytally.web.Switches.Units;

/** The four harms at one place, side by side: none stands for another, and none is ranked. */
final class HarmCards {

    /**
     * One harm.
     *
     * @param name   in words
     * @param figure the one number; nothing where there is no such light
     * @param none   what stands in its place then
     * @param door   to its working
     * @param unit   beside it
     * @param range  how far it may go
     * @param also   the same in other words, and where it holds
     * @param says   what it means
     * @param more   the other hour, and where more is
     */
    record Card(
            String name,
            @Nullable Quantity figure,
            String none,
            String door,
            String unit,
            @Nullable RangeText range,
            String also,
            List<Said> says,
            List<Said> more) {}

    private static final String NO_DIRECT = "no direct light by this data";

    private final Review review;
    private final Place place;
    private final Observer observer;
    private final Assessment found;
    private final Optional<Night> present;
    private final Doors doors;
    private final Units units;
    private final boolean wildlife;

    HarmCards(Review review, Place place, Observer observer, Assessment found, Optional<Night> present, Doors doors) {
        this.review = review;
        this.place = place;
        this.observer = observer;
        this.found = found;
        this.present = present;
        this.doors = doors;
        this.units = review.asked().units();
        this.wildlife = Whereabouts.kind(place).equals(Optional.of("wildlife-place"));
    }

    List<Card> all() {
        return List.of(seen(), surface(), glare(), glow());
    }

    /** Whether only light is given, and nothing said of what it means. */
    boolean isOfWildlife() {
        return wildlife;
    }

    private Card seen() {
        Figure one = figure("direct/one-lamp-illuminance");
        Figure all = figure("direct/illuminance");
        List<Said> says = new ArrayList<>();
        if (all.likely() > 0) {
            if (!wildlife) {
                says.add(Said.words(ofOne(one)));
            }
            says.add(new Said(
                    "All together, if they stood at one point: ",
                    Quantity.light(all.likely(), 2, units),
                    doors.here(all),
                    wildlife ? "." : ofAll(all)));
        } else {
            says.add(Said.words("Light still arrives from the ground and the sky."));
        }
        return new Card(
                "Seen directly",
                light(one),
                NO_DIRECT,
                doors.here(one),
                unit(one, "at the eye"),
                RangeText.of(one, value -> Quantity.light(value, 2, units)).orElse(null),
                all.likely() > 0 ? brightest() : "",
                says,
                more("direct/illuminance", value -> Quantity.light(value, 2, units), " together"));
    }

    /** Which lamp is the brightest, and its light in other units. */
    private String brightest() {
        String mark = SeenLamps.at(review.shown().scene(), observer).stream()
                .reduce((a, b) -> a.oneLx() >= b.oneLx() ? a : b)
                .map(SeenLamp::mark)
                .orElse("");
        Figure one = figure("direct/one-lamp-illuminance");
        StringBuilder says = new StringBuilder(
                "from the brightest single lamp, " + mark + "; " + Quantity.lightOtherwise(one.likely(), 2, units));
        if (isComparedWithStars(one)) {
            says.append(", magnitude ")
                    .append(QuantityFormat.decimals(
                                    figure("direct/one-lamp-magnitude").likely(), 1)
                            .digits());
        }
        return says.toString();
    }

    private boolean isComparedWithStars(Figure one) {
        return !wildlife && found.likeness(one).map(like -> !like.inMoons()).orElse(true);
    }

    /** In stars and planets where the lamp is a point fainter than the Moon; else in full Moons, and why below. */
    private String ofOne(Figure one) {
        Optional<Likeness> like = found.likeness(one);
        if (like.isEmpty()) {
            return "Fainter than the faintest star under a natural sky.";
        }
        return like.get().inMoons()
                ? "That is " + LikenessWords.of(like.get()) + "; no star is compared, as noted below."
                : "About " + LikenessWords.of(like.get()) + ".";
    }

    private String ofAll(Figure all) {
        return found.likeness(all)
                        .map(like -> ", " + aboutOnce(LikenessWords.of(like)))
                        .orElse("") + ".";
    }

    private static String aboutOnce(String words) {
        return words.startsWith("about ") ? words : "about " + words;
    }

    private Card surface() {
        Figure window = figure("direct/window-illuminance");
        List<Said> says = new ArrayList<>();
        if (window.likely() > 0 && !wildlife) {
            says.add(Said.words(Comparison.onGround(new Illuminance(window.likely()), ZeroPoint.TRADITIONAL)
                    .map(ground -> "For scale: "
                            + LikenessWords.times(
                                    ground.times(), ground.anchor().said(), false) + ".")
                    .orElse("Less than the natural starlit sky lays on level ground.")));
        }
        worst("direct/worst-plane-illuminance", "Turned to where it is greatest, upright")
                .ifPresent(says::add);
        worst("direct/window-worst-illuminance", "At the worst point of the window")
                .ifPresent(says::add);
        Whereabouts where = new Whereabouts(review.project(), place, observer);
        return new Card(
                "Light on a surface",
                light(window),
                "none on this plane by this data",
                doors.here(window),
                unit(window, "upright"),
                RangeText.of(window, value -> Quantity.light(value, 2, units)).orElse(null),
                "plane facing " + where.facing() + ", " + where.eyeHeight(units)
                        + " above its ground; " + (isWindow() ? "outside of the glass, " : "")
                        + "nothing taken off for air" + (isWindow() ? ", glass or curtains" : ""),
                says,
                more("direct/window-illuminance", value -> Quantity.light(value, 2, units), ""));
    }

    private boolean isWindow() {
        return place.values().text("kind").equals("home-window");
    }

    private Optional<Said> worst(String measure, String words) {
        return found.find(place.mark(), measure)
                .filter(figure -> figure.range().isPresent() && figure.likely() > 0)
                .map(figure ->
                        new Said(words + ": ", Quantity.light(figure.likely(), 2, units), doors.here(figure), "."));
    }

    private Card glare() {
        Figure veil = figure("beside/glare/veil");
        Figure angle = figure("beside/glare/angle");
        List<Said> says = new ArrayList<>();
        if (wildlife) {
            says.add(Said.words("Reckoned for a human eye; it says nothing about an animal's."));
        } else if (veil.likely() > 0) {
            Figure skies = figure("beside/glare/natural-skies");
            says.add(new Said(
                    "Looking level, 10° beside the site, the eye sees ",
                    skies(skies),
                    doors.here(skies),
                    " laid over the sky already there."));
        }
        found.find(place.mark(), "travel/glare/threshold-increment")
                .filter(increment -> increment.range().isPresent())
                .ifPresent(increment -> says.add(new Said(
                        "For a driver: threshold increment ",
                        new Quantity(QuantityFormat.significant(increment.likely(), 2), "%"),
                        doors.here(increment),
                        ".")));
        Quantity written = Quantity.luminance(veil.likely(), 2);
        List<Said> more = new ArrayList<>();
        if (veil.likely() > 0) {
            more.add(new Said(
                    "the brightest lamp stands ",
                    new Quantity(QuantityFormat.significant(angle.likely(), 2), "°"),
                    doors.here(angle),
                    " from there"));
        }
        more.addAll(more("beside/glare/veil", value -> Quantity.luminance(value, 2), ""));
        return new Card(
                "Glare",
                veil.likely() > 0 ? written : null,
                "no veil by this data",
                doors.here(veil),
                written.unit() + " at 10°",
                RangeText.of(veil, value -> Quantity.luminance(value, 2)).orElse(null),
                veilAsSky(),
                says,
                more);
    }

    private static Quantity skies(Figure skies) {
        return new Quantity(
                QuantityFormat.significant(skies.likely(), 2),
                skies.likely() >= 1.5 ? "natural skies of 22.0" : "of a natural sky of 22.0");
    }

    private String veilAsSky() {
        return figure("beside/glare/veil-brightness")
                .range()
                .map(range -> "veil in the eye, as a sky " + Quantity.skyBrightness(range.likely(), 1))
                .orElse("veil in the eye");
    }

    private Card glow() {
        Figure increase = figure("zenith/sky/increase");
        List<Said> says = new ArrayList<>();
        says.add(found.find(place.mark(), "zenith/sky/increase-over-present")
                .filter(over -> over.range().isPresent())
                .map(over ->
                        new Said("Over the sky as it is: ", Quantity.increase(over.likely()), doors.here(over), "."))
                .orElse(Said.words("Over the sky as it is: not known without a reading.")));
        Figure toward = figure("toward-site/sky/increase");
        says.add(new Said(
                "Toward the site, 30° up: ",
                Quantity.increase(toward.likely()),
                doors.here(toward),
                " over the natural sky, " + fromTo("toward-site") + "."));
        List<Said> more = new ArrayList<>(more("zenith/sky/increase", Quantity::increase, " overhead"));
        return new Card(
                "Sky glow",
                new Quantity(Quantity.increase(increase.likely()).number(), "%"),
                "",
                doors.here(increase),
                "% overhead",
                RangeText.of(increase, Quantity::increase).orElse(null),
                "at least; over a natural sky of 22.0; " + fromTo("zenith"),
                says,
                more);
    }

    /** From the sky as it is where that is known, else from the natural one. */
    private String fromTo(String look) {
        boolean known =
                found.find(place.mark(), look + "/sky/present-brightness").isPresent();
        return (known
                        ? "from " + brightness(look + "/sky/present-brightness") + " as it is"
                        : "from " + brightness(look + "/sky/natural-brightness") + " by nature")
                + " to " + brightness(look + "/sky/brightness") + "\u00a0mag/arcsec²";
    }

    private String brightness(String measure) {
        return QuantityFormat.decimals(figure(measure).likely(), 2).digits();
    }

    /** The other hour, what is there now, and what every sum leaves out. */
    private List<Said> more(String measure, DoubleFunction<Quantity> written, String after) {
        List<Said> more = new ArrayList<>();
        Hour other = review.asked().hour().other();
        review.at(other)
                .assessment()
                .flatMap(night -> night.find(place.mark(), measure))
                .ifPresent(figure -> {
                    double value = figure.range().isPresent() ? figure.likely() : 0;
                    more.add(
                            value > 0
                                    ? new Said(
                                            other.word() + ": ", written.apply(value), doors.at(other, figure), after)
                                    : Said.words(other.word() + ": none"));
                });
        present.flatMap(Night::assessment)
                .flatMap(night -> night.find(place.mark(), measure))
                .filter(figure -> figure.range().isPresent())
                .ifPresent(figure -> more.add(
                        figure.likely() > 0
                                ? new Said(
                                        "by what is there now: ",
                                        written.apply(figure.likely()),
                                        doors.present(figure),
                                        "")
                                : Said.words("by what is there now: none")));
        List<String> leftOut = review.shown().leftOut();
        if (!leftOut.isEmpty()) {
            more.add(Said.words("at least, without " + String.join(", ", leftOut)));
        }
        return more;
    }

    private @Nullable Quantity light(Figure figure) {
        return figure.likely() > 0 ? Quantity.light(figure.likely(), 2, units) : null;
    }

    private String unit(Figure figure, String where) {
        return Quantity.light(figure.likely(), 2, units).unit() + " " + where;
    }

    private Figure figure(String measure) {
        return found.figure(place.mark(), measure);
    }

    /** The place where a figure's working stands. */
    static final class Doors {

        private final BiFunction<Hour, String, String> address;
        private final UnaryOperator<String> present;
        private final Hour hour;

        /**
         * @param address of a part of this page at an hour
         * @param present of a part of this page about what is there now
         */
        Doors(Hour hour, BiFunction<Hour, String, String> address, UnaryOperator<String> present) {
            this.hour = hour;
            this.address = address;
            this.present = present;
        }

        String here(Figure figure) {
            return "#" + NumberRow.door(figure);
        }

        String present(Figure figure) {
            return present.apply(NumberRow.door(figure));
        }

        String at(Hour other, Figure figure) {
            return other == hour ? here(figure) : address.apply(other, NumberRow.door(figure));
        }
    }
}
