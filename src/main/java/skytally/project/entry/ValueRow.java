package skytally.project.entry;

import java.util.List;
import org.jspecify.annotations.Nullable;
import skytally.scene.State;

/**
 * One value of a form.
 *
 * @param id       of its input on the page, and the name it is sent under
 * @param label    in words
 * @param input    number, choice, text or note
 * @param hint     what may be typed, or empty
 * @param asked    what stands in its inputs
 * @param units    to choose from; one is only shown
 * @param choices  to choose from
 * @param state    of the value in use
 * @param from     where the value in use comes from, or what stands in for it
 * @param claims   everything said of it; none if nothing was
 * @param disputed whether they differ
 * @param fault    what is wrong with what was typed, or nothing
 * @param open     whether its further inputs are shown at once
 */
public record ValueRow(
        String id,
        String label,
        String input,
        String hint,
        Asked asked,
        List<String> units,
        List<Option> choices,
        State state,
        String from,
        List<ClaimLine> claims,
        boolean disputed,
        @Nullable String fault,
        boolean open) {

    /** Whether it has a range. */
    public boolean isNumber() {
        return input.equals("number");
    }
}
