package skytally.firstlook;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.assessment.Range;
import skytally.photometry.ZeroPoint;

/** The answer as data. Units are in the names; a member is null where there is no such number. */
record FirstLookJson(
        Direct direct,
        Glare glare,
        Sky sky,
        Eye eye,
        List<GuessJson> guesses,
        List<String> notes,
        String zeroPoint,
        String caution) {

    /** Light straight from the lamps. {@code windowIlluminanceLx} is outside the glass, nothing taken by the air. */
    record Direct(
            double distanceM,
            double intensityCd,
            double illuminanceLx,
            double oneLampIlluminanceLx,
            @Nullable Double equivalentMagnitude,
            @Nullable Double equivalentStarMagnitudeOverhead,
            @Nullable Double oneLampEquivalentMagnitude,
            @Nullable Double oneLampEquivalentStarMagnitudeOverhead,
            double windowIlluminanceLx) {}

    /** The veil in the eye, and on its own line the light of the air. */
    record Glare(
            double angleDeg,
            double veilingLuminanceCdM2,
            @Nullable Double veilMagArcsec2,
            double naturalSkies,
            double haloLuminanceCdM2) {}

    /** The sky in two directions. */
    record Sky(String scatteringOrders, SkyDirection zenith, SkyDirection towardSite) {}

    /** Luminances photopic, each by its own spectrum; magnitudes and the increase in the Johnson V band. */
    record SkyDirection(
            double artificialLuminanceCdM2,
            double naturalLuminanceCdM2,
            double totalMagArcsec2,
            double increasePercent) {}

    /** The faintest star overhead, at the eye, no lamp in view. */
    record Eye(double limitingMagnitudeNatural, double limitingMagnitudeWithLights) {}

    /** A blank that was left out; numbers as numbers, choices as their ids. */
    record GuessJson(String field, Object value, String unit, Object low, Object high, String why) {}

    static FirstLookJson of(Answer answer, List<String> passedOver, String caution) {
        return new FirstLookJson(
                direct(answer),
                glare(answer),
                new Sky("first", sky(answer, "zenith"), sky(answer, "toward-site")),
                new Eye(likely(answer, "zenith/eye/limit-natural"), likely(answer, "zenith/eye/limit")),
                guesses(answer.sentence()),
                Stream.concat(answer.assessment().notes().stream().map(Assessment.Note::sentence), passedOver.stream())
                        .toList(),
                ZeroPoint.TRADITIONAL.name(),
                caution);
    }

    private static Direct direct(Answer answer) {
        return new Direct(
                likely(answer, "direct/distance"),
                likely(answer, "direct/intensity"),
                likely(answer, "direct/illuminance"),
                likely(answer, "direct/one-lamp-illuminance"),
                orNull(answer, "direct/magnitude"),
                orNull(answer, "direct/star-overhead"),
                orNull(answer, "direct/one-lamp-magnitude"),
                orNull(answer, "direct/one-lamp-star-overhead"),
                likely(answer, "direct/window-illuminance"));
    }

    private static Glare glare(Answer answer) {
        return new Glare(
                answer.sentence().glareAngleDeg(),
                likely(answer, "beside/glare/veil"),
                orNull(answer, "beside/glare/veil-brightness"),
                likely(answer, "beside/glare/natural-skies"),
                likely(answer, "beside/glare/halo"));
    }

    private static SkyDirection sky(Answer answer, String look) {
        return new SkyDirection(
                likely(answer, look + "/sky/artificial"),
                likely(answer, look + "/sky/natural"),
                likely(answer, look + "/sky/brightness"),
                likely(answer, look + "/sky/increase"));
    }

    private static List<GuessJson> guesses(Sentence sentence) {
        List<GuessJson> guesses = new ArrayList<>();
        for (Guess guess : sentence.guesses()) {
            guesses.add(new GuessJson(
                    guess.blank().field(),
                    typed(guess, guess.likely()),
                    guess.blank().unit(),
                    typed(guess, guess.low()),
                    typed(guess, guess.high()),
                    guess.why()));
        }
        return guesses;
    }

    private static Object typed(Guess guess, String text) {
        return guess.blank().kind() == Blank.Kind.CHOICE ? text : new BigDecimal(text);
    }

    private static double likely(Answer answer, String measure) {
        return answer.figure(measure).likely();
    }

    private static @Nullable Double orNull(Answer answer, String measure) {
        Figure figure = answer.figure(measure);
        return figure.range().map(Range::likely).orElse(null);
    }
}
