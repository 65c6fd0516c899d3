package skytally.project;

import skytally.scene.State;

/**
 * One statement of a value: what was typed, how well it is known, and who says so from where.
 *
 * @param value  as typed; empty where it is not known
 * @param unit   as typed, or empty for words and plain numbers
 * @param state  one of the four
 * @param low    least it may be, in the same unit, or empty
 * @param high   most it may be, in the same unit, or empty
 * @param source where it comes from
 * @param party  whose claim it is
 * @param date   on which it was stated, as year-month-day, or empty
 * @param who    typed it, or empty
 */
public record Claim(
        String value,
        String unit,
        State state,
        String low,
        String high,
        Source source,
        Party party,
        String date,
        String who) {

    public Claim {
        if (value.isBlank() != (state == State.NOT_KNOWN)) {
            throw new IllegalArgumentException("A claim has a value unless it is not known, and none if it is not");
        }
    }

    /** Nobody said anything yet. */
    public static final Claim NOT_STATED =
            new Claim("", "", State.NOT_KNOWN, "", "", Source.reason("not stated"), Party.OURS, "", "");

    /** A value read in a document. */
    public static Claim given(String value, String unit, Source source, Party party) {
        return new Claim(value, unit, State.GIVEN, "", "", source, party, "", "");
    }

    /** The same claim, typed by somebody on a day. */
    public Claim typed(String who, String date) {
        return new Claim(value, unit, state, low, high, source, party, date, who);
    }
}
