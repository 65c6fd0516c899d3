package skytally.review.sky;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleFunction;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.assessment.Range;
import skytally.assessment.Shares;
import skytally.assessment.Shares.Share;
import skytally.assessment.SkyLine;
import skytally.atmosphere.Clearness;
import skytally.charts.ShareDot;
import skytally.figures.NumberRow;
import skytally.figures.Quantity;
import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.project.Place;
import skytally.review.LookNames;
import skytally.review.Night;
import skytally.review.PlaceFrame;
import skytally.review.Review;
import skytally.review.Said;
import skytally.review.TypeNames;
import skytally.scene.Look;
import skytally.scene.Observer;

/**
 * How the sky over one place brightens, as the page shows it.
 *
 * @param frame  what stands around the numbers
 * @param says   overhead and toward the site, in sentences
 * @param known  whether the sky as it is is known
 * @param lines  direction by direction
 * @param fades  what the eye loses
 * @param who    causes it
 * @param overhead all together
 * @param toward the same toward the site
 * @param airs   the same overhead in other airs, for a far place
 */
record SkyPage(
        PlaceFrame frame,
        List<Said> says,
        boolean known,
        List<Line> lines,
        List<Fade> fades,
        List<Cause> who,
        Said overhead,
        Said toward,
        List<Said> airs) {

    /** A number of a table and where it was worked out; a dash where there is none. */
    record Cell(String number, @Nullable String door) {

        private static final Cell NONE = new Cell("–", null);
    }

    /** One direction. */
    record Line(
            String name,
            Cell natural,
            Cell present,
            Cell with,
            String brighter,
            Written withLuminance,
            String luminanceDoor,
            Cell overNatural,
            Cell overPresent) {}

    /** One thing that fades. */
    record Fade(String name, String unit, Cell natural, Cell present, Cell with) {}

    /** What one type causes. */
    record Cause(String name, Part overhead, Part toward) {}

    /** A share and an amount; a dash where there is none. */
    record Part(String dot, String percent, @Nullable Quantity amount) {

        private static final Part NONE = new Part("", "–", null);
    }

    private static final String ZENITH = Look.ZENITH;

    /** Nothing where the place has no position or no lamp can be reckoned with. */
    static Optional<SkyPage> of(Review review, Place place, PlaceFrame frame, Map<Clearness, Night> airs) {
        Optional<Observer> observer = review.shown().observer(place.mark());
        return review.shown()
                .assessment()
                .flatMap(found -> observer.map(here -> new Maker(review, place.mark(), here, found).page(frame, airs)));
    }

    private record Maker(Review review, String place, Observer observer, Assessment found) {

        private SkyPage page(PlaceFrame frame, Map<Clearness, Night> airs) {
            Map<Look, SkyLine> lines = new LinkedHashMap<>();
            observer.looks().stream()
                    .filter(look -> look.purpose() == Look.Purpose.SKY)
                    .forEach(look -> lines.put(look, SkyLine.of(found, place, look.id())));
            List<Line> rows = new ArrayList<>();
            lines.forEach((look, line) -> rows.add(row(look, line)));
            return new SkyPage(
                    frame,
                    says(),
                    lines.values().stream().anyMatch(line -> line.present().isPresent()),
                    rows,
                    fades(List.copyOf(lines.keySet())),
                    causes(),
                    total(ZENITH),
                    total(Look.TOWARD_SITE),
                    airs(airs));
        }

        private List<Said> says() {
            return List.of(sentence("Overhead", ZENITH), sentence("Toward the site, 30° up,", Look.TOWARD_SITE));
        }

        private Said sentence(String where, String look) {
            SkyLine line = SkyLine.of(found, place, look);
            String from = brightness(line.present().orElse(line.natural()));
            String before = where + " the sky goes from " + from
                    + (line.present().isPresent() ? "" : ", as nature has it,") + " to " + brightness(line.with())
                    + "\u00a0mag/arcsec²: at least ";
            String present = line.overPresent()
                    .map(over ->
                            " over the natural sky, " + Quantity.increase(over.likely()) + " over the sky as it is.")
                    .orElse(" over the natural sky; over the sky as it is: not known without a reading.");
            return new Said(before, Quantity.increase(line.overNatural().likely()), door(line.overNatural()), present);
        }

        private Line row(Look look, SkyLine line) {
            return new Line(
                    LookNames.of(look),
                    brightnessCell(line.natural()),
                    line.present().map(Maker::brightnessCell).orElse(Cell.NONE),
                    brightnessCell(line.with()),
                    QuantityFormat.decimals(line.brighterByMag(), 2).digits(),
                    QuantityFormat.significant(line.withCdM2() * 1e3, 2),
                    found.find(place, look.id() + "/sky/luminance")
                            .map(Maker::door)
                            .orElse(door(line.with())),
                    increase(line.overNatural()),
                    line.overPresent().map(Maker::increase).orElse(Cell.NONE));
        }

        private List<Fade> fades(List<Look> looks) {
            List<Fade> fades = new ArrayList<>();
            for (Look look : looks) {
                String name = LookNames.of(look);
                fades.add(new Fade(
                        "Faintest star, " + name.substring(0, 1).toLowerCase(Locale.ROOT) + name.substring(1),
                        "magnitude",
                        magnitude(look.id() + "/eye/limit-natural"),
                        magnitude(look.id() + "/eye/limit-present"),
                        magnitude(look.id() + "/eye/limit")));
            }
            fades.add(new Fade(
                    "Stars above the horizon by eye",
                    "about",
                    stars(ZENITH + "/eye/stars-natural"),
                    stars(ZENITH + "/eye/stars-present"),
                    stars(ZENITH + "/eye/stars")));
            return fades;
        }

        private Cell magnitude(String measure) {
            return cell(measure, value -> QuantityFormat.decimals(value, 2).digits());
        }

        private Cell stars(String measure) {
            return cell(measure, value -> QuantityFormat.significant(value, 2).digits());
        }

        private Cell cell(String measure, DoubleFunction<String> written) {
            return found.find(place, measure)
                    .map(figure -> cell(figure, written))
                    .orElse(Cell.NONE);
        }

        private List<Cause> causes() {
            TypeNames names = TypeNames.of(review.project(), review.asked().scheme());
            Shares overhead = Shares.of(found, place, each -> each.skyZenithCdM2());
            Shares toward = Shares.of(found, place, each -> each.skyTowardCdM2());
            return overhead.all().stream()
                    .map(share -> new Cause(
                            names.of(share.type()).full(),
                            part(overhead.of(share.type())),
                            part(toward.of(share.type()))))
                    .toList();
        }

        private Said total(String look) {
            Figure all = found.figure(place, look + "/sky/artificial");
            return new Said("", Quantity.luminance(all.likely(), 2), door(all), "");
        }

        private static Part part(Optional<Share> share) {
            return share.map(some -> new Part(
                            ShareDot.svg(some.percent()),
                            ShareDot.percent(some.percent()),
                            Quantity.luminance(some.amount(), 2)))
                    .orElse(Part.NONE);
        }

        private List<Said> airs(Map<Clearness, Night> airs) {
            List<Said> said = new ArrayList<>();
            airs.forEach((air, night) -> night.assessment()
                    .flatMap(there -> there.find(place, ZENITH + "/sky/increase"))
                    .ifPresent(increase -> said.add(
                            Said.words("in " + air.words() + " air " + Quantity.increase(increase.likely())))));
            return said;
        }

        private static Cell brightnessCell(Figure figure) {
            return new Cell(brightness(figure), door(figure));
        }

        private static String brightness(Figure figure) {
            return QuantityFormat.decimals(figure.likely(), 2).digits();
        }

        private static Cell increase(Figure figure) {
            return cell(figure, value -> Quantity.increase(value).number().plain());
        }

        private static Cell cell(Figure figure, DoubleFunction<String> written) {
            return figure.range()
                    .map(Range::likely)
                    .map(value -> new Cell(written.apply(value), door(figure)))
                    .orElse(Cell.NONE);
        }

        private static String door(Figure figure) {
            return "#" + NumberRow.door(figure);
        }
    }
}
