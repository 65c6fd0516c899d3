package skytally.scene;

/**
 * How well a value is known, and from where.
 *
 * @param state one of the four
 * @param from  the document, the reason or the working, in a few words
 */
public record Known(State state, String from) {

    public static Known given(String from) {
        return new Known(State.GIVEN, from);
    }

    public static Known workedOut(String from) {
        return new Known(State.WORKED_OUT, from);
    }

    public static Known assumed(String from) {
        return new Known(State.ASSUMED, from);
    }
}
