package skytally.assessment;

import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import skytally.geometry.Position;

/**
 * Everything worked out of a scene: the second doorway of the house. Pages, pictures and files read it and work out
 * nothing themselves.
 *
 * @param circumstance when and in what weather it holds
 * @param figures      by key, in the order of working
 * @param likenesses   of figures of light at the eye, by key; none for a light fainter than the faintest star
 * @param contributions of every luminaire type at every place
 * @param eyes         where the eye of each place is, by mark; the worst point of the property line is among them
 * @param influences   of every guess on every figure
 * @param notes        what limits the results, in sentences
 */
public record Assessment(
        Circumstance circumstance,
        Map<String, Figure> figures,
        Map<String, Likeness> likenesses,
        List<Contribution> contributions,
        Map<String, Position> eyes,
        List<Influence> influences,
        List<Note> notes) {

    /** Mark of the worst point of the property line, a place found by searching. */
    public static final String PROPERTY_LINE = "property-line";

    /** What a note is about. */
    public enum Topic {
        BELOW_HORIZON,
        NO_LIGHT_AT_ALL,
        NO_DIRECT_LIGHT,
        HIDDEN_BY_GROUND,
        TOO_NEAR,
        SMALL_PATCH,
        NOT_A_POINT,
        BRIGHTER_THAN_MOON,
        FAINT,
        GROUND_NOT_A_POINT,
        FAR_SKY,
        NO_READING,
        FIRST_SCATTERING
    }

    /**
     * A limit to what the numbers say.
     *
     * @param topic    what it is about
     * @param place    mark of the place it holds for, or empty for all
     * @param sentence as printed
     */
    public record Note(Topic topic, String place, String sentence) {}

    public Assessment {
        figures = Collections.unmodifiableMap(new LinkedHashMap<>(figures));
        likenesses = Map.copyOf(likenesses);
        contributions = List.copyOf(contributions);
        eyes = Collections.unmodifiableMap(new LinkedHashMap<>(eyes));
        influences = List.copyOf(influences);
        notes = List.copyOf(notes);
    }

    /**
     * A figure of one place.
     *
     * @param place   mark of the place
     * @param measure its path, such as {@code direct/illuminance}
     */
    public Figure figure(String place, String measure) {
        return find(place, measure)
                .orElseThrow(() ->
                        new IllegalArgumentException("No figure has the key " + key(place, measure, circumstance)));
    }

    /** The same, where it may be missing. */
    public Optional<Figure> find(String place, String measure) {
        return Optional.ofNullable(figures.get(key(place, measure, circumstance)));
    }

    /** The figures of one place, in the order of working. */
    public List<Figure> figuresOf(String place) {
        return figures.values().stream()
                .filter(figure -> figure.key().startsWith(place + "/"))
                .toList();
    }

    /** What limits the results of one place, in sentences. */
    public List<Note> notesOf(String place) {
        return notes.stream()
                .filter(note -> note.place().isEmpty() || note.place().equals(place))
                .toList();
    }

    /** The natural light a figure is like, if it is light at the eye and can be seen at all. */
    public Optional<Likeness> likeness(Figure figure) {
        return Optional.ofNullable(likenesses.get(figure.key()));
    }

    static String key(String place, String measure, Circumstance circumstance) {
        return place + "/" + measure + "/" + circumstance.path();
    }

    /** The guess that moves a figure most, when any does. */
    public Optional<Influence> strongest(Figure figure) {
        return influences.stream()
                .filter(influence -> influence.figure().equals(figure.key()) && influence.strength() > 0)
                .max(Comparator.comparingDouble(Influence::strength));
    }

    public boolean has(Topic topic) {
        return notes.stream().anyMatch(note -> note.topic() == topic);
    }
}
