package skytally.project;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;
import skytally.project.transfer.Difference;

/**
 * One save of a project and what it changed.
 *
 * @param number      counted from 1
 * @param at          when
 * @param who         or empty
 * @param why         or empty
 * @param undoes      the step it took back, if it did
 * @param takenBackBy the step that took it back, if one did
 * @param count       how many keys it changed
 * @param changes     as many of them as were asked for
 */
public record Step(
        long number,
        Instant at,
        String who,
        String why,
        @Nullable Long undoes,
        @Nullable Long takenBackBy,
        long count,
        List<Difference.Change> changes) {}
