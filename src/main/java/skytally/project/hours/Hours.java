package skytally.project.hours;

import java.math.BigDecimal;
import java.time.LocalTime;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import skytally.project.Lines;

/**
 * A schedule of hours, row by row; where no row says otherwise, the light is off.
 *
 * <p>The worst moment before and after a curfew is sought over the whole year: the night is taken as the longest of
 * moderate latitudes, dusk at 16:00 to dawn at 08:00 (common practice, no source), every day and every season of a row
 * counts, and a sensed light counts at its active level. So a row that lasts from 06:00 reaches into the night before a
 * winter's dawn.
 *
 * @param rows in the order they were typed
 */
public record Hours(List<HoursRow> rows) {

    static final int EARLIEST_DUSK = 16 * 60;
    static final int LATEST_DAWN = 8 * 60;

    public Hours {
        rows = List.copyOf(rows);
    }

    /**
     * The most output in a part of the night.
     *
     * @param percent of full
     * @param row     that gives it, as written, or empty where none is on
     */
    public record Worst(BigDecimal percent, String row) {}

    /**
     * Reads rows typed a line each, such as {@code dusk 23:00 100%}.
     *
     * @throws IllegalArgumentException with the line and what is wrong with it
     */
    public static Hours read(String text) {
        List<HoursRow> rows =
                Lines.read(text, HoursRow::read).stream().map(Lines.Line::thing).toList();
        if (rows.isEmpty()) {
            throw new IllegalArgumentException("A schedule has at least one row, such as “dusk 23:00 100%”");
        }
        return new Hours(rows);
    }

    /** The rows in their one form, a line each. */
    public String written() {
        return rows.stream().map(HoursRow::written).collect(Collectors.joining("\n"));
    }

    /** Between dusk and the curfew; nothing if the curfew comes before dusk. */
    public Optional<Worst> early(LocalTime curfew) {
        return worst(Moment.DUSK.afterNoon(), atCurfew(curfew));
    }

    /** Between the curfew and dawn; nothing if the curfew comes after dawn. */
    public Optional<Worst> late(LocalTime curfew) {
        return worst(atCurfew(curfew), Moment.DAWN.afterNoon());
    }

    private static int atCurfew(LocalTime curfew) {
        return Moment.clock(curfew.getHour() * 60 + curfew.getMinute()).afterNoon();
    }

    private Optional<Worst> worst(int from, int to) {
        int dusk = Moment.DUSK.afterNoon();
        int dawn = Moment.DAWN.afterNoon();
        int start = Math.min(Math.max(from, dusk), dawn);
        int end = Math.min(Math.max(to, dusk), dawn);
        if (start >= end) {
            return Optional.empty();
        }
        return Optional.of(rows.stream()
                .filter(row -> row.isOnWithin(start, end))
                .max(Comparator.comparing(row -> row.level().active()))
                .map(row -> new Worst(row.level().active(), row.written()))
                .orElse(new Worst(BigDecimal.ZERO, "")));
    }
}
