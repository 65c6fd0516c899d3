package skytally.project.hours;

import java.math.BigDecimal;
import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import skytally.notation.NumberReader;

/**
 * One row of a schedule.
 *
 * @param from   when it begins
 * @param to     when it ends
 * @param level  meanwhile
 * @param days   of the week on which it begins, as written, such as Mon-Sat; empty for every day
 * @param season months in which it holds, as written, such as Oct-Mar; empty for all year
 */
public record HoursRow(Moment from, Moment to, Level level, String days, String season) {

    private static final String TIME = "(?:\\d{1,2}:\\d{2}|dusk|dawn|midnight)";
    private static final Pattern SPAN = Pattern.compile("^(" + TIME + ")\\s*(?:-|–|\\bto\\b)?\\s*(" + TIME + ")\\b");
    private static final Pattern LOOSE_PERCENT = Pattern.compile("(\\d)\\s+%");
    private static final List<String> DAYS = List.of("Mon", "Tue", "Wed", "Thu", "Fri", "Sat", "Sun");
    private static final List<String> MONTHS =
            List.of("Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec");
    private static final BigDecimal FULL = BigDecimal.valueOf(100);

    /**
     * Reads a row.
     *
     * @throws IllegalArgumentException with what to write instead
     */
    static HoursRow read(String line) {
        String text = LOOSE_PERCENT.matcher(line.toLowerCase(Locale.ROOT)).replaceAll("$1%");
        Matcher span = SPAN.matcher(text);
        if (!span.find()) {
            throw new IllegalArgumentException("begin with two times, each dusk, dawn or one such as 23:00");
        }
        Moment from = begin(span.group(1));
        Moment to = end(span.group(2));
        if (from.equals(to)) {
            throw new IllegalArgumentException("the row begins when it ends");
        }
        Deque<String> words = new ArrayDeque<>(
                Arrays.asList(text.substring(span.end()).strip().split("\\s+")));
        Level level = level(words);
        String days = "";
        String season = "";
        while (!words.isEmpty()) {
            String word = words.remove();
            if (word.equals("season") && season.isEmpty()) {
                season = season(words.isEmpty() ? "" : words.remove());
            } else if (days.isEmpty()) {
                days = days(word);
            } else {
                throw new IllegalArgumentException("“" + word + "” is one word too many");
            }
        }
        return new HoursRow(from, to, level, days, season);
    }

    private static Moment begin(String word) {
        Moment from = moment(word);
        if (from.kind() == Moment.Kind.DAWN) {
            throw new IllegalArgumentException("a row begins at dusk or at a time such as 23:00, not at dawn");
        }
        return from.kind() == Moment.Kind.CLOCK ? Moment.clock(from.minutes() % Moment.DAY) : from;
    }

    private static Moment end(String word) {
        Moment to = moment(word);
        if (to.kind() == Moment.Kind.DUSK) {
            throw new IllegalArgumentException("a row ends at dawn or at a time such as 23:00, not at dusk");
        }
        return to.kind() == Moment.Kind.CLOCK && to.minutes() == 0 ? Moment.clock(Moment.DAY) : to;
    }

    private static Moment moment(String word) {
        return Moment.read(word)
                .orElseThrow(
                        () -> new IllegalArgumentException("“" + word + "” is no time of day; write it as in 23:00"));
    }

    private static Level level(Deque<String> words) {
        String first = words.remove();
        if (!first.equals("sensed")) {
            return Level.of(percent(first));
        }
        BigDecimal idle = named("idle", words).orElseThrow(HoursRow::sensed);
        BigDecimal active = named("active", words).orElseThrow(HoursRow::sensed);
        if (idle.compareTo(active) > 0) {
            throw new IllegalArgumentException("the idle level is above the active one; put them the other way about");
        }
        return new Level(active, idle, named("duty", words).orElse(null));
    }

    private static IllegalArgumentException sensed() {
        return new IllegalArgumentException("after “sensed” write both levels, such as “idle 25% active 100%”");
    }

    private static Optional<BigDecimal> named(String name, Deque<String> words) {
        if (!name.equals(words.peek())) {
            return Optional.empty();
        }
        words.remove();
        return Optional.of(percent(words.isEmpty() ? "" : words.remove()));
    }

    private static BigDecimal percent(String word) {
        String bare = word.endsWith("%") ? word.substring(0, word.length() - 1) : "";
        if (NumberReader.read(bare, false) instanceof NumberReader.Number number
                && number.value().signum() >= 0
                && number.value().compareTo(FULL) <= 0) {
            return number.value().stripTrailingZeros();
        }
        throw new IllegalArgumentException(
                "a level is a share of full output from 0% to 100%, or “sensed idle 25% active 100%”");
    }

    private static String days(String word) {
        return Arrays.stream(word.split(",", -1))
                .map(part -> span(part, DAYS, "days are written as in Mon-Sat or Mon,Wed,Fri"))
                .reduce((one, other) -> one + "," + other)
                .orElseThrow();
    }

    private static String season(String word) {
        return span(word, MONTHS, "a season is written as in “season Oct-Mar”");
    }

    /** One name of a list or two with a hyphen, in their one form. */
    private static String span(String typed, List<String> names, String otherwise) {
        String[] ends = typed.split("[-–]", -1);
        if (ends.length > 2) {
            throw new IllegalArgumentException(otherwise);
        }
        return Arrays.stream(ends)
                .map(end -> names.stream()
                        .filter(name -> name.equalsIgnoreCase(end))
                        .findFirst()
                        .orElseThrow(() -> new IllegalArgumentException(otherwise)))
                .reduce((one, other) -> one + "-" + other)
                .orElseThrow();
    }

    /** In its one form. */
    public String written() {
        return from.written() + " " + to.written() + " " + level.written() + (days.isEmpty() ? "" : " " + days)
                + (season.isEmpty() ? "" : " season " + season);
    }

    /** Whether it is on at some moment of a span, in minutes after noon. */
    boolean isOnWithin(int start, int end) {
        int on = from.afterNoon();
        int off = to.afterNoon() == 0 ? Moment.DAY : to.afterNoon();
        return on < off ? on < end && start < off : start < off || on < end;
    }
}
