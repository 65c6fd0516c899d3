package skytally.review.seen;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Shares;
import skytally.assessment.Shares.Share;
import skytally.figures.Quantity;
import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.photometry.Illuminance;
import skytally.review.Hour;
import skytally.review.Review;
import skytally.review.TypeNames;
import skytally.web.Switches.Units;

/**
 * Light at the eye by type, early and late, in one unit.
 *
 * @param unit of all numbers
 * @param rows the types, in the order of the schedule
 * @param all  together
 */
record ByType(String unit, @Nullable Written power, List<Row> rows, Row all) {

    /** One type; a dash where it sends none, and doors where there is a working. */
    record Row(String name, String early, String late, String earlyDoor, String lateDoor) {}

    private static final String NONE = "–";

    static ByType of(Review review, String place, TypeNames names, HarmCards.Doors doors) {
        Shares early = shares(review, place, Hour.EARLY);
        Shares late = shares(review, place, Hour.LATE);
        List<String> types = Stream.of(early, late)
                .flatMap(shares -> shares.all().stream())
                .map(Share::type)
                .distinct()
                .toList();
        Units units = review.asked().units();
        double most = inUnit(Math.max(early.total(), late.total()), units);
        int power = power(most);
        List<Row> rows = new ArrayList<>();
        for (String type : types) {
            rows.add(new Row(
                    names.of(type).full(),
                    early.of(type)
                            .map(Share::amount)
                            .map(lux -> written(lux, units, power))
                            .orElse(NONE),
                    late.of(type)
                            .map(Share::amount)
                            .map(lux -> written(lux, units, power))
                            .orElse(NONE),
                    early.of(type).isPresent() ? door(review, place, Hour.EARLY, doors) : "",
                    late.of(type).isPresent() ? door(review, place, Hour.LATE, doors) : ""));
        }
        Row all = new Row(
                "",
                early.total() > 0 ? written(early.total(), units, power) : NONE,
                late.total() > 0 ? written(late.total(), units, power) : NONE,
                door(review, place, Hour.EARLY, doors),
                door(review, place, Hour.LATE, doors));
        String unit = Quantity.light(1, 2, units).unit();
        return new ByType(unit, power == 0 ? null : new Written("10", power), rows, all);
    }

    /** Of ten, by threes, so that the most has at least two digits before the point. */
    private static int power(double most) {
        if (!(most > 0 && most < 1)) {
            return 0;
        }
        return 3 * (int) Math.floor(Math.log10(most / 10) / 3);
    }

    private static Shares shares(Review review, String place, Hour hour) {
        return review.at(hour)
                .assessment()
                .map(found -> Shares.of(found, place, Harm.DIRECT.amount()))
                .orElse(new Shares(List.of(), 0));
    }

    private static String door(Review review, String place, Hour hour, HarmCards.Doors doors) {
        return review.at(hour)
                .assessment()
                .map(found -> doors.at(hour, found.figure(place, Harm.DIRECT.measure())))
                .orElse("");
    }

    private static double inUnit(double lux, Units units) {
        return units == Units.US ? new Illuminance(lux).footcandles() : lux;
    }

    /** Two figures, and never a power of its own: what is under a thousandth of the unit is said to be so. */
    private static String written(double lux, Units units, int power) {
        double value = inUnit(lux, units) / Math.pow(10, power);
        return value < 0.001
                ? "<0.001"
                : QuantityFormat.significant(value, value >= 100 ? 3 : 2).digits();
    }
}
