package skytally.review.seen;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.assessment.Shares;
import skytally.assessment.Shares.Share;
import skytally.charts.ShareDot;
import skytally.figures.NumberRow;
import skytally.figures.Quantity;
import skytally.project.Place;
import skytally.review.PlaceFrame;
import skytally.review.Review;
import skytally.review.TypeNames;
import skytally.review.TypeNames.Name;

/**
 * Who causes what: every place a row, every type a column, each cell the share of one harm.
 *
 * @param says    the table in a sentence or two
 * @param columns the types, and what is gathered of the rest
 * @param rows    the places
 */
record WhoCauses(String says, List<Name> columns, List<Row> rows) {

    private static final int MOST_COLUMNS = 12;
    private static final String OTHERS = "others";

    /**
     * One place.
     *
     * @param cells one for each column
     * @param total of the harm; nothing where there is none
     * @param door  to the working of the total
     */
    record Row(
            String mark,
            String name,
            String href,
            boolean current,
            List<Cell> cells,
            @Nullable Quantity total,
            String door) {}

    /**
     * One share.
     *
     * @param type   mark of its column
     * @param dot    the share as a picture; empty where there is none
     * @param number in percent
     * @param most   whether it is the greatest of its row
     */
    record Cell(String type, String dot, String number, boolean most) {

        public boolean isNone() {
            return dot.isEmpty();
        }

        /** How the cell looks: the greatest is outlined, none is pale. */
        public String style() {
            return isNone() ? "app-grid__cell--none" : most ? "app-grid__cell--most" : "";
        }
    }

    /** Where a page about a place stands. */
    interface Address {

        String of(String place, String part);
    }

    static WhoCauses of(Review review, String here, Harm harm, TypeNames names, Address address) {
        return new Maker(review, harm, names, address).table(here);
    }

    private record Maker(Review review, Harm harm, TypeNames names, Address address) {

        private WhoCauses table(String here) {
            Optional<Assessment> found = review.shown().assessment();
            Map<Place, Shares> shares = new LinkedHashMap<>();
            found.ifPresent(assessment -> review.project().places().stream()
                    .filter(place -> review.shown().observer(place.mark()).isPresent())
                    .forEach(place -> shares.put(place, Shares.of(assessment, place.mark(), harm.amount()))));
            List<String> types = shares.values().stream()
                    .flatMap(of -> of.all().stream())
                    .map(Share::type)
                    .distinct()
                    .toList();
            List<String> kept = kept(types, shares);
            List<String> rest =
                    types.stream().filter(type -> !kept.contains(type)).toList();
            List<Name> columns = new ArrayList<>(kept.stream().map(names::of).toList());
            if (!rest.isEmpty()) {
                columns.add(new Name(OTHERS, rest.size() + " more types"));
            }
            List<Row> rows = new ArrayList<>();
            shares.forEach((place, of) -> rows.add(row(found.orElseThrow(), place, of, kept, rest, here)));
            return new WhoCauses(says(here, shares), columns, rows);
        }

        /** All types where they fit; else the eleven that cause most anywhere, in the order of the schedule. */
        private static List<String> kept(List<String> types, Map<Place, Shares> shares) {
            if (types.size() <= MOST_COLUMNS) {
                return types;
            }
            List<String> biggest = types.stream()
                    .sorted(Comparator.comparingDouble((String type) -> greatest(type, shares))
                            .reversed())
                    .limit(MOST_COLUMNS - 1)
                    .toList();
            return types.stream().filter(biggest::contains).toList();
        }

        private static double greatest(String type, Map<Place, Shares> shares) {
            return shares.values().stream()
                    .flatMap(of -> of.of(type).stream())
                    .mapToDouble(Share::percent)
                    .max()
                    .orElse(0);
        }

        private Row row(Assessment found, Place place, Shares of, List<String> kept, List<String> rest, String here) {
            List<Optional<Share>> shares = new ArrayList<>();
            kept.forEach(type -> shares.add(of.of(type)));
            if (!rest.isEmpty()) {
                shares.add(of.together(OTHERS, rest));
            }
            double most = shares.stream()
                    .flatMap(Optional::stream)
                    .mapToDouble(Share::percent)
                    .max()
                    .orElse(0);
            List<Cell> cells = new ArrayList<>();
            for (int i = 0; i < shares.size(); i++) {
                String type = i < kept.size() ? names.of(kept.get(i)).mark() : OTHERS;
                cells.add(shares.get(i)
                        .map(share -> cell(type, share, share.percent() == most))
                        .orElse(new Cell(type, "", "–", false)));
            }
            // a place that is not looked at itself may have its shares only, whose sum is the figure
            Optional<Figure> total = found.find(place.mark(), harm.measure());
            return new Row(
                    place.mark(),
                    PlaceFrame.shortened(PlaceFrame.name(place), 40),
                    address.of(place.mark(), ""),
                    place.mark().equals(here),
                    cells,
                    of.total() > 0 ? harm.written(of.total(), review.asked().units()) : null,
                    address.of(place.mark(), total.map(NumberRow::door).orElse("")));
        }

        private static Cell cell(String type, Share share, boolean most) {
            return new Cell(type, ShareDot.svg(share.percent()), ShareDot.percent(share.percent()), most);
        }

        private String says(String here, Map<Place, Shares> shares) {
            Optional<Shares> at = shares.entrySet().stream()
                    .filter(each -> each.getKey().mark().equals(here))
                    .map(Map.Entry::getValue)
                    .findFirst();
            if (at.isEmpty()) {
                return "";
            }
            String first = hour(here, at.get(), "At " + here + ", ");
            return first + everywhere(at.get(), shares) + otherHour(here);
        }

        private String hour(String here, Shares at, String begin) {
            List<Share> ranked = at.ranked();
            if (ranked.isEmpty()) {
                return begin + "nothing of it arrives by this data.";
            }
            Share most = ranked.get(0);
            StringBuilder says = new StringBuilder(begin)
                    .append(name(most.type()))
                    .append(ranked.size() == 1 ? " causes all of the " : " causes " + share(most) + " of the ")
                    .append(harm.words());
            if (ranked.size() > 1) {
                Share second = ranked.get(1);
                says.append("; ")
                        .append(name(second.type()))
                        .append(" comes second with ")
                        .append(share(second));
            }
            return says.append('.').toString();
        }

        private String everywhere(Shares at, Map<Place, Shares> shares) {
            if (at.ranked().isEmpty() || shares.size() < 2) {
                return "";
            }
            String first = at.ranked().get(0).type();
            long lit = shares.values().stream().filter(of -> of.total() > 0).count();
            long same = shares.values().stream()
                    .filter(of ->
                            !of.ranked().isEmpty() && of.ranked().get(0).type().equals(first))
                    .count();
            String mark = names.of(first).mark();
            return same == lit
                    ? " " + mark + " comes first at every place this light reaches."
                    : " " + mark + " comes first at " + same + " of the " + lit + " places this light reaches.";
        }

        private String otherHour(String here) {
            return review.at(review.asked().hour().other())
                    .assessment()
                    .map(found -> " "
                            + hour(
                                    here,
                                    Shares.of(found, here, harm.amount()),
                                    review.asked().hour().other().capital() + ", "))
                    .orElse("");
        }

        private String name(String type) {
            return names.of(type).full();
        }

        private static String share(Share share) {
            return ShareDot.percent(share.percent()) + "\u00a0%";
        }
    }
}
