package skytally.project.entry;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.springframework.stereotype.Component;
import skytally.project.Field;
import skytally.project.Field.Kind;
import skytally.project.Field.Subject;

/** Fields that a form asks for and that are not kept themselves: others are worked out from them. */
@Component
public class AskedFields {

    private static final BigDecimal FARTHEST_M = new BigDecimal(1_000_000);

    private final Words words;

    AskedFields(Words words) {
        this.words = words;
    }

    /** East or north of the reference point. */
    public Field coordinate(Subject subject, String name) {
        return number(subject, name, Kind.NUMBER, List.of("m", "ft"), FARTHEST_M.negate(), FARTHEST_M);
    }

    public Field distance(Subject subject, String name) {
        return number(subject, name, Kind.NUMBER, List.of("m", "ft"), BigDecimal.ZERO, FARTHEST_M);
    }

    /** Clockwise from true north. */
    public Field bearing(Subject subject, String name) {
        return number(subject, name, Kind.NUMBER, List.of("°"), BigDecimal.ZERO, new BigDecimal(360));
    }

    /** Degrees of latitude or longitude. */
    public Field angle(Subject subject, String name, int most) {
        return number(subject, name, Kind.NUMBER, List.of("°"), new BigDecimal(-most), new BigDecimal(most));
    }

    public Field text(Subject subject, String name) {
        return new Field(subject, name, "", label(name), Kind.TEXT, List.of(), null, null, List.of(), Optional.empty());
    }

    public Field count(Subject subject, String name, int most) {
        return number(subject, name, Kind.WHOLE, List.of(), BigDecimal.ONE, new BigDecimal(most));
    }

    public Field choice(Subject subject, String name, List<String> choices) {
        return new Field(subject, name, "", label(name), Kind.CHOICE, List.of(), null, null, choices, Optional.empty());
    }

    private Field number(
            Subject subject, String name, Kind kind, List<String> units, BigDecimal least, BigDecimal most) {
        return new Field(subject, name, "", label(name), kind, units, least, most, List.of(), Optional.empty());
    }

    private String label(String name) {
        return words.say("typed." + name);
    }
}
