package skytally.project;

import java.util.Optional;
import skytally.luminaire.ShapeWords;
import skytally.scene.State;

/** The shape that a schedule's words for a fitting are taken for, as a claim of ours that names them. */
public final class ShapeFromWords {

    private ShapeFromWords() {}

    /** The claim, or nothing where the words name no shape. */
    public static Optional<Claim> of(String words) {
        return ShapeWords.find(words).map(row -> claim(words, row));
    }

    private static Claim claim(String words, ShapeWords.Row row) {
        String reason = "“" + words.strip() + "” taken as: " + row.shape().words() + "; " + row.why() + " ("
                + row.confidence().word() + " confidence)";
        return new Claim(row.shape().id(), "", State.ASSUMED, "", "", Source.reason(reason), Party.OURS, "", "");
    }

    /**
     * The values of a type with its shape read from its words: where nobody spoke of the shape, or where it was read
     * from other words that stood there before. Whatever a person said of the shape stands.
     *
     * @param before the type before these values were typed
     * @param today  as year-month-day
     */
    public static Values added(Values before, Values typed, String today) {
        Optional<Claim> claim = of(typed.text("shapeWords"));
        boolean open = typed.get("shape").equals(Stated.NOTHING);
        boolean ofOtherWords = !typed.text("shapeWords").equals(before.text("shapeWords"))
                && typed.get("shape").equals(before.get("shape"))
                && isReadFrom(before.text("shapeWords"), typed.get("shape").inUse());
        if (claim.isEmpty() || !(open || ofOtherWords)) {
            return typed;
        }
        return typed.with("shape", typed.get("shape").claimed(claim.get().typed("", today)));
    }

    private static boolean isReadFrom(String words, Claim shape) {
        return of(words).filter(claim -> claim.source().equals(shape.source())).isPresent();
    }
}
