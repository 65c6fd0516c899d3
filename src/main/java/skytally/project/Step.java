package skytally.project;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;
import skytally.project.transfer.Difference;

/**
 * One save of a project and all it changed.
 *
 * @param number  counted from 1
 * @param at      when
 * @param who     or empty
 * @param why     or empty
 * @param undoes  the step it took back, if it did
 * @param changes by key
 */
public record Step(
        long number,
        Instant at,
        String who,
        String why,
        @Nullable Long undoes,
        List<Difference.Change> changes) {}
