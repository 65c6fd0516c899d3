package skytally.project.hours;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the words that schedules use for hours, where they have one reading; what has none or two is not guessed. */
public final class HoursWords {

    /**
     * What the words say.
     *
     * @param hours   row by row
     * @param assumed whether something had to be assumed that the words leave out
     * @param why     how they were read, and what was assumed
     */
    public record Read(Hours hours, boolean assumed, String why) {}

    private record Phrase(Pattern pattern, Function<MatchResult, String> rows, String assumed) {

        static Phrase of(String pattern, Function<MatchResult, String> rows, String assumed) {
            return new Phrase(
                    Pattern.compile(pattern.replace("TIME", "(\\d{1,2}:\\d{2}|midnight)")
                            .replace("LEVEL", "(\\d{1,3}(?:\\.\\d+)?)\\s*%")),
                    rows,
                    assumed);
        }
    }

    private static final List<Phrase> PHRASES = List.of(
            Phrase.of("(?:dusk to dawn|all night)(?:,? full)?", all -> "dusk dawn 100%", ""),
            Phrase.of("dusk to TIME(?: full)?(?:,? then off)?", part -> "dusk " + part.group(1) + " 100%", ""),
            Phrase.of(
                    "dusk to TIME(?: full)?,? then LEVEL",
                    part -> "dusk " + part.group(1) + " 100%\n" + part.group(1) + " dawn " + part.group(2) + "%",
                    ""),
            Phrase.of(
                    "(?:(?:manual|time) switch,? )?TIME ?(?:-|–|to) ?TIME((?: [a-z,–-]+)?)",
                    part -> part.group(1) + " " + part.group(2) + " 100%" + part.group(3),
                    ""),
            Phrase.of("(?:coin )?timer to TIME", part -> "dusk " + part.group(1) + " 100%", ""),
            Phrase.of(
                    "(?:movement )?sensor(?:, (?:all night|dusk to dawn))?",
                    all -> "dusk dawn sensed idle 0% active 100%",
                    "the two levels are not stated: taken as off and full"),
            Phrase.of(
                    "full only when an? [a-z ]+ is present,? else LEVEL",
                    part -> "dusk dawn sensed idle " + part.group(1) + "% active 100%",
                    ""),
            Phrase.of(
                    "all night in [a-z ]+",
                    all -> "dusk dawn 100%",
                    "the months are not stated: taken as all the year"));

    private HoursWords() {}

    /** Nothing where the words do not say it. */
    public static Optional<Read> read(String words) {
        String plain = words.strip().toLowerCase(Locale.ROOT).replaceAll("\\s+", " ");
        for (Phrase phrase : PHRASES) {
            Matcher found = phrase.pattern().matcher(plain);
            if (found.matches()) {
                return read(phrase, found, words.strip());
            }
        }
        return Optional.empty();
    }

    private static Optional<Read> read(Phrase phrase, MatchResult found, String words) {
        try {
            Hours hours = Hours.read(phrase.rows().apply(found));
            String why = "read from “" + words + "”" + (phrase.assumed().isEmpty() ? "" : "; " + phrase.assumed());
            return Optional.of(new Read(hours, !phrase.assumed().isEmpty(), why));
        } catch (IllegalArgumentException noSuchTime) {
            // words such as 25:00 look like hours and are none
            return Optional.empty();
        }
    }
}
