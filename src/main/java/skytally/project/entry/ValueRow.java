package skytally.project.entry;

import java.util.List;
import org.jspecify.annotations.Nullable;
import skytally.scene.State;

/**
 * One value of a form.
 *
 * @param id       of its input on the page, and the name it is sent under
 * @param group    the heading it stands under
 * @param label    in words
 * @param input    number, choice, text or note
 * @param hint     what may be typed, or empty
 * @param asked    what stands in its inputs
 * @param units    to choose from; one is only shown
 * @param choices  to choose from
 * @param state    of the value in use
 * @param from     where the value in use comes from, or what stands in for it
 * @param claims   everything said of it; none if nothing was
 * @param beside   what other values give for it, or empty
 * @param disputed whether any of that differs
 * @param fault    what is wrong with what was typed, or nothing
 * @param open     whether its further inputs are shown at once
 */
public record ValueRow(
        String id,
        Group group,
        String label,
        String input,
        String hint,
        Asked asked,
        List<String> units,
        List<Option> choices,
        State state,
        String from,
        List<ClaimLine> claims,
        String beside,
        boolean disputed,
        @Nullable String fault,
        boolean open) {

    /**
     * A heading of a form.
     *
     * @param heading in words, or empty: none
     * @param hint    on what stands under it, or empty
     */
    public record Group(String heading, String hint) {

        static final Group NONE = new Group("", "");
    }

    /** Lines of a box for several. */
    public long lines() {
        return Math.min(12, Math.max(2, asked.value().lines().count() + 1));
    }

    /** Whether it has a range. */
    public boolean isNumber() {
        return input.equals("number");
    }
}
