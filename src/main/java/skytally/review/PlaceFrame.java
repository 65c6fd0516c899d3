package skytally.review;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import skytally.assessment.Assessment;
import skytally.figures.NumberRow;
import skytally.notation.QuantityFormat;
import skytally.project.Place;
import skytally.project.SceneDrawing;
import skytally.project.Scheme;
import skytally.project.entry.Amount;
import skytally.project.entry.Words;
import skytally.scene.Lamp;
import skytally.scene.Observer;

/**
 * What every page about one place has around its numbers.
 *
 * @param mark       of the place
 * @param name       what it is, in words; the mark where nobody said
 * @param lead       where it lies, and what is lit
 * @param places     all places, each a link to the same page about it
 * @param conditions for the title block
 * @param notes      what limits the numbers
 * @param numbers    every figure of the place at this hour, with its working
 */
public record PlaceFrame(
        String mark,
        String name,
        String lead,
        List<PlaceLink> places,
        String conditions,
        List<String> notes,
        List<NumberRow> numbers) {

    private static final int LONGEST_NAME = 90;

    /** Another place. */
    public record PlaceLink(String mark, String name, String href, boolean current) {}

    /**
     * @param links the places, with the address of the same page about each
     */
    public static PlaceFrame of(Review review, Place place, List<PlaceLink> links, Words words) {
        Night night = review.shown();
        Optional<Observer> observer = night.observer(place.mark());
        return new PlaceFrame(
                place.mark(),
                name(place),
                lead(review, place, observer, words),
                links,
                conditions(review),
                notes(review, place, words),
                observer.flatMap(here -> night.assessment().map(found -> numbers(found, here, review)))
                        .orElse(List.of()));
    }

    /** What a place is, in words. */
    public static String name(Place place) {
        return shortened(place.values().text("what").strip(), LONGEST_NAME);
    }

    /** People may write as much as they like; a heading holds so much of it. */
    public static String shortened(String words, int letters) {
        return words.length() <= letters
                ? words
                : words.substring(0, letters - 1).strip() + "…";
    }

    private static String lead(Review review, Place place, Optional<Observer> observer, Words words) {
        String kind = Whereabouts.kind(place)
                .flatMap(id -> words.find("choice.kind." + id))
                .map(said -> said.substring(0, 1).toUpperCase(Locale.ROOT) + said.substring(1) + ". ")
                .orElse("");
        String where = observer.map(here -> new Whereabouts(review.project(), place, here)
                        .said(review.asked().units()))
                .orElse("");
        return kind + where + " " + lit(review);
    }

    /** Which hour it is and how much of the schedule is lit then. */
    private static String lit(Review review) {
        long all = review.shown().scene().allLamps().stream()
                .map(Lamp::type)
                .distinct()
                .count();
        long lit = review.shown().scene().allLamps().stream()
                .filter(lamp -> lamp.allFlux().lumens() > 0)
                .map(Lamp::type)
                .distinct()
                .count();
        String many = all == 1 && lit == 1 ? "its one" : lit == all ? "all " + all : lit + " of " + all;
        String hour = review.asked().hour().capital() + ", " + curfew(review) + ": ";
        return all == 0 ? hour + "nothing is lit." : hour + many + (all == 1 ? " type is lit." : " types are lit.");
    }

    private static String curfew(Review review) {
        String stated = review.project().site().text("curfew").strip();
        String time = stated.isEmpty() || stated.length() > 20 ? "the curfew" : stated;
        return (review.asked().hour() == Hour.EARLY ? "before " : "after ") + time;
    }

    private static String conditions(Review review) {
        Asked asked = review.asked();
        return shortened(asked.scheme().name(), 60) + "; " + asked.hour().word() + ", "
                + asked.air().words() + " air, no cloud, ground "
                + QuantityFormat.atMost(review.shown().scene().surroundings().groundReflectance(), 3)
                        .plain();
    }

    private static List<String> notes(Review review, Place place, Words words) {
        Night night = review.shown();
        List<String> notes = new ArrayList<>();
        if (!night.leftOut().isEmpty()) {
            notes.add(words.say("review.left-out", listed(night.leftOut())));
        }
        unplaced(review, words).forEach(notes::add);
        if (!place.horizon().isEmpty()) {
            notes.add(words.say("review.skyline"));
        }
        if (!night.unaimed().isEmpty()) {
            notes.add(words.say("review.unaimed", listed(night.unaimed())));
        }
        if (!review.asked().asEntered()) {
            notes.add(words.say("review.air", review.asked().air().words()));
        }
        night.assessment()
                .ifPresent(found -> found.notesOf(place.mark()).stream()
                        .map(Assessment.Note::sentence)
                        .forEach(notes::add));
        return notes;
    }

    private static String listed(List<String> all) {
        List<String> marks = all.stream()
                .map(mark -> mark.startsWith(SceneDrawing.EXISTING)
                        ? "existing " + mark.substring(SceneDrawing.EXISTING.length())
                        : mark)
                .toList();
        return marks.size() == 1
                ? marks.get(0)
                : String.join(", ", marks.subList(0, marks.size() - 1)) + " and " + marks.get(marks.size() - 1);
    }

    /** How many lights of each type have no position. */
    private static Stream<String> unplaced(Review review, Words words) {
        Scheme scheme = review.asked().scheme();
        return review.shown().unplaced().stream()
                .flatMap(mark -> scheme.type(mark).stream())
                .flatMap(type -> Amount.of(type.values().get("count").inUse()).stream()
                        .map(BigDecimal::intValue)
                        .map(all -> words.say(
                                "review.unplaced",
                                type.mark(),
                                Integer.toString(
                                        all - scheme.placementsOf(type.mark()).size()),
                                Integer.toString(all))));
    }

    private static List<NumberRow> numbers(Assessment found, Observer here, Review review) {
        return found.figuresOf(here.mark()).stream()
                .map(figure -> NumberRow.of(
                        figure, LookNames.named(figure, here), review.asked().units(), false))
                .toList();
    }
}
