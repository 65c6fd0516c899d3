package skytally.firstlook;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.UUID;
import skytally.notation.QuantityFormat;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.Place;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.scene.State;

/**
 * A sentence as a project: its lights at the reference point, one place to the north. What was typed is given; what was
 * guessed stays not known where a project has the same stand-in for it, and is assumed, with its range, where a project
 * has none.
 */
final class SentenceProject {

    private static final String TYPE = "L1";
    private static final String PLACE = "P1";
    private static final Source SENTENCE = Source.reason("your sentence");

    private final Sentence sentence;

    private SentenceProject(Sentence sentence) {
        this.sentence = sentence;
    }

    /** A title to begin with. */
    static String title(Sentence sentence) {
        return digits(sentence, Blank.COUNT) + (sentence.count() == 1 ? " light of " : " lights of ")
                + digits(sentence, Blank.LUMENS) + " lm, " + digits(sentence, Blank.DISTANCE) + " m away";
    }

    private static String digits(Sentence sentence, Blank blank) {
        return QuantityFormat.asTyped(sentence.number(blank)).digits();
    }

    static Project of(Sentence sentence, UUID id, String title) {
        SentenceProject made = new SentenceProject(sentence);
        Scheme proposed = new Scheme(
                "proposed",
                Scheme.Kind.PROPOSED,
                "What is proposed",
                List.of(new LuminaireType(TYPE, made.type())),
                made.lights());
        return new Project(
                id,
                title,
                List.of(),
                made.site(),
                List.of(new Scheme("existing", Scheme.Kind.EXISTING, "What is there", List.of(), List.of()), proposed),
                List.of(new Place(PLACE, made.place(), List.of(), List.of())));
    }

    private Values type() {
        Map<String, Stated> values = new TreeMap<>();
        putOrAssume(values, "count", Blank.COUNT);
        putOrAssume(values, "lumens", Blank.LUMENS);
        putTyped(values, "spectralClass", Blank.SPECTRAL_CLASS);
        putTyped(values, "shape", Blank.SHAPE);
        putTyped(values, "mountingHeight", Blank.MOUNTING_HEIGHT);
        if (sentence.shape().usualTiltDeg() == 0) {
            putTyped(values, "tilt", Blank.TILT);
        } else {
            putOrAssume(values, "tilt", Blank.TILT);
        }
        values.put("bearing", ours("0", "°", "its street side toward " + PLACE + ", as in the first look"));
        return new Values(values);
    }

    private List<Placement> lights() {
        Values here = new Values(Map.of(
                "east", ours("0", "m", "all lights at one point, as in the first look"),
                "north", ours("0", "m", "all lights at one point, as in the first look")));
        List<Placement> lights = new ArrayList<>();
        for (int i = 1; i <= sentence.count(); i++) {
            lights.add(new Placement(TYPE + "-" + i, TYPE, here));
        }
        return lights;
    }

    private Values place() {
        Map<String, Stated> values = new TreeMap<>();
        values.put("what", ours("Where your first look was taken from", "", "the first look"));
        values.put("east", ours("0", "m", "to the north of the lights, as in the first look"));
        putOrAssume(values, "north", Blank.DISTANCE);
        putTyped(values, "eyeHeight", Blank.EYE_HEIGHT);
        values.put("facing", ours("180", "°", "toward the lights, as in the first look"));
        if (!sentence.isGuess(Blank.GLARE_ANGLE)) {
            String note = "Looked at " + sentence.text(Blank.GLARE_ANGLE) + "° beside the lights.";
            values.put("note", Stated.of(Claim.given(note, "", SENTENCE, Party.OURS)));
        }
        return new Values(values);
    }

    private Values site() {
        Map<String, Stated> values = new TreeMap<>();
        putTyped(values, "air", Blank.AIR);
        putTyped(values, "groundReflectance", Blank.GROUND_REFLECTANCE);
        return new Values(values);
    }

    /** What was typed; a guess is left not known, for the project to stand in for. */
    private void putTyped(Map<String, Stated> values, String field, Blank blank) {
        if (!sentence.isGuess(blank)) {
            values.put(field, Stated.of(Claim.given(sentence.text(blank), blank.unit(), SENTENCE, Party.OURS)));
        }
    }

    private void putOrAssume(Map<String, Stated> values, String field, Blank blank) {
        if (sentence.isGuess(blank)) {
            Guess guess = sentence.guess(blank);
            values.put(
                    field,
                    Stated.of(new Claim(
                            guess.likely(),
                            blank.unit(),
                            State.ASSUMED,
                            guess.hasRange() ? guess.low() : "",
                            guess.hasRange() ? guess.high() : "",
                            Source.reason(guess.why()),
                            Party.OURS,
                            "",
                            "")));
        } else {
            putTyped(values, field, blank);
        }
    }

    private static Stated ours(String value, String unit, String why) {
        return Stated.of(new Claim(value, unit, State.ASSUMED, "", "", Source.reason(why), Party.OURS, "", ""));
    }
}
